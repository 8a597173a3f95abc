/** Ways out of a finding, each computed: it is tried on the system, and offered only when it helps. */
import type { AirSegment, AirSystem, Section } from "../air-system.ts";
import { solve } from "../network/solve.ts";
import type { Finding, Solution, SolvedSegment } from "../network/solution.ts";
import { meters } from "../quantity.ts";
import { withEdits, type Fix, type FixKind, type SegmentEdit } from "./fix.ts";
import { largerThan, smallerThan, squarerThan } from "./other-sizes.ts";

/** One inch of liner, as the first duct at a unit usually has it: common practice, no source. */
const LINER_M = meters(0.0254);
/** Ducts of a short path that are tried, those that lose most first. */
const MOST_DUCTS_TRIED = 6;

interface Case {
  readonly finding: Finding;
  readonly system: AirSystem;
  readonly solution: Solution;
}

/**
 * Fixes of a finding, the best of each kind. Every one was solved: with its edits the finding is gone, or nearer its limit, no
 * new finding of the same or a worse severity takes its place on the same duct, and the system still solves.
 *
 * Range    costs some ten solves for each kind of fix; findings of construction (seal class, slack, transition angle) have none,
 *          they are the spec's
 */
export function fixesFor(finding: Finding, system: AirSystem, solution: Solution): readonly Fix[] {
  const it = { finding, system, solution };
  switch (finding.code) {
    case "velocity-over-limit":
    case "friction-over-limit":
      return found([resized(it, "larger-duct", largerThan)]);
    case "velocity-low":
      return found([resized(it, "smaller-duct", smallerThan)]);
    case "aspect-ratio-high":
      return found([resized(it, "squarer-duct", squarerThan)]);
    case "duct-grows":
      return found([likeTheFeeding(it), resized(it, "smaller-duct", smallerThan)]);
    case "elbow-too-sharp":
      return found([
        refitted(it, "elbow-with-vanes", "elbow-square-throat-vanes"),
        refitted(it, "radius-elbow", "elbow-radius"),
      ]);
    case "damper-missing":
      return found([damped(it)]);
    case "flexible-too-long":
      return found([tried(it, "rigid-duct", [{ segmentId: finding.subject.id, fields: { flexible: false } }])]);
    case "unlined-near-equipment":
      return found([
        tried(it, "lined-duct", [
          { segmentId: finding.subject.id, fields: { insulation: { kind: "liner", thickness_m: LINER_M } } },
        ]),
      ]);
    case "pressure-short":
      return shortened(it);
    default:
      return [];
  }
}

const found = (fixes: readonly (Fix | null)[]): readonly Fix[] => fixes.filter((fix) => fix !== null);

/** Null where the edits do not help. */
function tried({ finding, system, solution }: Case, kind: FixKind, edits: readonly SegmentEdit[]): Fix | null {
  const after = solve(withEdits(system, edits));
  if (!after.ok) return null;
  const same = after.value.findings.find(({ id }) => id === finding.id);
  const clears = same === undefined;
  if (!clears && !(distance(same) < distance(finding) * 0.98)) return null;
  return spoils(finding, edits, solution, after.value) ? null : { kind, edits, clears };
}

const distance = ({ value, limit }: Finding): number => Math.abs(value - limit);

const RANK = { stop: 0, warn: 1, note: 2 } as const;

/** Another finding, as grave, comes up on a duct that the edits touch, or an outlet needs more than the governing one did. */
function spoils(finding: Finding, edits: readonly SegmentEdit[], before: Solution, after: Solution): boolean {
  const had = new Set(before.findings.map(({ id }) => id));
  const touched = new Set(edits.map(({ segmentId }) => segmentId));
  return after.findings.some(
    ({ id, code, severity, subject, value }) =>
      !had.has(id) &&
      (code === "pressure-short"
        ? value > before.requiredPressure_pa * (1 + 1e-6)
        : touched.has(subject.id) && RANK[severity] <= RANK[finding.severity]),
  );
}

