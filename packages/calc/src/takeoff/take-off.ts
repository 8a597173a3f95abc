/** The metal stage: a solved system in, pieces to make and things to count out. */
import type { Section } from "../air-system.ts";
import { isElbow } from "../fittings/infer.ts";
import type { Solution } from "../network/solution.ts";
import { KILOGRAMS_PER_POUND, meters, type Meters } from "../quantity.ts";
import { checkAllowances, countAllowances } from "./allowances.ts";
import { countHardware } from "./count-hardware.ts";
import { countAccessories, countDevices, countHangers, countSealant, levelOf, sheetOf } from "./count-items.ts";
import { cutStraight } from "./cut-straight.ts";
import { frameOf, type Frame } from "./frame.ts";
import { heavyPiece } from "./making.table.ts";
import { fittingPiece, flexiblePiece, marked, straightPiece, type PieceOrigin } from "./make-piece.ts";
import { checkJoints, isLighterThanScheduled, missingHours } from "./schedule-findings.ts";
import { NO_OVERRIDES, pieceQuestion, straightConstruction } from "./gauge.ts";
import { fittingMark, straightMark } from "./marks.ts";
import type { FittingPlans } from "./fitting-plan.ts";
import { planFittings } from "./plan-fittings.ts";
import { inputsOf, isForSame, isSame, systemKey, type TakeoffMemory } from "./remember.ts";
import { totalsOf } from "./totals.ts";
import type { CountedItem, Piece, Takeoff, TakeoffFinding, TakeoffInput } from "./takeoff.ts";

/**
 * Every piece of a system with gauge, joints, areas, weight and hours, and what is counted beside them.
 *
 * Segments are measured along the center line; fittings come out of the straight where their length is known (see
 * plan-fittings.ts). Straight duct is cut in sections of the spec's length and a short piece. Every piece brings the joint
 * at its end nearer the equipment. A size or pressure that the schedule does not hold gives a piece without gauge or
 * weight and a finding that stops.
 *
 * Throws when the solution is of another system: that is ours to prevent, not a person's to mend.
 *
 * Range    cost is linear in pieces
 */
export const takeOff = (input: TakeoffInput, solution: Solution): Takeoff => run(input, solution, null);

/**
 * A takeoff that remembers: taken again after an edit, it makes anew only the pieces of segments whose own inputs changed,
 * and answers the very records of before for the rest. The same answer as `takeOff`, always.
 */
export function createTakeoff(): typeof takeOff {
  let memory: TakeoffMemory | null = null;
  return (input, solution) => {
    const before = memory && isForSame(memory, input) ? memory : null;
    memory = { spec: input.system.spec, standards: input.standards, systemKey: systemKey(input), parts: new Map() };
    return run(input, solution, { before, now: memory });
  };
}

interface SegmentParts {
  readonly pieces: readonly Piece[];
  readonly items: readonly CountedItem[];
  readonly findings: readonly TakeoffFinding[];
}

function run(
  { system, standards }: TakeoffInput,
  solution: Solution,
  memories: { readonly before: TakeoffMemory | null; readonly now: TakeoffMemory } | null,
): Takeoff {
  const frame = frameOf(system, solution, standards);
  const plans = planFittings(frame);
  const pieces: Piece[] = [];
  const items: CountedItem[] = [];
  const findings: TakeoffFinding[] = [];

  for (let s = 0; s < system.segments.length; s++) {
    const { id } = system.segments[s]!;
    let parts: SegmentParts;
    if (memories) {
      const inputs = inputsOf(frame, plans, s);
      const kept = memories.before?.parts.get(id);
      parts = kept && isSame(kept.inputs, inputs) ? kept.parts : partsOf(frame, plans, s);
      memories.now.parts.set(id, { inputs, parts });
    } else {
      parts = partsOf(frame, plans, s);
    }
    for (const piece of parts.pieces) pieces.push(piece);
    for (const item of parts.items) items.push(item);
    for (const finding of parts.findings) findings.push(finding);
  }

  const madeElbows = plans.of.map((list) => list.filter(({ type }) => isElbow(type)).length);
  checkJoints(frame, pieces, findings);
  for (const item of countHangers(frame, madeElbows)) items.push(item);
  for (const item of countDevices(frame)) items.push(item);
  for (const item of countAllowances(frame, pieces)) items.push(item);
  checkAllowances(frame, { pieces, items }, findings);
  return { systemId: system.id, pieces, items, totals: totalsOf(pieces, items), findings };
}

function partsOf(frame: Frame, plans: FittingPlans, s: number): SegmentParts {
  const findings: TakeoffFinding[] = [];
  const pieces = piecesOf(frame, plans, s, findings);
  const items: CountedItem[] = [];
  const sealant = countSealant(frame, s, pieces);
  if (sealant) items.push(sealant);
  for (const item of countHardware(frame, s, pieces, frame.insulation[s]!)) items.push(item);
  for (const item of countAccessories(frame, s)) items.push(item);
  checkSegment(frame, s, pieces, findings);
  return { pieces, items, findings };
}

