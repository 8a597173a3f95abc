/** What the run tool asks for, as one edit: a tap splits the duct it stands on first. */
import {
  parseAirflow,
  parseLength,
  parseSize,
  inchesOfWater,
  type CubicMetersPerSecond,
  type Section,
} from "@cleatwork/calc";
import type { ChangeSet, UnitSystem } from "@cleatwork/contracts";
import {
  applyChangeSet,
  extendRun,
  merge,
  splitSegment,
  type CommandResult,
  type IdSource,
  type Layout,
} from "@cleatwork/layout";
import type { PlanPoint } from "./core/camera.ts";
import type { Snap } from "./core/snapping.ts";
import { runEnd } from "./tools/draw-run/draw-run.ts";
import type { Anchor, RunDraft } from "./tools/tool.ts";

/** What an outlet needs until it is said: a usual figure for a ceiling diffuser. Common practice, no source. */
const OUTLET_NEEDS = inchesOfWater(0.05);

export interface PlacedRun {
  readonly set: ChangeSet;
  readonly nodeId: string;
  readonly at: PlanPoint;
  readonly isOutlet: boolean;
}

export function placeRun(
  layout: Layout,
  input: { anchor: Anchor; to: Snap; draft: RunDraft; units: UnitSystem },
  ids: IdSource,
): { readonly ok: true; readonly value: PlacedRun } | { readonly ok: false; readonly message: string } {
  const typed = readDraft(input.draft, input.units);
  if (!typed.ok) return typed;
  if (input.to.kind === "node" && typed.length_m === null)
    return { ok: false, message: "A run ends at a new place: two ducts cannot lead to one joint." };
  const at = runEnd(input.anchor, input.to, typed.length_m);

  let now = layout;
  const sets: ChangeSet[] = [];
  const take = (result: CommandResult): string | null => {
    if (!result.ok) return result.problems[0]?.message ?? "This cannot be placed.";
    const applied = applyChangeSet(now, result.value);
    if (!applied.ok) return "The layout has changed meanwhile.";
    now = applied.value;
    sets.push(result.value);
    return null;
  };

  let fromNodeId = input.anchor.kind === "node" ? input.anchor.nodeId : "";
  if (input.anchor.kind === "duct") {
    const wrong = take(splitSegment(now, input.anchor, ids));
    if (wrong) return { ok: false, message: wrong };
    fromNodeId = sets[0]?.changes[0]?.id ?? "";
  }
  const outlet =
    typed.airflow_m3s === null
      ? null
      : { airflow_m3s: typed.airflow_m3s, requiredPressure_pa: OUTLET_NEEDS, deviceKey: null, spaceName: "", tag: "" };
  const duct = {
    ...(typed.section ? { section: typed.section } : {}),
    ...(input.anchor.kind === "duct" ? { ductClass: "branch" as const } : {}),
    ...(outlet ? { ductClass: "runout" as const } : {}),
  };
  const wrong = take(extendRun(now, { fromNodeId, to: { kind: "point", ...at }, duct, outlet }, ids));
  if (wrong) return { ok: false, message: wrong };
  const nodeId = sets.at(-1)?.changes[0]?.id ?? "";
  return { ok: true, value: { set: merge("Add run", sets), nodeId, at, isOutlet: outlet !== null } };
}

type ReadDraft =
  | {
      readonly ok: true;
      readonly length_m: number | null;
      readonly section: Section | null;
      readonly airflow_m3s: CubicMetersPerSecond | null;
    }
  | { readonly ok: false; readonly message: string };

/** What is typed beside the pointer; empty leaves it to the pointer and to sizing. */
export function readDraft(draft: RunDraft, units: UnitSystem): ReadDraft {
  const length = draft.length.trim() === "" ? null : parseLength(draft.length, units);
  const size = draft.size.trim() === "" || draft.size.trim() === "=" ? null : parseSize(draft.size, units, "round");
  const airflow = draft.airflow.trim() === "" ? null : parseAirflow(draft.airflow, units);
  for (const parsed of [length, size, airflow])
    if (parsed && !parsed.ok) return { ok: false, message: parsed.problems[0]?.message ?? "" };
  return {
    ok: true,
    length_m: length?.ok ? length.value : null,
    section: size?.ok ? size.value : null,
    airflow_m3s: airflow?.ok ? airflow.value : null,
  };
}
