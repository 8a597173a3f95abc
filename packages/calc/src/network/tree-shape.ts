/** The air system as a tree of whole numbers. */

/** Stands for a node or segment that is not there. */
export const NONE = -1;

export interface Tree {
  readonly segmentCount: number;
  /** Index of the equipment's node. */
  readonly equipment: number;
  /** Node index of each segment's ends. */
  readonly from: Int32Array;
  readonly to: Int32Array;
  /** The segment that leads to a node; NONE at the equipment. */
  readonly into: Int32Array;
  /** The segment that feeds a segment; NONE at the equipment. */
  readonly before: Int32Array;
  /** The segments that leave node n are childList[childStart[n]] up to childStart[n + 1]. */
  readonly childStart: Int32Array;
  readonly childList: Int32Array;
  /** Segments so that each comes after the one that feeds it, one branch to its end before the next. */
  readonly order: Int32Array;
  /** Segments between this one and the equipment. */
  readonly depth: Int32Array;
  /** Nodes that are outlets, in the order of the system. */
  readonly outlets: readonly number[];
}
