/** Directions in space: x to the right of the sheet, y down the sheet, z up. */
import { meters } from "@cleatwork/calc";
import type { LevelRecord, NodeRecord } from "@cleatwork/contracts";
import { find, type Layout } from "../layout.ts";

export interface Vector {
  readonly x: number;
  readonly y: number;
  readonly z: number;
}

export const TURNS = ["straight", "left", "right", "left-45", "right-45", "up", "down"] as const;
export type Turn = (typeof TURNS)[number];

/** Height of a node above the datum: its level's and its own. */
export const heightOf = (layout: Layout, node: NodeRecord): number =>
  (find(layout, "level", node.levelId)?.elevation_m ?? 0) + node.elevation_m;

export function between(layout: Layout, from: NodeRecord, to: NodeRecord): Vector {
  return { x: to.x_m - from.x_m, y: to.y_m - from.y_m, z: heightOf(layout, to) - heightOf(layout, from) };
}

export const lengthOf = ({ x, y, z }: Vector): number => Math.hypot(x, y, z);

export function unit(vector: Vector): Vector | null {
  const length = lengthOf(vector);
  return length < 1e-9 ? null : scale(vector, 1 / length);
}

export const scale = ({ x, y, z }: Vector, by: number): Vector => ({ x: x * by, y: y * by, z: z * by });

/** A heading turned. From a vertical duct, left and right are taken from the sheet: it has no heading of its own. */
export function turned(heading: Vector, turn: Turn): Vector {
  const flat = unit({ x: heading.x, y: heading.y, z: 0 }) ?? { x: 1, y: 0, z: 0 };
  const about = (angle: number): Vector => ({
    x: flat.x * Math.cos(angle) - flat.y * Math.sin(angle),
    y: flat.x * Math.sin(angle) + flat.y * Math.cos(angle),
    z: 0,
  });
  switch (turn) {
    case "straight":
      return heading;
    // The sheet's y runs down, so a positive angle turns right.
    case "right":
      return about(Math.PI / 2);
    case "left":
      return about(-Math.PI / 2);
    case "right-45":
      return about(Math.PI / 4);
    case "left-45":
      return about(-Math.PI / 4);
    case "up":
      return { x: 0, y: 0, z: 1 };
    case "down":
      return { x: 0, y: 0, z: -1 };
  }
}

/** The node moved; its level stays, its own height above it changes. Micrometers are rounded away. */
export const movedBy = (node: NodeRecord, by: Vector): NodeRecord => ({
  ...node,
  x_m: meters(round(node.x_m + by.x)),
  y_m: meters(round(node.y_m + by.y)),
  elevation_m: meters(round(node.elevation_m + by.z)),
});

export const round = (value: number): number => Math.round(value * 1e6) / 1e6;

export const levelOf = (layout: Layout, node: NodeRecord): LevelRecord | null => find(layout, "level", node.levelId);
