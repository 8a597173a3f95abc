/** Which values of the schedules changed, in words: for the history and for the audit trail. */
import {
  METERS_PER_INCH,
  PASCALS_PER_INCH_OF_WATER,
  shippedPractice,
  shippedStandards,
  type CompanyHours,
  type CompanyStandards,
  type GaugeChart,
  type GaugeRow,
  type GaugeSchedule,
  type HoursRow,
  type PracticeCoefficients,
} from "@cleatwork/calc";
import { chartKey, type StandardsChange } from "@cleatwork/contracts";

type Values = Readonly<Record<string, string>>;

/** Subject → field → value. Two documents compare as two such maps; order and layout of the document do not count. */
type Facts = Map<string, Values>;

/**
 * Where one document has charts of a metal and shape, or hours, and the other leaves them to what is shipped, the shipped
 * values stand for it: whoever copies a schedule and changes one cell has changed one cell, and whose it is.
 */
export function standardsChanges(before: CompanyStandards, after: CompanyStandards): StandardsChange[] {
  const changes = ownerChanges(before, after);
  const [old, now] = [factsOf(filledFrom(before, after)), factsOf(filledFrom(after, before))];
  for (const subject of new Set([...old.keys(), ...now.keys()])) {
    const [was, is] = [old.get(subject) ?? {}, now.get(subject) ?? {}];
    for (const field of new Set([...Object.keys(was), ...Object.keys(is)]))
      if (was[field] !== is[field])
        changes.push({ subject, field, before: was[field] ?? null, after: is[field] ?? null });
  }
  return changes;
}

const kindOf = ({ material, shape }: GaugeChart) => `${material} ${shape}`;
const kindsIn = ({ gauges }: CompanyStandards) => new Set((gauges?.rows ?? []).map(kindOf));

function ownerChanges(before: CompanyStandards, after: CompanyStandards): StandardsChange[] {
  const changes: StandardsChange[] = [];
  const tell = (subject: string, had: boolean, has: boolean) => {
    const owner = (own: boolean) => (own ? "ours" : "shipped");
    if (had !== has) changes.push({ subject, field: "schedule", before: owner(had), after: owner(has) });
  };
  const [old, now] = [kindsIn(before), kindsIn(after)];
  for (const kind of new Set([...old, ...now])) tell(kind, old.has(kind), now.has(kind));
  tell("Hours", before.hours !== null, after.hours !== null);
  tell("Loss coefficients", Boolean(before.coefficients), Boolean(after.coefficients));
  return changes;
}

/** A document with the shipped values where the other has its own and this has none. */
function filledFrom(document: CompanyStandards, other: CompanyStandards): CompanyStandards {
  const own = kindsIn(document);
  const missing = [...kindsIn(other)].filter((kind) => !own.has(kind));
  const shipped = shippedStandards.gauges.rows.filter((chart) => missing.includes(kindOf(chart)));
  const named = document.gauges ?? other.gauges;
  return {
    ...document,
    gauges: named ? { ...named, rows: [...(document.gauges?.rows ?? []), ...shipped] } : null,
    hours: document.hours ?? (other.hours ? { ...shippedStandards.productivity } : null),
    coefficients: document.coefficients ?? (other.coefficients ? shippedPractice : null),
  };
}

const factsOf = ({ gauges, hours, coefficients, ratioTolerance }: CompanyStandards): Facts =>
  new Map<string, Values>([
    ["Totals check", { "how far from our history": `${Number((100 * ratioTolerance).toFixed(1))} %` }],
    ...(gauges ? gaugeFacts(gauges) : []),
    ...(hours ? hoursFacts(hours) : []),
    ...(coefficients ? coefficientFacts(coefficients) : []),
  ]);

const gaugeFacts = ({ name, source, standing, rows }: GaugeSchedule): [string, Values][] => [
  ["Gauge schedule", { name, source, standing }],
  ...rows.flatMap((chart) =>
    chart.sizes.map((size): [string, Values] => [
      `${chartWords(chart)}, up to ${lengthWords(size.upTo_m)}`,
      rowValues(size),
    ]),
  ),
];

