import { formatFrictionRate, formatLength, formatPressure, formatVelocity } from "@cleatwork/calc/display/index";
import { meters, metersPerSecond, pascals, pascalsPerMeter, type Finding, type FindingCode } from "@cleatwork/calc";
import type { UnitSystem } from "@cleatwork/contracts";

const titles: Readonly<Record<FindingCode, string>> = {
  "velocity-over-limit": "Too fast",
  "friction-over-limit": "Loses too much per length",
  "pressure-short": "Outlet short of pressure",
  "flexible-too-long": "Flexible duct too long",
  "flow-transitional": "Flow between laminar and turbulent",
  "aspect-ratio-high": "Very flat duct",
  "table-range-exceeded": "Outside the range of the coefficient",
  "pressure-class-exceeded": "More pressure than the duct is built for",
  "size-not-found": "No standard size fits",
};

export const findingTitle = (finding: Finding): string => titles[finding.code];

/** "1,320 fpm, limit 1,180 fpm": the value beside its limit, in the person's units. */
export function findingFigures(finding: Finding, units: UnitSystem): { value: string; limit: string } {
  const text = (value: number) => quantityText(value, finding.unit, units);
  return { value: text(finding.value), limit: text(finding.limit) };
}

function quantityText(value: number, unit: string, units: UnitSystem): string {
  switch (unit) {
    case "m/s":
      return formatVelocity(metersPerSecond(value), units).text;
    case "Pa":
      return formatPressure(pascals(value), units).text;
    case "Pa/m":
      return formatFrictionRate(pascalsPerMeter(value), units).text;
    case "m":
      return formatLength(meters(value), units).text;
    default:
      return new Intl.NumberFormat("en-US", { maximumSignificantDigits: 3 }).format(value);
  }
}
