/** How the head of a quote will look. Paper in either theme, as the client sees it. */
export function Letterhead({ color, name, line }: { color: string; name: string; line: string }) {
  return (
    <figure>
      <figcaption className="label-width mb-1 text-help text-ink-3">The head of a quote</figcaption>
      <div data-theme="light" className="border border-line bg-paper px-4 pt-3 text-ink">
        <div className="border-b-2 pb-3" style={{ borderColor: color }}>
          <p className="text-tally font-[680]">{name || "Your company"}</p>
          <p className="text-help text-ink-3">{line || "Phone · license"}</p>
        </div>
        <p className="py-3 text-help text-ink-2">Dear client, here is our price for the ductwork…</p>
      </div>
    </figure>
  );
}
