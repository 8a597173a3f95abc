/** A wall laid flat: the net outline to be cut, before edges for seams and joints are added. Meters. */
export type FlatPoint = readonly [x_m: number, y_m: number];

export interface FlatPattern {
  /** "cheek", "throat", "gore": what a shop calls it. */
  readonly name: string;
  /** Alike, or mirrored. */
  readonly count: number;
  readonly outline: readonly FlatPoint[];
  readonly holes: readonly (readonly FlatPoint[])[];
  /** Bends, from point to point. */
  readonly folds: readonly (readonly [FlatPoint, FlatPoint])[];
}

export const flat = (name: string, count: number, outline: readonly FlatPoint[]): FlatPattern => ({
  name,
  count,
  outline,
  holes: [],
  folds: [],
});

export const rectangle = (name: string, count: number, width: number, height: number): FlatPattern =>
  flat(name, count, [
    [0, 0],
    [width, 0],
    [width, height],
    [0, height],
  ]);

function enclosed(outline: readonly FlatPoint[]): number {
  let twice = 0;
  for (let i = 0; i < outline.length; i++) {
    const [x0, y0] = outline[i]!;
    const [x1, y1] = outline[(i + 1) % outline.length]!;
    twice += x0 * y1 - x1 * y0;
  }
  return Math.abs(twice) / 2;
}

/** Of one of them. */
export const patternArea = ({ outline, holes }: FlatPattern): number =>
  holes.reduce((area, hole) => area - enclosed(hole), enclosed(outline));

/** Width and height of the sheet that one of them is cut from, as it lies. */
export function patternSize({ outline }: FlatPattern): { readonly width_m: number; readonly height_m: number } {
  const xs = outline.map(([x]) => x);
  const ys = outline.map(([, y]) => y);
  return { width_m: Math.max(...xs) - Math.min(...xs), height_m: Math.max(...ys) - Math.min(...ys) };
}
