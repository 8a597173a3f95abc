/** Labels that never overlap: taken in order of importance, a label that would cover an earlier one is left out. */
export interface LabelBox {
  /** Center, in screen pixels. */
  readonly x: number;
  readonly y: number;
  readonly width: number;
  readonly height: number;
  /** Radians; labels along a duct are turned. */
  readonly turn: number;
}

interface Extent {
  readonly left: number;
  readonly top: number;
  readonly right: number;
  readonly bottom: number;
}

const extentOf = ({ x, y, width, height, turn }: LabelBox): Extent => {
  const c = Math.abs(Math.cos(turn));
  const s = Math.abs(Math.sin(turn));
  const halfWidth = (width * c + height * s) / 2;
  const halfHeight = (width * s + height * c) / 2;
  return { left: x - halfWidth, right: x + halfWidth, top: y - halfHeight, bottom: y + halfHeight };
};

/** Screen cells; a label looks only at what stands in its own cells, so the work stays linear in the labels. */
const CELL = 96;

export class LabelField {
  private readonly cells = new Map<string, Extent[]>();

  /** True, and the place is taken, when the box meets no earlier one. */
  place(box: LabelBox): boolean {
    const extent = extentOf(box);
    const keys = [...cellsOf(extent)];
    for (const key of keys) {
      for (const taken of this.cells.get(key) ?? []) if (meet(extent, taken)) return false;
    }
    for (const key of keys) {
      const cell = this.cells.get(key);
      if (cell) cell.push(extent);
      else this.cells.set(key, [extent]);
    }
    return true;
  }
}

function* cellsOf(extent: Extent): Generator<string> {
  for (let cx = Math.floor(extent.left / CELL); cx <= Math.floor(extent.right / CELL); cx++) {
    for (let cy = Math.floor(extent.top / CELL); cy <= Math.floor(extent.bottom / CELL); cy++) yield `${cx},${cy}`;
  }
}

const meet = (a: Extent, b: Extent): boolean =>
  a.left < b.right && b.left < a.right && a.top < b.bottom && b.top < a.bottom;

/** A label along a duct reads from the left, or from below when the duct runs up the sheet. */
export function uprightTurn(angle_rad: number): number {
  let turn = angle_rad % Math.PI;
  if (turn > Math.PI / 2 + 1e-9) turn -= Math.PI;
  if (turn <= -Math.PI / 2 + 1e-9) turn += Math.PI;
  return Math.abs(turn - Math.PI / 2) < 1e-6 ? -Math.PI / 2 : turn;
}
