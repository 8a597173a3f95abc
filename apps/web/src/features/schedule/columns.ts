/** The columns of the schedule: what each shows, and what typing into it does. */
import {
  DUCT_CLASSES,
  decimal,
  formatAirflow,
  formatFrictionRate,
  formatLength,
  formatPressure,
  formatSize,
  formatVelocity,
  meters,
  parseAirflow,
  parseLength,
  parseSize,
  type DuctClass,
  type SolvedSegment,
} from "@cleatwork/calc";
import type { SegmentRecord, UnitSystem } from "@cleatwork/contracts";
import {
  find,
  lengthOfSegment,
  setLength,
  setNodes,
  setSegments,
  type CommandResult,
  type Layout,
  type LayoutIndex,
  type TreeRow,
} from "@cleatwork/layout";
import { fittingNames } from "../inspector/index.ts";

export interface ScheduleRow extends TreeRow {
  readonly solved: SolvedSegment | null;
  /** Number of the duct it hangs on, or the tag of the equipment. */
  readonly from: string;
  readonly foldable: boolean;
}

export interface Sheet {
  readonly layout: Layout;
  readonly index: LayoutIndex;
  readonly units: UnitSystem;
}

export type Typed =
  | { readonly ok: true; readonly command: (layout: Layout) => CommandResult }
  | { readonly ok: false; readonly message: string };

export interface ScheduleColumn {
  readonly id: string;
  readonly head: string;
  /** Pixels. */
  readonly width: number;
  readonly align?: "right";
  readonly text: (row: ScheduleRow, sheet: Sheet) => string;
  /** What a text typed into the cell does; absent where the cell is a result. */
  readonly type?: (row: ScheduleRow, text: string, sheet: Sheet) => Typed;
}

export const fails = (problems: readonly { readonly message: string }[]): Typed => ({
  ok: false,
  message: problems[0]?.message ?? "",
});
const set = (row: ScheduleRow, label: string, fields: Partial<SegmentRecord>): Typed => ({
  ok: true,
  command: (layout) => setSegments(layout, { ids: [row.segment.id], fields, label }),
});

export const columnsFor = (units: UnitSystem): readonly ScheduleColumn[] => [
  { id: "number", head: "No.", width: 44, align: "right", text: (row) => String(row.number) },
  {
    id: "name",
    head: "Segment",
    width: 220,
    text: (row) => row.segment.name,
    type: (row, text) => set(row, "Name", { name: text.trim().slice(0, 80) }),
  },
  { id: "from", head: "From", width: 56, align: "right", text: (row) => row.from },
  { id: "class", head: "Class", width: 72, text: (row) => row.segment.ductClass, type: typeClass },
  {
    id: "airflow",
    head: units === "si" ? "L/s" : "cfm",
    width: 76,
    align: "right",
    text: airflowText,
    type: typeAirflow,
  },
  {
    id: "size",
    head: units === "si" ? "Size, mm" : "Size, in.",
    width: 104,
    align: "right",
    text: sizeText,
    type: typeSize,
  },
  { id: "length", head: "Length", width: 88, align: "right", text: lengthText, type: typeLength },
  {
    id: "fittings",
    head: "Fittings, inferred",
    width: 176,
    text: (row) =>
      [
        ...(row.solved?.fittings ?? []).map(({ type }) => fittingNames[type].toLowerCase()),
        ...row.segment.accessories.map((kind) => kind.replaceAll("-", " ")),
      ].join(", "),
  },
  result(
    "velocity",
    units === "si" ? "m/s" : "fpm",
    64,
    (solved) => formatVelocity(solved.meanVelocity_m_s, units).value,
  ),
  { id: "share", head: "Share of limit", width: 104, text: () => "" },
  result(
    "friction",
    units === "si" ? "Pa/m" : "per 100 ft",
    76,
    (solved) => formatFrictionRate(solved.frictionRate_pa_m, units).value,
  ),
  result("loss", "Loss", 64, (solved) => formatPressure(solved.totalPressureLoss_pa, units).value),
  result("left", "Left", 64, (solved) => formatPressure(solved.pressureLeftLeaving_pa, units).value),
  result("reynolds", "Re, k", 60, (solved) => decimal(solved.reynoldsNumber / 1000, 0)),
];

