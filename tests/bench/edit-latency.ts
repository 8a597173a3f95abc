/** One duct's size saved durably, in units of the cheapest authenticated read of the same API. */
import type { SegmentRecord } from "@cleatwork/contracts";
import { randomUUID } from "node:crypto";
import { median, type Figure } from "./figure.ts";
import type { Member } from "./member.ts";

const ROUNDS = 60;
const WARM_UP = 20;

export async function editLatencyFigures(estimator: Member): Promise<readonly Figure[]> {
  const { body: projects } = await estimator.call("listProjects");
  const projectId = projects.items.find(({ name }) => name.includes("Marrow Creek"))?.id ?? "";
  const { body: layout } = await estimator.call("getLayout", { projectId });
  const found = layout.records.find((record): record is SegmentRecord => record.kind === "segment");
  if (!found) throw new Error("the demo's layout has no duct");

  let before = found;
  let baseSequence = layout.sequence;
  const reads: number[] = [];
  const edits: number[] = [];
  for (let round = 0; round < WARM_UP + ROUNDS; round++) {
    const read = await estimator.call("getMe");
    const after: SegmentRecord = { ...before, name: `edit ${round}` };
    const sets = [{ label: "Rename a duct", changes: [{ id: before.id, before, after }] }];
    const edit = await estimator.call("saveLayout", { projectId }, { batchId: randomUUID(), baseSequence, sets });
    before = after;
    baseSequence = edit.body.sequence;
    if (round < WARM_UP) continue;
    reads.push(read.taken_ms);
    edits.push(edit.taken_ms);
  }
  return [
    {
      what: `saving one edit in a layout of ${layout.records.length} records ÷ getMe`,
      figure: median(edits) / median(reads),
      unit: "×",
      most: null,
      note: `${median(edits).toFixed(1)} ms against ${median(reads).toFixed(1)} ms`,
    },
  ];
}
