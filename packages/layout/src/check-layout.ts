/** What makes a layout unsound. The server refuses to store such a layout; the browser says so before it is sent. */
import type { Section } from "@cleatwork/calc";
import type { NodeId, NodeRecord, RecordId, SegmentRecord } from "@cleatwork/contracts";
import { nameOf, type Layout } from "./layout.ts";

export interface LayoutProblem {
  readonly code:
    | "reference-unknown"
    | "reference-other-system"
    | "segment-loops"
    | "node-has-two-parents"
    | "several-equipment"
    | "equipment-has-parent"
    | "outlet-has-children"
    | "size-not-positive"
    | "flat-oval-taller-than-wide"
    | "inner-not-smaller-than-outer"
    | "flexible-not-round";
  readonly recordId: RecordId;
  readonly name: string;
  readonly field: string;
  readonly value: unknown;
  /** What is allowed, in words. */
  readonly message: string;
}

/** Every problem, not the first. */
export function checkLayout(layout: Layout): LayoutProblem[] {
  const problems: LayoutProblem[] = [];
  const nodes = new Map<NodeId, NodeRecord>();
  const segments: SegmentRecord[] = [];
  const equipment = new Map<string, NodeRecord>();

  const report = (
    record: { id: RecordId } & Parameters<typeof nameOf>[0],
    problem: Omit<LayoutProblem, "recordId" | "name">,
  ) => problems.push({ recordId: record.id, name: nameOf(record), ...problem });

  for (const record of layout.records.values()) {
    if (record.kind === "segment") segments.push(record);
    if (record.kind !== "node") continue;
    nodes.set(record.id, record);
    for (const [field, kind] of [
      ["systemId", "system"],
      ["levelId", "level"],
    ] as const)
      if (layout.records.get(record[field])?.kind !== kind)
        report(record, { code: "reference-unknown", field, value: record[field], message: `a ${kind} of this layout` });
    if (record.role !== "equipment") continue;
    if (equipment.has(record.systemId))
      report(record, {
        code: "several-equipment",
        field: "role",
        value: "equipment",
        message: "one piece of equipment for each system",
      });
    else equipment.set(record.systemId, record);
  }

  const parents = new Map<NodeId, SegmentRecord>();
  for (const segment of segments) {
    if (layout.records.get(segment.systemId)?.kind !== "system")
      report(segment, {
        code: "reference-unknown",
        field: "systemId",
        value: segment.systemId,
        message: "a system of this layout",
      });
    for (const field of ["fromNodeId", "toNodeId"] as const) {
      const node = nodes.get(segment[field]);
      if (!node)
        report(segment, { code: "reference-unknown", field, value: segment[field], message: "a node of this layout" });
      else if (node.systemId !== segment.systemId)
        report(segment, {
          code: "reference-other-system",
          field,
          value: segment[field],
          message: "a node of the same system",
        });
    }
    if (parents.has(segment.toNodeId))
      report(segment, {
        code: "node-has-two-parents",
        field: "toNodeId",
        value: segment.toNodeId,
        message: "a node that no other duct leads to",
      });
    else parents.set(segment.toNodeId, segment);
    if (nodes.get(segment.toNodeId)?.role === "equipment")
      report(segment, {
        code: "equipment-has-parent",
        field: "toNodeId",
        value: segment.toNodeId,
        message: "a node away from the equipment",
      });
    if (nodes.get(segment.fromNodeId)?.role === "outlet")
      report(segment, {
        code: "outlet-has-children",
        field: "fromNodeId",
        value: segment.fromNodeId,
        message: "a node that is not an outlet: nothing hangs on an outlet",
      });
    for (const problem of sectionProblems(segment)) report(segment, problem);
  }

  for (const segment of loopsAmong(segments, parents))
    report(segment, {
      code: "segment-loops",
      field: "fromNodeId",
      value: segment.fromNodeId,
      message: "a node that this duct does not itself feed",
    });
  return problems;
}

function sectionProblems(segment: SegmentRecord): Omit<LayoutProblem, "recordId" | "name">[] {
  const { section } = segment;
  const found: Omit<LayoutProblem, "recordId" | "name">[] = [];
  if (section) {
    for (const [side, value] of Object.entries(section))
      if (typeof value === "number" && !(value > 0))
        found.push({ code: "size-not-positive", field: `section/${side}`, value, message: "more than zero" });
    found.push(...shapeProblems(section));
  }
  if (segment.flexible && section && section.shape !== "round")
    found.push({
      code: "flexible-not-round",
      field: "section/shape",
      value: section.shape,
      message: "round, since the duct is flexible",
    });
  return found;
}

function shapeProblems(section: Section): Omit<LayoutProblem, "recordId" | "name">[] {
  if (section.shape === "flat-oval" && section.height_m > section.width_m)
    return [
      {
        code: "flat-oval-taller-than-wide",
        field: "section/height_m",
        value: section.height_m,
        message: `${section.width_m} m at most, the width`,
      },
    ];
  if (section.shape === "annular" && section.innerDiameter_m >= section.outerDiameter_m)
    return [
      {
        code: "inner-not-smaller-than-outer",
        field: "section/innerDiameter_m",
        value: section.innerDiameter_m,
        message: `less than ${section.outerDiameter_m} m, the outer diameter`,
      },
    ];
  return [];
}

/** One segment of each loop: following parents from it leads back to it. Each segment is walked once. */
function loopsAmong(segments: readonly SegmentRecord[], parents: ReadonlyMap<NodeId, SegmentRecord>): SegmentRecord[] {
  const settled = new Set<SegmentRecord>();
  const found: SegmentRecord[] = [];
  for (const start of segments) {
    const trail = new Set<SegmentRecord>();
    let at: SegmentRecord | undefined = start;
    while (at && !settled.has(at) && !trail.has(at)) {
      trail.add(at);
      at = parents.get(at.fromNodeId);
    }
    if (at && trail.has(at)) found.push(at);
    for (const segment of trail) settled.add(segment);
  }
  return found;
}
