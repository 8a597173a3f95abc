/**
 * The library's plan, in feet from its north-west corner: walls, doors, grid and rooms. The drawing is painted from it
 * and the ducts are laid over it, so both agree. The building is invented.
 */
export type Point = readonly [number, number];

export const building = { width_ft: 112, depth_ft: 58 } as const;

export const grid = {
  columns: [
    { label: "1", at: 0 },
    { label: "2", at: 20 },
    { label: "3", at: 34 },
    { label: "4", at: 56 },
    { label: "5", at: 78 },
    { label: "6", at: 92 },
    { label: "7", at: 112 },
  ],
  // prettier-ignore
  rows: [
    { label: "A", at: 0 },
    { label: "B", at: 18 },
    { label: "C", at: 27 },
    { label: "D", at: 58 },
  ],
} as const;

/** Inside walls, each from end to end. */
// prettier-ignore
export const walls: readonly (readonly [Point, Point])[] = [
  [[20, 18], [112, 18]],
  [[20, 27], [92, 27]],
  [[0, 27], [20, 27]],
  [[20, 0], [20, 27]],
  [[30, 0], [30, 18]],
  [[50, 0], [50, 18]],
  [[60, 0], [60, 18]],
  [[78, 0], [78, 18]],
  [[86, 0], [86, 18]],
  [[94, 0], [94, 18]],
  [[102, 0], [102, 18]],
  [[34, 27], [34, 58]],
  [[44, 27], [44, 37]],
  [[34, 37], [44, 37]],
  [[39, 30], [39, 37]],
  [[56, 27], [56, 58]],
  [[92, 27], [92, 58]],
];

/** A door in a wall: where, how wide, and along which way the wall runs. */
// prettier-ignore
export const doors: readonly { at: Point; width_ft: number; along: "x" | "y" }[] = [
  { at: [27, 18], width_ft: 3, along: "x" },
  { at: [46, 18], width_ft: 3, along: "x" },
  { at: [57, 18], width_ft: 3, along: "x" },
  { at: [74, 18], width_ft: 3, along: "x" },
  { at: [83, 18], width_ft: 3, along: "x" },
  { at: [91, 18], width_ft: 3, along: "x" },
  { at: [99, 18], width_ft: 3, along: "x" },
  { at: [108, 18], width_ft: 3, along: "x" },
  { at: [20, 23], width_ft: 3.5, along: "y" },
  { at: [25, 27], width_ft: 6, along: "x" },
  { at: [50, 27], width_ft: 8, along: "x" },
  { at: [72, 27], width_ft: 6, along: "x" },
  { at: [92, 40], width_ft: 6, along: "y" },
  { at: [36, 37], width_ft: 3, along: "x" },
  { at: [42, 37], width_ft: 3, along: "x" },
  { at: [44, 58], width_ft: 8, along: "x" },
];

// prettier-ignore
export const rooms: readonly { name: string; number: string; at: Point }[] = [
  { name: "MECHANICAL", number: "101", at: [8, 20] },
  { name: "STORAGE", number: "102", at: [25, 7] },
  { name: "STAFF WORKROOM", number: "103", at: [40, 14.5] },
  { name: "DIRECTOR", number: "104", at: [55, 15] },
  { name: "LOCAL HISTORY", number: "105", at: [69, 5] },
  { name: "STUDY A", number: "106", at: [82, 5] },
  { name: "STUDY B", number: "107", at: [90, 5] },
  { name: "STUDY C", number: "108", at: [98, 5] },
  { name: "DATA", number: "109", at: [107, 5] },
  { name: "CORRIDOR", number: "110", at: [84, 23] },
  { name: "COMMUNITY ROOM", number: "111", at: [17, 54] },
  { name: "LOBBY", number: "112", at: [50, 55] },
  { name: "WC", number: "113", at: [36.5, 29] },
  { name: "WC", number: "114", at: [41.5, 29] },
  { name: "READING", number: "115", at: [74, 54] },
  { name: "CHILDREN’S", number: "116", at: [98, 54] },
];

export const shelves: readonly { at: Point; width_ft: number; depth_ft: number }[] = [64, 68, 72, 76, 80, 84].map(
  (x) => ({ at: [x, 37], width_ft: 1.6, depth_ft: 8 }),
);

/** Chairs of the community room: a corner and the rows and columns. */
export const chairs = { at: [5, 39.5] as Point, columns: 9, rows: 3, pitch_ft: 2.6, size_ft: 1.5 };

/** The air handler, by its corners. */
export const unit = { tag: "AH-1", from: [3, 5] as Point, to: [13, 13] as Point };
