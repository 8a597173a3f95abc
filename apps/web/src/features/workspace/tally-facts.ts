/** What stands in the tally, from the numbers. Pure. */
import { pascals, kilograms, hours, type Pascals, type Kilograms, type Hours } from "@cleatwork/calc";
import type { Numbers } from "@cleatwork/layout";

export interface TallyFacts {
  /** The system that is shortest of pressure. */
  readonly pressure: {
    readonly tag: string;
    readonly required_pa: Pascals;
    readonly available_pa: Pascals;
    readonly spare_pa: Pascals;
  } | null;
  readonly metal_kg: Kilograms;
  readonly shop_h: Hours;
  readonly field_h: Hours;
  readonly price_minor: number | null;
  readonly margin_bp: number | null;
  readonly findings: { readonly stop: number; readonly warn: number; readonly note: number };
}

export function tallyFacts(numbers: Numbers): TallyFacts {
  const findings = { stop: numbers.problems.length, warn: 0, note: 0 };
  for (const list of [...numbers.solutions, ...numbers.takeoffs])
    for (const { severity } of list.findings) findings[severity] += 1;
  let pressure: TallyFacts["pressure"] = null;
  for (const solution of numbers.solutions) {
    const spare = pascals(solution.availablePressure_pa - solution.requiredPressure_pa);
    if (pressure && pressure.spare_pa <= spare) continue;
    pressure = {
      tag: numbers.systems.find(({ id }) => id === solution.systemId)?.tag ?? "",
      required_pa: solution.requiredPressure_pa,
      available_pa: solution.availablePressure_pa,
      spare_pa: spare,
    };
  }
  const sum = (of: (totals: Numbers["takeoffs"][number]["totals"]) => number) =>
    numbers.takeoffs.reduce((total, { totals }) => total + of(totals), 0);
  return {
    pressure,
    metal_kg: kilograms(sum(({ netWeight_kg }) => netWeight_kg)),
    shop_h: hours(sum(({ shopHours_h }) => shopHours_h)),
    field_h: hours(sum(({ fieldHours_h }) => fieldHours_h)),
    price_minor: numbers.estimate?.price_minor ?? null,
    margin_bp: numbers.estimate?.margin_bp ?? null,
    findings,
  };
}
