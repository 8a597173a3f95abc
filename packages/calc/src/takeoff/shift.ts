/** How far the center of a duct moves along its width and its height, from one end of a fitting to the other. */
export interface Shift {
  readonly x_m: number;
  readonly y_m: number;
}

export const CONCENTRIC: Shift = { x_m: 0, y_m: 0 };