function piecesOf(frame: Frame, plans: FittingPlans, s: number, findings: TakeoffFinding[]): Piece[] {
  const { system, standards, metal } = frame;
  const { spec } = system;
  const segment = system.segments[s]!;
  const section = metal[s]!;
  const number = frame.numbers[s]!;
  const origin: PieceOrigin = {
    systemId: system.id,
    systemTag: system.tag,
    levelId: levelOf(frame, s),
    sheet: sheetOf(frame, s),
    segmentId: segment.id,
    segmentName: segment.name,
    spec,
    standards,
    readGauge: frame.readGauge,
    readHours: frame.readHours,
    gaugeOverride: segment.gauge ?? null,
    supply: segment.supply ?? null,
    insulation: segment.flexible ? { kind: "none" } : frame.insulation[s]!,
  };

  const pieces: Piece[] = [];
  const made = { elbow: 0, transition: 0, branch: 0, "end-cap": 0 };
  for (const plan of plans.of[s]!) {
    pieces.push(fittingPiece(origin, fittingMark(number, plan.kind, made[plan.kind]++), plan));
  }

  const straight = straightLength(frame, plans, s, findings);
  if (segment.flexible) {
    if (straight > 0) pieces.push(flexiblePiece(origin, straightMark(number, 0), section, straight));
    return pieces;
  }
  const shape = section.shape === "annular" ? "round" : section.shape === "flat-oval" ? "flatOval" : section.shape;
  const sectionLength =
    (spec.constructionFromSchedule ? scheduledLength(frame, section) : null) ?? spec.sectionLength_m[shape];
  const { whole, rest } = cutStraight(straight, sectionLength);
  if (whole > 0) {
    const first = straightPiece(origin, straightMark(number, 0), section, sectionLength);
    pieces.push(first);
    for (let place = 1; place < whole; place++) pieces.push(marked(first, straightMark(number, place)));
  }
  if (rest > 0) pieces.push(straightPiece(origin, straightMark(number, whole), section, rest));
  return pieces;
}

/** How long the schedule has straight pieces of this size made; null where it does not say. */
const scheduledLength = ({ readGauge, system: { spec } }: Frame, section: Section): Meters | null =>
  readGauge(pieceQuestion(section, straightConstruction(section, spec), spec), NO_OVERRIDES).sectionLength_m;

/** What fittings leave of a segment. Where they need more than there is, no straight is left and the estimator is told. */
function straightLength(frame: Frame, plans: FittingPlans, s: number, findings: TakeoffFinding[]): Meters {
  const { length_m, segmentId } = frame.solution.segments[s]!;
  const taken = plans.near[s]! + plans.far[s]!;
  if (taken > length_m + 1e-9) {
    findings.push({
      id: `${segmentId}:fittings-fill-segment`,
      code: "fittings-fill-segment",
      severity: "note",
      segmentId,
      message: `${nameOf(frame, s)}: its fittings take ${taken.toFixed(2)} m, the segment is ${length_m.toFixed(2)} m long`,
    });
    return meters(0);
  }
  return meters(length_m - taken);
}

const nameOf = ({ system, numbers }: Frame, s: number): string => {
  const { name } = system.segments[s]!;
  return name === "" ? `Segment ${numbers[s]!}` : `Segment ${numbers[s]!}, ${name}`;
};

function checkSegment(frame: Frame, s: number, pieces: readonly Piece[], findings: TakeoffFinding[]): void {
  const { system } = frame;
  const segmentId = system.segments[s]!.id;
  const add = (code: TakeoffFinding["code"], severity: TakeoffFinding["severity"], message: string) =>
    findings.push({
      id: `${segmentId}:${code}`,
      code,
      severity,
      segmentId,
      message: `${nameOf(frame, s)}: ${message}`,
    });

  const ungauged = pieces.filter(({ kind, gauge }) => kind !== "flexible" && gauge === null);
  if (ungauged.length > 0) {
    add(
      "gauge-not-in-schedule",
      "stop",
      `${ungauged.map(({ mark }) => mark).join(", ")} not in the schedule (${ungauged[0]!.gaugeSource}); counted without weight or hours`,
    );
  }
  const lighter = pieces.filter(isLighterThanScheduled);
  if (lighter.length > 0) {
    const { gauge, scheduledGauge, gaugeSource } = lighter[0]!;
    add(
      "gauge-lighter-than-schedule",
      "warn",
      `${lighter.map(({ mark }) => mark).join(", ")} in ${gauge ?? ""}, ${gaugeSource}; the schedule asks for ${scheduledGauge ?? ""}`,
    );
  }
  const { shop_h, field_h } = missingHours(pieces);
  if (shop_h.length + field_h.length > 0) {
    add(
      "hours-not-in-table",
      "warn",
      `"${frame.standards.productivity.name}" has no shop hours for ${shop_h.join(", ") || "none"}, no field hours for ${field_h.join(", ") || "none"} of its pieces: they count as nothing`,
    );
  }
  const heavy = pieces.filter(({ weight_kg }) => weight_kg > heavyPiece.weight_lb * KILOGRAMS_PER_POUND);
  if (heavy.length > 0) {
    add(
      "piece-too-heavy",
      "note",
      `${heavy.map(({ mark }) => mark).join(", ")} over ${heavyPiece.weight_lb} lb: lift with gear`,
    );
  }
  if (system.segments[s]!.accessories.some((kind) => kind === "fire-damper" || kind === "smoke-damper")) {
    add("accessory-needs-review", "warn", "fire damper: rating, sleeve and access by the design's engineer");
  }
}
