import type { DuctClass } from "../air-system.ts";
import type { Finding, FindingCode, FindingSeverity } from "./solution.ts";

export const findingSeverity: Readonly<Record<FindingCode, FindingSeverity>> = {
  "size-not-found": "stop",
  "pressure-short": "stop",
  "pressure-class-exceeded": "stop",
  "velocity-over-limit": "warn",
  "friction-over-limit": "warn",
  "flexible-too-long": "warn",
  "aspect-ratio-high": "warn",
  "table-range-exceeded": "note",
  "flow-transitional": "note",
  "damper-missing": "warn",
  "margin-short": "warn",
  "seal-class-low": "warn",
  "duct-grows": "warn",
  "elbow-too-sharp": "warn",
  "leakage-high": "warn",
  "turn-near-equipment": "warn",
  "transition-abrupt": "warn",
  "outlet-over-pressured": "note",
  "paths-unequal": "note",
  "reserve-large": "note",
  "velocity-low": "note",
  "unlined-near-equipment": "note",
  "flexible-slack": "note",
  "fittings-too-close": "note",
};

export const limitSources = {
  velocity: (ductClass: DuctClass) => `This system's velocity limit for a ${ductClass}`,
  friction: (ductClass: DuctClass) => `This system's friction limit for a ${ductClass}`,
  flexibleLength: "This system's limit for flexible duct",
  available: "Pressure that the equipment gives this duct system",
  pressureClass: "Pressure class of the construction spec",
  aspectRatio: "An owner's design handbook: at most 4 to 1",
  transitional: "Common practice, no source: turbulent from a Reynolds number of 4,000",
} as const;

export const MOST_ASPECT_RATIO = 4;

const RANK: Readonly<Record<FindingSeverity, number>> = { stop: 0, warn: 1, note: 2 };

/** Findings with the place in the system that they belong to, to be put in order at the end. */
export interface FindingList {
  readonly findings: { readonly finding: Finding; readonly place: number }[];
}

export function addFinding(
  list: FindingList,
  place: number,
  code: FindingCode,
  subject: Finding["subject"],
  measured: Pick<Finding, "value" | "limit" | "unit" | "limitSource">,
): void {
  const { value, limit, unit, limitSource } = measured;
  const finding = {
    id: `${code}:${subject.id}`,
    code,
    severity: findingSeverity[code],
    subject,
    value,
    limit,
    unit,
    limitSource,
  };
  list.findings.push({ finding, place });
}

/** By severity, then by place; one of each code for a subject, the first found. */
export function inOrder({ findings }: FindingList): Finding[] {
  findings.sort((a, b) => RANK[a.finding.severity] - RANK[b.finding.severity] || a.place - b.place);
  const seen = new Set<string>();
  return findings.map(({ finding }) => finding).filter(({ id }) => !seen.has(id) && seen.add(id));
}
