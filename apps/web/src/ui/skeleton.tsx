/** The shape of what comes, after 300 ms of waiting. */
export function Skeleton({ lines = 5, label = "Loading" }: { lines?: number; label?: string }) {
  const widths = ["w-3/5", "w-11/12", "w-4/5", "w-2/3", "w-3/4"];
  return (
    <div role="status" className="late grid gap-3 p-4">
      <span className="sr-only">{label}</span>
      {Array.from({ length: lines }, (_, index) => (
        <span key={index} aria-hidden className={`block h-3 bg-line-soft ${widths[index % widths.length]}`} />
      ))}
    </div>
  );
}

export function ScreenSkeleton() {
  return (
    <div className="p-4">
      <div className="hem late">
        <div className="h-10 border-b border-line" />
        <Skeleton lines={8} />
      </div>
    </div>
  );
}
