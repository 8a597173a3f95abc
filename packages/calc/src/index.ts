export * from "./quantity.ts";
export * from "./result.ts";
export * from "./air-system.ts";
export * from "./network/solution.ts";
export * from "./takeoff/takeoff.ts";
export * from "./pricing/estimate.ts";
export { solve } from "./network/solve.ts";
export { frictionRateOnBasis } from "./network/friction.ts";
export { FIX_KINDS, type Fix, type FixKind, type SegmentEdit } from "./findings/fix.ts";
export { fixesFor } from "./findings/fixes.ts";
export { FITTING_INPUTS, REFERENCE_SECTIONS, type FittingInputName, type ReferenceSection } from "./fittings/laws.ts";
export { shippedPractice, type PracticeCoefficients } from "./fittings/practice.table.ts";
export { sizeOptions, type SizeOption } from "./sizing/size-options.ts";
export * from "./display/index.ts";
export { createTakeoff, takeOff } from "./takeoff/take-off.ts";
export { sumTotals } from "./takeoff/totals.ts";
export { NO_GAUGE, PIECE_GROUPINGS, groupPieces, type PieceGroup, type PieceGrouping } from "./takeoff/group-pieces.ts";
export * from "./takeoff/gauge-schedule.ts";
export {
  HOURS_KINDS,
  HOURS_PER,
  HOURS_PLACES,
  type HoursPer,
  type HoursRow,
  type ProductivityTable,
  type WorkCondition,
} from "./takeoff/productivity.ts";
export {
  NO_COMPANY_STANDARDS,
  standardsOf,
  type CompanyHours,
  type CompanyStandards,
} from "./takeoff/company-standards.ts";
export { type GaugeDecider } from "./takeoff/gauge.ts";
export { sheetLabels } from "./takeoff/sheet-weights.table.ts";
export {
  checkRatios,
  ratiosOf,
  TAKEOFF_RATIOS,
  US_RATIO,
  type RatioCheck,
  type TakeoffRatio,
  type TakeoffRatios,
} from "./takeoff/ratios.ts";
export { shippedStandards } from "./takeoff/shipped-standards.ts";
export { markNumbers } from "./takeoff/marks.ts";
export type { Body } from "./takeoff/body.ts";
export { patternArea, patternSize, type FlatPattern } from "./takeoff/pattern/flat-pattern.ts";
export { patternsOf } from "./takeoff/pattern/patterns.ts";
export { nestPieces, shippedStock, type NestedSheet, type Stock } from "./takeoff/nest.ts";
export { sizeKey } from "./takeoff/count-items.ts";
export * from "./money.ts";
export { price } from "./pricing/price.ts";
export { PRICE_STEPS, climb, chargeOnPrice, type StepRule } from "./pricing/steps.ts";
export { hourlyRate, QUANTITY_DECIMALS } from "./pricing/lines.ts";
export { marginFromMarkup, markupFromMargin } from "./pricing/markup.ts";
export { differenceBetween, type Difference, type JobState, type PieceRef } from "./pricing/difference.ts";
export { NO_CHANGE, applyWhatIf, profitAtPrice, type PricingInput, type WhatIf } from "./pricing/what-if.ts";
