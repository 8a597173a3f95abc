/** A company's own schedules: gauges and construction by size and pressure, hours by size and kind. */
import {
  ACCESSORY_KINDS,
  CONSTRUCTIONS,
  HOURS_KINDS,
  HOURS_PER,
  HOURS_PLACES,
  MATERIALS,
  SCHEDULE_SHAPES,
  sheetLabels,
  STANDINGS,
  type AccessoryKind,
  type CompanyStandards,
  type GaugeChart,
  type GaugeRow,
  type HoursRow,
  type PracticeCoefficients,
  type Reinforcement,
} from "@cleatwork/calc";
import { z } from "zod";
import { sheetLabel } from "./air-system.ts";
import { calendarDate, instant, shortText } from "./common.ts";
import { endpoint, member } from "./endpoint.ts";
import { personId } from "./ids.ts";
import { positiveMetersSchema } from "./quantity.ts";

const factor = z.number("a factor such as 1.2").min(0.1, "0.1 to 10").max(10, "0.1 to 10");
const hoursEach = z.number("hours, 0 or more").min(0, "0 hours or more").max(1000, "1000 hours at most");

const reinforcementSchema: z.ZodType<Reinforcement, Reinforcement> = z.discriminatedUnion("kind", [
  z.strictObject({ kind: z.literal("not-required") }),
  z.strictObject({
    kind: z.literal("required"),
    grade: z.string().trim().min(1, "a grade such as F").max(40, "40 characters at most"),
    spacing_m: positiveMetersSchema.nullable(),
  }),
  z.strictObject({ kind: z.literal("not-designed") }),
  z.strictObject({ kind: z.literal("blank") }),
]);

const gaugeRowSchema: z.ZodType<GaugeRow, GaugeRow> = z.strictObject({
  upTo_m: positiveMetersSchema,
  gauge: sheetLabel.nullable(),
  reinforcement: reinforcementSchema,
  unreinforcedGauge: sheetLabel.nullable().optional(),
  joint: z.string().trim().max(40).nullable().optional(),
  seam: z.string().trim().max(40).nullable().optional(),
  sectionLength_m: positiveMetersSchema.nullable().optional(),
});

/** Sizes go up; a gauge is a sheet of the chart's metal; no gauge means blank or not designed, and nothing else. */
export const gaugeChartSchema: z.ZodType<GaugeChart, GaugeChart> = z
  .strictObject({
    material: z.enum(MATERIALS),
    shape: z.enum(SCHEDULE_SHAPES),
    pressureClass_pa: z.number().positive("more than 0").max(10_000, "10 000 Pa at most"),
    pressureSign: z.enum(["positive", "negative"]).optional(),
    construction: z.enum(CONSTRUCTIONS).optional(),
    spacing_m: positiveMetersSchema.optional(),
    sizes: z.array(gaugeRowSchema).min(1, "one size or more").max(60, "60 sizes at most"),
  })
  .superRefine(({ material, sizes, spacing_m }, context) => {
    const labels = sheetLabels(material);
    const add = (row: number, field: string, message: string, input: unknown) =>
      context.addIssue({ code: "custom", path: ["sizes", row, field], message, input });
    sizes.forEach((size, row) => {
      const before = sizes[row - 1];
      if (before && size.upTo_m <= before.upTo_m) add(row, "upTo_m", "larger than the size above it", size.upTo_m);
      for (const field of ["gauge", "unreinforcedGauge"] as const) {
        const label = size[field] ?? null;
        if (label !== null && !labels.includes(label))
          add(row, field, `a sheet of ${material}: ${labels.join(", ")}`, label);
      }
      const isOpen = size.reinforcement.kind === "blank" || size.reinforcement.kind === "not-designed";
      if (size.gauge === null && !isOpen) add(row, "gauge", "a sheet, or the size blank or not designed", size.gauge);
      if (size.gauge !== null && size.reinforcement.kind === "not-designed")
        add(row, "gauge", "empty where the size is not designed", size.gauge);
      const length = size.sectionLength_m ?? null;
      if (length !== null && spacing_m !== undefined && length > spacing_m * 1.002)
        add(row, "sectionLength_m", "no longer than the chart's spacing of joints", length);
    });
  });

/** What tells one chart from another: two of the same would be two answers to one question. */
export const chartKey = (chart: Omit<GaugeChart, "sizes">): string =>
  [
    chart.material,
    chart.shape,
    chart.pressureClass_pa.toFixed(2),
    chart.pressureSign ?? "any",
    chart.construction ?? "any",
    chart.spacing_m?.toFixed(4) ?? "any",
  ].join(" ");

const gaugeScheduleSchema = z
  .strictObject({
    name: z.string().trim().min(1, "a name").max(80, "80 characters at most"),
    source: z.string().trim().max(400, "400 characters at most"),
    standing: z.enum(STANDINGS),
    rows: z.array(gaugeChartSchema).max(400, "400 charts at most"),
  })
  .superRefine(({ rows }, context) => {
    const seen = new Set<string>();
    rows.forEach((chart, index) => {
      const key = chartKey(chart);
      if (seen.has(key))
        context.addIssue({ code: "custom", path: ["rows", index, "pressureClass_pa"], message: "one chart of a kind" });
      seen.add(key);
    });
  });

