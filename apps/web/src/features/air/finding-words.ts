import {
  formatArea,
  formatFrictionRate,
  formatLength,
  formatPressure,
  formatVelocity,
} from "@cleatwork/calc/display/index";
import {
  SEAL_CLASSES,
  meters,
  metersPerSecond,
  pascals,
  pascalsPerMeter,
  squareMeters,
  type Finding,
  type FindingCode,
} from "@cleatwork/calc";
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
  "outlet-over-pressured": "Damper takes up much, and may be heard",
  "damper-missing": "Outlet has pressure to take up, and no damper",
  "paths-unequal": "Paths need very different pressures",
  "margin-short": "No room for the safety margin",
  "reserve-large": "Equipment gives far more than is required",
  "leakage-high": "Much of the air leaks",
  "seal-class-low": "Sealed less than the pressure class asks for",
  "velocity-low": "Very slow: more metal than the air needs",
  "duct-grows": "Larger than the duct that feeds it",
  "unlined-near-equipment": "First duct without liner",
  "flexible-slack": "Flexible duct left slack",
  "elbow-too-sharp": "Too fast for so sharp an elbow",
  "transition-abrupt": "No room for the change of size",
  "fittings-too-close": "Two fittings close together",
  "turn-near-equipment": "Turn close to the fan",
};

/** Those that an edit of the layout can help; the others are the construction spec's, or the equipment's. */
const fixable: ReadonlySet<FindingCode> = new Set<FindingCode>([
  "velocity-over-limit",
  "friction-over-limit",
  "velocity-low",
  "aspect-ratio-high",
  "duct-grows",
  "elbow-too-sharp",
  "damper-missing",
  "flexible-too-long",
  "unlined-near-equipment",
  "pressure-short",
]);
export const hasFixes = ({ code }: Finding): boolean => fixable.has(code);

export const findingTitle = (finding: Finding): string => titles[finding.code];

const shareCodes: ReadonlySet<FindingCode> = new Set<FindingCode>(["leakage-high", "paths-unequal", "flexible-slack"]);

/** "1,320 fpm, limit 1,180 fpm": the value beside its limit, in the person's units. */
export function findingFigures(finding: Finding, units: UnitSystem): { value: string; limit: string } {
  if (finding.code === "unlined-near-equipment") return { value: "no liner", limit: "lined" };
  const unit = shareCodes.has(finding.code) ? "share" : finding.unit;
  const text = (value: number) => quantityText(value, unit, units);
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
    case "m²":
      return formatArea(squareMeters(value), units).text;
    case "share":
      return `${plain(value * 100)} %`;
    case "rad":
      return `${plain((value * 180) / Math.PI)}°`;
    case "diameters":
      return `${plain(value)} diameters`;
    case "seal class":
      return SEAL_CLASSES[value] === "none" ? "none" : `class ${SEAL_CLASSES[value] ?? "A"}`;
    default:
      return plain(value);
  }
}

const plain = (value: number) => new Intl.NumberFormat("en-US", { maximumSignificantDigits: 3 }).format(value);
