export * from "./quantity.ts";
export * from "./result.ts";
export * from "./air-system.ts";
export * from "./network/solution.ts";
export * from "./takeoff/takeoff.ts";
export * from "./pricing/estimate.ts";
export { solve } from "./network/solve.ts";
export { SHIPPED_PRACTICE, type PracticeCoefficients } from "./fittings/practice.table.ts";
export * from "./display/index.ts";