function ductOf({ finding, system, solution }: Case): { segment: AirSegment; solved: SolvedSegment } | null {
  const segment = system.segments.find(({ id }) => id === finding.subject.id);
  const solved = solution.segments.find(({ segmentId }) => segmentId === finding.subject.id);
  return segment && solved ? { segment, solved } : null;
}

/** The size that stands in the layout, or was found by the rule. */
const sizeOf = ({ segment, solved }: { segment: AirSegment; solved: SolvedSegment }): Section =>
  segment.section ?? solved.section;

/** The first of the sizes that clears the finding; else the one that helps most. */
function resized(it: Case, kind: FixKind, sizes: (section: Section) => readonly Section[]): Fix | null {
  const duct = ductOf(it);
  if (!duct) return null;
  let helps: Fix | null = null;
  for (const section of sizes(sizeOf(duct))) {
    const fix = tried(it, kind, [{ segmentId: duct.segment.id, fields: { section } }]);
    if (fix?.clears) return fix;
    helps ??= fix;
  }
  return helps;
}

function refitted(it: Case, kind: FixKind, fitting: AirSegment["fitting"]): Fix | null {
  return tried(it, kind, [{ segmentId: it.finding.subject.id, fields: { fitting } }]);
}

/** The feeding duct takes the size of the one that it feeds. */
function likeTheFeeding(it: Case): Fix | null {
  const duct = ductOf(it);
  if (!duct) return null;
  const feeding = it.system.segments.find(({ toNodeId }) => toNodeId === duct.segment.fromNodeId);
  if (!feeding) return null;
  return tried(it, "larger-duct", [{ segmentId: feeding.id, fields: { section: sizeOf(duct) } }]);
}

/** A damper in the outlet's last duct, turned to take the excess up. */
function damped(it: Case): Fix | null {
  const path = it.solution.paths.find(({ outletNodeId }) => outletNodeId === it.finding.subject.id);
  const segment = it.system.segments.find(({ id }) => id === path?.damper?.segmentId);
  if (!segment || typeof path?.damper?.angle_rad !== "number") return null;
  return tried(it, "balancing-damper", [
    {
      segmentId: segment.id,
      fields: { accessories: [...segment.accessories, "volume-damper"], damperAngle_rad: path.damper.angle_rad },
    },
  ]);
}

/** On a path that needs too much, a larger duct where most is lost, or a better elbow there: the two that save most. */
function shortened(it: Case): readonly Fix[] {
  const path = it.solution.paths.find(({ outletNodeId }) => outletNodeId === it.finding.subject.id);
  if (!path) return [];
  const onPath = new Set(path.segmentIds);
  const worst = it.solution.segments
    .filter(({ segmentId }) => onPath.has(segmentId))
    .sort((a, b) => b.totalPressureLoss_pa - a.totalPressureLoss_pa)
    .slice(0, MOST_DUCTS_TRIED);
  const offers: { fix: Fix; required: number }[] = [];
  for (const solved of worst) {
    const segment = it.system.segments.find(({ id }) => id === solved.segmentId)!;
    const [larger] = largerThan(sizeOf({ segment, solved }));
    if (larger) offer("larger-duct", { segmentId: segment.id, fields: { section: larger } });
    if (solved.fittings.some(({ type }) => type === "elbow-square-throat")) {
      offer("elbow-with-vanes", { segmentId: segment.id, fields: { fitting: "elbow-square-throat-vanes" } });
    }
  }
  return offers
    .sort((a, b) => a.required - b.required)
    .slice(0, 2)
    .map(({ fix }) => fix);

  function offer(kind: FixKind, edit: SegmentEdit): void {
    const fix = tried(it, kind, [edit]);
    const after = solve(withEdits(it.system, [edit]));
    if (!fix || !after.ok) return;
    const required = after.value.paths.find(({ outletNodeId }) => outletNodeId === it.finding.subject.id);
    offers.push({ fix, required: required?.requiredPressure_pa ?? Infinity });
  }
}
