/** Basis points on screens: 1,450 is 14.5 %. */
export const percentText = (basisPoints: number): string =>
  `${new Intl.NumberFormat("en-US", { maximumFractionDigits: 2 }).format(basisPoints / 100)} %`;

/** `12.5`, `12.5 %` to basis points; null when it is neither. */
export function parsePercent(text: string): number | null {
  const match = /^(\d{1,4}(?:\.\d{1,2})?|\.\d{1,2})\s*%?$/.exec(text.trim());
  return match ? Math.round(Number(match[1]) * 100) : null;
}
