/** The references of the document, read the other way: from a node to its ducts, from a system to its tree. */
import { markNumbers } from "@cleatwork/calc";
import type { NodeId, NodeRecord, SegmentId, SegmentRecord, SystemId } from "@cleatwork/contracts";
import type { Layout } from "./layout.ts";

export interface TreeRow {
  readonly segment: SegmentRecord;
  /** Steps from the equipment. */
  readonly depth: number;
  /** As it stands in the schedule and on the marks. A segment keeps the number that it was given. */
  readonly number: number;
}

export interface LayoutIndex {
  /** The duct that a node hangs on; none at the equipment. */
  readonly parentOf: ReadonlyMap<NodeId, SegmentRecord>;
  /** The ducts that hang on a node, in the estimator's order. */
  readonly childrenOf: ReadonlyMap<NodeId, readonly SegmentRecord[]>;
  readonly equipmentOf: ReadonlyMap<SystemId, NodeRecord>;
  readonly nodesOf: ReadonlyMap<SystemId, readonly NodeRecord[]>;
  readonly segmentsOf: ReadonlyMap<SystemId, readonly SegmentRecord[]>;
}

export function indexOf(layout: Layout): LayoutIndex {
  const parentOf = new Map<NodeId, SegmentRecord>();
  const childrenOf = new Map<NodeId, SegmentRecord[]>();
  const equipmentOf = new Map<SystemId, NodeRecord>();
  const nodesOf = new Map<SystemId, NodeRecord[]>();
  const segmentsOf = new Map<SystemId, SegmentRecord[]>();
  for (const record of layout.records.values()) {
    if (record.kind === "node") {
      push(nodesOf, record.systemId, record);
      if (record.role === "equipment" && !equipmentOf.has(record.systemId)) equipmentOf.set(record.systemId, record);
    } else if (record.kind === "segment") {
      push(segmentsOf, record.systemId, record);
      push(childrenOf, record.fromNodeId, record);
      if (!parentOf.has(record.toNodeId)) parentOf.set(record.toNodeId, record);
    }
  }
  for (const children of childrenOf.values()) children.sort(byOrdinal);
  return { parentOf, childrenOf, equipmentOf, nodesOf, segmentsOf };
}

function push<K, V>(map: Map<K, V[]>, key: K, value: V): void {
  const list = map.get(key);
  if (list) list.push(value);
  else map.set(key, [value]);
}

const byOrdinal = (a: SegmentRecord, b: SegmentRecord) => a.ordinal - b.ordinal || (a.id < b.id ? -1 : 1);

/**
 * The segments of a system from the equipment outward, each before what hangs on it. Segments that do not hang together
 * with the equipment follow at the end, so that nothing is hidden.
 */
export function treeOf(index: LayoutIndex, systemId: SystemId): TreeRow[] {
  const rows: Omit<TreeRow, "number">[] = [];
  const seen = new Set<SegmentId>();
  const walk = (start: readonly SegmentRecord[]) => {
    // A stack of its own, since a riser may be deeper than the call stack is.
    const waiting = start.toReversed().map((segment) => ({ segment, depth: 0 }));
    for (let next = waiting.pop(); next; next = waiting.pop()) {
      if (seen.has(next.segment.id)) continue;
      seen.add(next.segment.id);
      rows.push(next);
      const children = index.childrenOf.get(next.segment.toNodeId) ?? [];
      // A single duct that goes on is the same run; only a branch steps in.
      const depth = next.depth + (children.length > 1 ? 1 : 0);
      for (const child of children.toReversed())
        waiting.push({ segment: child, depth: child === children[0] ? next.depth : depth });
    }
  };
  const equipment = index.equipmentOf.get(systemId);
  if (equipment) walk(index.childrenOf.get(equipment.id) ?? []);
  walk(index.segmentsOf.get(systemId) ?? []);
  const numbers = markNumbers(rows.map(({ segment }) => segment));
  return rows.map((row, at) => ({ ...row, number: numbers[at]! }));
}

/** For a new segment: one more than any that the system has, so that no mark is given a second time while it lives. */
export function nextNumber(index: LayoutIndex, systemId: SystemId): number {
  let highest = 0;
  const segments = index.segmentsOf.get(systemId) ?? [];
  for (const { number } of segments) highest = Math.max(highest, number ?? 0);
  return Math.max(highest, segments.length) + 1;
}

/** The segment and everything that hangs on it, it first. */
export function subtreeOf(index: LayoutIndex, root: SegmentRecord): SegmentRecord[] {
  const found: SegmentRecord[] = [];
  const seen = new Set<SegmentId>();
  const waiting = [root];
  for (let next = waiting.pop(); next; next = waiting.pop()) {
    if (seen.has(next.id)) continue;
    seen.add(next.id);
    found.push(next);
    waiting.push(...(index.childrenOf.get(next.toNodeId) ?? []).toReversed());
  }
  return found;
}

/** The ducts from the equipment to a node, in that order. */
export function pathTo(index: LayoutIndex, nodeId: NodeId): SegmentRecord[] {
  const path: SegmentRecord[] = [];
  const seen = new Set<NodeId>();
  for (let at = nodeId; !seen.has(at);) {
    seen.add(at);
    const parent = index.parentOf.get(at);
    if (!parent) break;
    path.unshift(parent);
    at = parent.fromNodeId;
  }
  return path;
}
