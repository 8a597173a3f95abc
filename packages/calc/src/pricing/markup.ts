/** Markup is profit over cost, margin is profit over price. Taking one for the other is how money is lost. */

/** m = k / (1 + k). Basis points in and out, not rounded. */
export const marginFromMarkup = (markup_bp: number): number => (10_000 * markup_bp) / (10_000 + markup_bp);

/** k = m / (1 − m). Range: margin under 10,000. */
export function markupFromMargin(margin_bp: number): number {
  if (!(margin_bp < 10_000)) throw new RangeError("a margin is under the whole price");
  return (10_000 * margin_bp) / (10_000 - margin_bp);
}