function result(id: string, head: string, width: number, text: (solved: SolvedSegment) => string): ScheduleColumn {
  return { id, head, width, align: "right", text: (row) => (row.solved ? text(row.solved) : "") };
}

function airflowText(row: ScheduleRow, { layout, units }: Sheet): string {
  const end = find(layout, "node", row.segment.toNodeId);
  const airflow = end?.role === "outlet" ? end.airflow_m3s : (row.solved?.volumetricFlowRate_m3s ?? null);
  return airflow === null ? "" : formatAirflow(airflow, units).value;
}

function sizeText(row: ScheduleRow, { units }: Sheet): string {
  const section = row.segment.section ?? row.solved?.section;
  return section ? `${formatSize(section, units).text}${row.segment.flexible ? " flex" : ""}` : "";
}

const lengthText = (row: ScheduleRow, { layout, units }: Sheet): string =>
  formatLength(meters(lengthOfSegment(layout, row.segment)), units).text;

function typeClass(row: ScheduleRow, text: string): Typed {
  const wanted = text.trim().toLowerCase();
  const ductClass = DUCT_CLASSES.find((each) => wanted !== "" && each.startsWith(wanted));
  return ductClass
    ? set(row, `Class ${ductClass}`, { ductClass: ductClass satisfies DuctClass })
    : { ok: false, message: "Type main, branch or runout; the first letter is enough." };
}

/** Air is said where it leaves: at the end of a run. What a trunk carries is the sum. */
function typeAirflow(row: ScheduleRow, text: string, { index, units }: Sheet): Typed {
  if ((index.childrenOf.get(row.segment.toNodeId) ?? []).length > 0)
    return { ok: false, message: "This duct goes on: its airflow is the sum of its outlets." };
  if (text.trim() === "")
    return {
      ok: true,
      command: (layout) =>
        setNodes(layout, {
          ids: [row.segment.toNodeId],
          fields: { role: "junction", airflow_m3s: null, requiredPressure_pa: null, deviceKey: null },
          label: "Take outlet away",
        }),
    };
  const parsed = parseAirflow(text, units);
  if (!parsed.ok) return fails(parsed.problems);
  if (!(parsed.value > 0))
    return { ok: false, message: "An outlet moves some air. Empty the cell to take the outlet away." };
  return {
    ok: true,
    command: (layout) =>
      setNodes(layout, {
        ids: [row.segment.toNodeId],
        fields: { role: "outlet", airflow_m3s: parsed.value },
        label: `Airflow ${formatAirflow(parsed.value, units).text}`,
      }),
  };
}

function typeSize(row: ScheduleRow, text: string, { units }: Sheet): Typed {
  const typed = text.trim();
  if (typed === "" || typed === "=") return set(row, "Leave size to sizing", { section: null });
  const flexible = /\s?flex(ible)?$/i.test(typed);
  const bare = row.segment.section?.shape === "round" || row.segment.flexible || flexible ? "round" : "refuse";
  const parsed = parseSize(typed.replace(/\s?flex(ible)?$/i, ""), units, bare);
  if (!parsed.ok) return fails(parsed.problems);
  const round = parsed.value.shape === "round";
  return set(row, `Size ${formatSize(parsed.value, units).text}`, {
    section: parsed.value,
    flexible: flexible || (row.segment.flexible && round),
  });
}

function typeLength(row: ScheduleRow, text: string, { units, index }: Sheet): Typed {
  const parsed = parseLength(text, units);
  return parsed.ok
    ? { ok: true, command: (layout) => setLength(layout, { segmentId: row.segment.id, length_m: parsed.value }, index) }
    : fails(parsed.problems);
}
