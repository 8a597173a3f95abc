/** The coefficients of practice as rows: how each is called, shown, read and set. Pure. */
import { decimal, shippedPractice, type CompanyStandards, type PracticeCoefficients } from "@cleatwork/calc";
import { readNumber, type Read } from "./cells.ts";

export interface CoefficientRow {
  readonly name: string;
  readonly unit: string;
  readonly min: number;
  readonly max: number;
  readonly of: (coefficients: PracticeCoefficients) => number;
  readonly set: (coefficients: PracticeCoefficients, value: number) => PracticeCoefficients;
}

const DEGREE = Math.PI / 180;

const factor = (
  name: string,
  of: CoefficientRow["of"],
  set: CoefficientRow["set"],
  unit = "× the smooth elbow",
): CoefficientRow => ({ name, unit, min: 0.1, max: 10, of, set });

const coefficient = (
  name: string,
  field: "vanedElbow" | "shapeChange" | "fireDamper" | "smokeDamper" | "flexibleConnector" | "accessDoor",
): CoefficientRow => ({
  name,
  unit: "× velocity pressure",
  min: 0,
  max: 10,
  of: (now) => now[field],
  set: (now, value) => ({ ...now, [field]: value }),
});

const gored = (name: string, field: keyof PracticeCoefficients["goredOverSmooth"]): CoefficientRow =>
  factor(
    name,
    (now) => now.goredOverSmooth[field],
    (now, value) => ({ ...now, goredOverSmooth: { ...now.goredOverSmooth, [field]: value } }),
  );

const eased = (name: string, field: keyof PracticeCoefficients["easedTapOverStraight"]): CoefficientRow =>
  factor(
    name,
    (now) => now.easedTapOverStraight[field],
    (now, value) => ({ ...now, easedTapOverStraight: { ...now.easedTapOverStraight, [field]: value } }),
    "× the straight tap",
  );

const blade = (name: string, shape: keyof PracticeCoefficients["damper"], field: "open" | "jet"): CoefficientRow => ({
  name,
  unit: field === "open" ? "× velocity pressure" : "jet term",
  min: field === "open" ? 0 : 1,
  max: field === "open" ? 10 : 3,
  of: (now) => now.damper[shape][field],
  set: (now, value) => ({
    ...now,
    damper: { ...now.damper, [shape]: { ...now.damper[shape], [field]: value } },
  }),
});

export const coefficientRows: readonly CoefficientRow[] = [
  gored("Gored elbow of three pieces", "pieces3"),
  gored("Gored elbow of four pieces", "pieces4"),
  gored("Gored elbow of five pieces or more", "pieces5"),
  coefficient("Square-throat elbow with vanes, 90°", "vanedElbow"),
  eased("Shoe tap", "shoe"),
  eased("Conical tap", "conical"),
  coefficient("Change of shape, at least", "shapeChange"),
  {
    name: "Offset that is not drawn, each turn",
    unit: "degrees",
    min: 10,
    max: 90,
    of: (now) => now.offsetAngle_rad / DEGREE,
    set: (now, value) => ({ ...now, offsetAngle_rad: value * DEGREE }),
  },
  {
    name: "Bellmouth, edge radius over diameter",
    unit: "ratio",
    min: 0,
    max: 1,
    of: (now) => now.bellmouthRadiusRatio,
    set: (now, value) => ({ ...now, bellmouthRadiusRatio: value }),
  },
  {
    name: "Screen, free area",
    unit: "%",
    min: 10,
    max: 100,
    of: (now) => now.screenFreeArea * 100,
    set: (now, value) => ({ ...now, screenFreeArea: value / 100 }),
  },
  blade("Volume damper, rectangular, open", "rectangular", "open"),
  blade("Volume damper, rectangular, throttled", "rectangular", "jet"),
  blade("Volume damper, round and oval, open", "other", "open"),
  blade("Volume damper, round and oval, throttled", "other", "jet"),
  coefficient("Fire damper", "fireDamper"),
  coefficient("Smoke damper", "smokeDamper"),
  coefficient("Flexible connector", "flexibleConnector"),
  coefficient("Access door", "accessDoor"),
];

export const coefficientText = (row: CoefficientRow, coefficients: PracticeCoefficients): string =>
  String(Number(row.of(coefficients).toFixed(4)));

export const readCoefficient = ({ min, max }: CoefficientRow, text: string): Read<number> =>
  readNumber(text, `${decimal(min, min % 1 === 0 ? 0 : 1)} to ${max}`, { min, max });

/** What a company starts its own from. */
export const copyCoefficients = (document: CompanyStandards): CompanyStandards => ({
  ...document,
  coefficients: { ...shippedPractice, source: "our own coefficients" },
});
