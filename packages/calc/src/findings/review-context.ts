import { addFinding, type FindingList } from "../network/findings.ts";
import type { OutletNeeds } from "../network/paths.ts";
import type { FanDuty, FindingCode } from "../network/solution.ts";
import type { Tree } from "../network/tree-shape.ts";
import type { SolvedColumns } from "../network/write-segments.ts";

/** A solved system, as the rules of the review read it. */
export interface ReviewContext {
  readonly columns: SolvedColumns;
  readonly tree: Tree;
  readonly needs: OutletNeeds;
  readonly fan: FanDuty;
  readonly findings: FindingList;
}

interface Measured {
  readonly value: number;
  readonly limit: number;
  readonly unit: string;
  readonly limitSource: string;
}

export function markSegment(
  { columns, findings }: ReviewContext,
  s: number,
  code: FindingCode,
  measured: Measured,
): void {
  addFinding(findings, s, code, { kind: "segment", id: columns.system.segments[s]!.id }, measured);
}

/** Of an outlet, by its place among the outlets. */
export function markOutlet(context: ReviewContext, o: number, code: FindingCode, measured: Measured): void {
  const { columns, tree, findings } = context;
  const node = tree.outlets[o]!;
  addFinding(findings, tree.into[node]!, code, { kind: "node", id: columns.system.nodes[node]!.id }, measured);
}

export function markSystem({ columns, findings }: ReviewContext, code: FindingCode, measured: Measured): void {
  addFinding(findings, 0, code, { kind: "system", id: columns.system.id }, measured);
}
