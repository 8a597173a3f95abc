/** The mark: a cleat folded over the edge of a sheet. */
export function Mark({ size = 28, className }: { size?: number; className?: string }) {
  return (
    <svg
      width={size}
      height={size}
      viewBox="0 0 32 32"
      fill="none"
      stroke="currentColor"
      strokeWidth={3}
      aria-hidden
      className={className}
    >
      <path d="M16 11H24.25A2.75 2.75 0 0 0 24.25 5.5H5.5V26.5H24.25A2.75 2.75 0 0 0 24.25 21H16" />
    </svg>
  );
}
