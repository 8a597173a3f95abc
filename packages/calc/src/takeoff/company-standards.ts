/** What a company says differs from what is shipped, and the standards that a takeoff reads from both. */
import type { PracticeCoefficients } from "../fittings/practice.table.ts";
import type { GaugeSchedule } from "./gauge-schedule.ts";
import type { ProductivityTable } from "./productivity.ts";
import { shippedStandards } from "./shipped-standards.ts";
import type { ShopStandards } from "./takeoff.ts";

export type CompanyHours = Omit<ProductivityTable, "conditionFactor">;

/** A company's own document: null where it leaves a thing to the shipped standards. */
export interface CompanyStandards {
  readonly gauges: GaugeSchedule | null;
  readonly hours: CompanyHours | null;
  /** Loss coefficients of fittings, where the shipped ones are common practice. */
  readonly coefficients?: PracticeCoefficients | null | undefined;
  /** How far a job's ratios may lie from the company's own history before it is pointed out: 0.5 is half again, or half. */
  readonly ratioTolerance: number;
}

export const NO_COMPANY_STANDARDS: CompanyStandards = { gauges: null, hours: null, ratioTolerance: 0.5 };

/** The shipped standards with the company's before them. `conditionFactor` is the project's. */
export const standardsOf = ({ gauges, hours }: CompanyStandards, conditionFactor: number): ShopStandards => ({
  ...shippedStandards,
  companyGauges: gauges,
  productivity: { ...(hours ?? shippedStandards.productivity), conditionFactor },
});