const hoursRowSchema: z.ZodType<HoursRow, HoursRow> = z.strictObject({
  place: z.enum(HOURS_PLACES),
  kind: z.enum(HOURS_KINDS),
  shape: z.enum(SCHEDULE_SHAPES).nullable(),
  material: z.enum(MATERIALS).nullable(),
  upTo_m: positiveMetersSchema.nullable(),
  per: z.enum(HOURS_PER),
  hours_h: hoursEach,
  standing: z.enum(STANDINGS),
  note: z.string().trim().max(200, "200 characters at most"),
});

const companyHoursSchema = z.strictObject({
  name: z.string().trim().min(1, "a name").max(80, "80 characters at most"),
  source: z.string().trim().max(400, "400 characters at most"),
  rows: z.array(hoursRowSchema).max(400, "400 rows at most"),
  hanger_h_each: hoursEach,
  device_h_each: hoursEach,
  accessory_h_each: z.strictObject(
    Object.fromEntries(ACCESSORY_KINDS.map((kind) => [kind, hoursEach])) as Record<AccessoryKind, typeof hoursEach>,
  ),
  conditions: z
    .array(
      z.strictObject({
        name: z.string().trim().min(1, "what it is").max(80, "80 characters at most"),
        factor,
        standing: z.enum(STANDINGS),
      }),
    )
    .max(60, "60 conditions at most"),
});

const coefficient = z.number("a coefficient such as 0.25").min(0, "0 to 10").max(10, "0 to 10");
const blade = z.strictObject({
  open: coefficient,
  jet: z.number("a factor such as 1.56").min(1, "1 to 3").max(3, "1 to 3"),
});

const coefficientsSchema: z.ZodType<PracticeCoefficients, PracticeCoefficients> = z.strictObject({
  source: z.string().trim().min(1, "where they come from").max(200, "200 characters at most"),
  goredOverSmooth: z.strictObject({ pieces3: factor, pieces4: factor, pieces5: factor }),
  vanedElbow: coefficient,
  easedTapOverStraight: z.strictObject({ shoe: factor, conical: factor }),
  shapeChange: coefficient,
  offsetAngle_rad: z
    .number("an angle")
    .min(Math.PI / 18, "10° to 90°")
    .max(Math.PI / 2, "10° to 90°"),
  bellmouthRadiusRatio: z.number("a ratio such as 0.2").min(0, "0 to 1").max(1, "0 to 1"),
  screenFreeArea: z.number("a share such as 0.7").min(0.1, "10 % to 100 %").max(1, "10 % to 100 %"),
  damper: z.strictObject({ rectangular: blade, other: blade }),
  fireDamper: coefficient,
  smokeDamper: coefficient,
  flexibleConnector: coefficient,
  accessDoor: coefficient,
});

export const companyStandardsSchema: z.ZodType<CompanyStandards, CompanyStandards> = z.strictObject({
  gauges: gaugeScheduleSchema.nullable(),
  hours: companyHoursSchema.nullable(),
  coefficients: coefficientsSchema.nullable().optional(),
  ratioTolerance: z.number("a share such as 0.5").min(0.05, "5 % to 500 %").max(5, "5 % to 500 %"),
});

export const standardsRequest = z.strictObject({
  effectiveOn: calendarDate,
  note: shortText,
  document: companyStandardsSchema,
});

/** One value that became another; null: was not there, or is not there any more. Lengths and pressures in both units. */
export const standardsChange = z.object({
  subject: z.string(),
  field: z.string(),
  before: z.string().nullable(),
  after: z.string().nullable(),
});
export type StandardsChange = z.infer<typeof standardsChange>;

export const standardsResponse = z.object({
  /** Of the latest version, what a change builds on; 0 where the company never wrote any. */
  version: z.int().min(0),
  /** The version that `document` is of. */
  shownVersion: z.int().min(0),
  effectiveOn: calendarDate.nullable(),
  document: companyStandardsSchema,
});
export type Standards = z.infer<typeof standardsResponse>;

export const standardsEndpoints = {
  getStandards: endpoint({
    method: "get",
    path: "/companies/:company/standards",
    access: member("standards.read"),
    summary: "The company's own schedules: the latest, one version, or those in force on a day",
    query: z.object({ on: calendarDate.optional(), version: z.coerce.number<string>().int().min(1).optional() }),
    response: standardsResponse,
  }),
  listStandardsHistory: endpoint({
    method: "get",
    path: "/companies/:company/standards/history",
    access: member("standards.read"),
    summary: "Who changed which value of the schedules, and when",
    response: z.object({
      items: z.array(
        z.object({
          version: z.int(),
          effectiveOn: calendarDate,
          note: z.string(),
          by: z.object({ id: personId, name: z.string() }),
          at: instant,
          changes: z.array(standardsChange),
          /** How many more changes there were than are listed. */
          moreChanges: z.int(),
        }),
      ),
    }),
  }),
  updateStandards: endpoint({
    method: "put",
    path: "/companies/:company/standards",
    access: member("standards.write"),
    summary: "Write the next version of the company's schedules",
    body: standardsRequest,
    response: standardsResponse,
    guards: ["if-match"],
  }),
};