/** Told apart as the contract tells charts apart, so that no two share a subject. */
function chartWords(chart: GaugeChart): string {
  const { material, shape, pressureClass_pa, pressureSign, construction, spacing_m } = chart;
  const [, , , sign = "any", made = "any"] = chartKey(chart).split(" ");
  return [
    `${material} ${shape}`,
    `${Number((pressureClass_pa / PASCALS_PER_INCH_OF_WATER).toFixed(3))} in. w.g. (${pressureClass_pa.toFixed(0)} Pa)`,
    ...(pressureSign ? [sign] : []),
    ...(construction ? [made] : []),
    ...(spacing_m === undefined ? [] : [`joints ${lengthWords(spacing_m)} apart`]),
  ].join(", ");
}

const rowValues = ({ gauge, reinforcement, joint, seam, sectionLength_m, unreinforcedGauge }: GaugeRow): Values => ({
  gauge: gauge ?? "none",
  reinforcement:
    reinforcement.kind === "required"
      ? `${reinforcement.grade}${reinforcement.spacing_m === null ? "" : ` every ${lengthWords(reinforcement.spacing_m)}`}`
      : reinforcement.kind.replace("-", " "),
  ...(unreinforcedGauge ? { "without reinforcement from": unreinforcedGauge } : {}),
  ...(joint ? { joint } : {}),
  ...(seam ? { seam } : {}),
  ...(sectionLength_m ? { "section length": lengthWords(sectionLength_m) } : {}),
});

const hoursFacts = (hours: CompanyHours): [string, Values][] => [
  ["Hours", { name: hours.name, source: hours.source }],
  ["Hours each", { hanger: hoursWords(hours.hanger_h_each), device: hoursWords(hours.device_h_each) }],
  [
    "Accessories",
    Object.fromEntries(Object.entries(hours.accessory_h_each).map(([kind, value]) => [kind, hoursWords(value)])),
  ],
  ...hours.rows.map((row): [string, Values] => [
    hoursSubject(row),
    { [`hours by ${row.per}`]: `${hoursWords(row.hours_h)}/${UNITS[row.per]}`, standing: row.standing, note: row.note },
  ]),
  ...hours.conditions.map(({ name, factor, standing }): [string, Values] => [
    `Condition: ${name}`,
    { factor: `× ${factor}`, standing },
  ]),
];

const UNITS = { weight: "kg", length: "m", piece: "ea" } as const;

const hoursSubject = ({ place, kind, shape, material, upTo_m }: HoursRow): string =>
  `Hours in the ${place}: ${[kind, shape, material].filter((word) => word !== null).join(" ")}, ${
    upTo_m === null ? "any size" : `up to ${lengthWords(upTo_m)}`
  }`;

const lengthWords = (length_m: number): string =>
  `${Number((length_m / METERS_PER_INCH).toFixed(2))} in. (${(1000 * length_m).toFixed(0)} mm)`;
const hoursWords = (hours_h: number): string => `${Number(hours_h.toFixed(5))} h`;

const coefficientFacts = (own: PracticeCoefficients): [string, Values][] => [
  ["Loss coefficients", { source: own.source }],
  [
    "Gored elbow over a smooth one",
    {
      "three pieces": factorWords(own.goredOverSmooth.pieces3),
      "four pieces": factorWords(own.goredOverSmooth.pieces4),
      "five pieces or more": factorWords(own.goredOverSmooth.pieces5),
    },
  ],
  [
    "Tap over a straight one",
    { shoe: factorWords(own.easedTapOverStraight.shoe), conical: factorWords(own.easedTapOverStraight.conical) },
  ],
  ["Square-throat elbow with vanes", { coefficient: String(own.vanedElbow) }],
  ["Change of shape", { "least coefficient": String(own.shapeChange) }],
  ["Offset that is not drawn", { "each turn": `${Number(((own.offsetAngle_rad * 180) / Math.PI).toFixed(1))}°` }],
  ["Bellmouth", { "edge radius over diameter": String(own.bellmouthRadiusRatio) }],
  ["Screen", { "free area": `${Number((100 * own.screenFreeArea).toFixed(1))} %` }],
  ["Volume damper, rectangular", bladeValues(own.damper.rectangular)],
  ["Volume damper, round and flat oval", bladeValues(own.damper.other)],
  [
    "Accessories in the air",
    {
      "fire damper": String(own.fireDamper),
      "smoke damper": String(own.smokeDamper),
      "flexible connector": String(own.flexibleConnector),
      "access door": String(own.accessDoor),
    },
  ],
];

const bladeValues = ({ open, jet }: PracticeCoefficients["damper"]["other"]): Values => ({
  open: String(open),
  "jet term": String(jet),
});
const factorWords = (factor: number): string => `× ${factor}`;
