/** Where the cursor stands in the schedule, what is marked, what is being typed. Pure. */
export interface Cell {
  readonly row: number;
  readonly column: number;
}

export interface GridState {
  readonly active: Cell;
  /** The other corner of what is marked; the active cell itself when nothing more is. */
  readonly anchor: Cell;
  readonly editing: { readonly text: string } | null;
}

export interface Extent {
  readonly rows: number;
  readonly columns: number;
}

export const gridStart: GridState = { active: { row: 0, column: 1 }, anchor: { row: 0, column: 1 }, editing: null };

const within = (value: number, count: number) => Math.min(Math.max(value, 0), Math.max(count - 1, 0));

export function moveTo(state: GridState, cell: Cell, extent: Extent, extend = false): GridState {
  const active = { row: within(cell.row, extent.rows), column: within(cell.column, extent.columns) };
  return { active, anchor: extend ? state.anchor : active, editing: null };
}

export const moveBy = (state: GridState, rows: number, columns: number, extent: Extent, extend = false): GridState =>
  moveTo(state, { row: state.active.row + rows, column: state.active.column + columns }, extent, extend);

/** Tab walks on into the next row; Shift+Tab back into the one before. */
export function tab(state: GridState, back: boolean, extent: Extent): GridState | null {
  const place = state.active.row * extent.columns + state.active.column + (back ? -1 : 1);
  // At either end Tab leaves the grid, so that nobody is caught in it.
  if (place < 0 || place >= extent.rows * extent.columns) return null;
  return moveTo(state, { row: Math.floor(place / extent.columns), column: place % extent.columns }, extent);
}

export const edit = (state: GridState, text: string): GridState => ({
  ...state,
  anchor: state.active,
  editing: { text },
});
export const stopEditing = (state: GridState): GridState => ({ ...state, editing: null });

export function marked({ active, anchor }: GridState): { top: number; bottom: number; left: number; right: number } {
  return {
    top: Math.min(active.row, anchor.row),
    bottom: Math.max(active.row, anchor.row),
    left: Math.min(active.column, anchor.column),
    right: Math.max(active.column, anchor.column),
  };
}

export const isMarked = (state: GridState, { row, column }: Cell): boolean => {
  const { top, bottom, left, right } = marked(state);
  return row >= top && row <= bottom && column >= left && column <= right;
};
