import {
  KILOGRAMS_PER_POUND,
  METERS_PER_FOOT,
  decimal,
  formatArea,
  formatHours,
  formatLength,
  formatWeight,
  hours,
  kilograms,
  meters,
  squareMeters,
  type Arithmetic,
  type Piece,
} from "@cleatwork/calc";
import type { UnitSystem } from "@cleatwork/contracts";

const KILOGRAMS_PER_SQUARE_METER_PER_PSF = KILOGRAMS_PER_POUND / METERS_PER_FOOT ** 2;

const names: Readonly<Record<Arithmetic["quantity"], string>> = {
  "net-area": "Net area",
  "blank-area": "Blank",
  weight: "Weight",
  "shop-hours": "Shop",
  "field-hours": "Field",
  "insulation-area": "Insulation",
  "liner-area": "Liner",
};

/** Every number of a piece, opened: what was multiplied, and what it rests on. */
export function PieceArithmetic({ piece, units }: { piece: Piece; units: UnitSystem }) {
  return (
    <dl className="grid grid-cols-[6.5rem_1fr] gap-x-3 gap-y-1">
      {piece.arithmetic.map((line, position) => (
        <div key={position} className="contents">
          <dt className="text-ink-2">{names[line.quantity]}</dt>
          <dd>
            {line.terms.map((term, index) => (
              <span key={index}>
                {index > 0 && " × "}
                {quantityText(term.value, term.unit, units)} <span className="text-ink-3">{term.label}</span>
              </span>
            ))}{" "}
            = <b>{quantityText(line.result, line.unit, units)}</b>
            <span className="block text-help text-ink-3">{line.basis}</span>
          </dd>
        </div>
      ))}
    </dl>
  );
}

/** A quantity of the arithmetic in the person's units, by the unit it is written in. */
function quantityText(value: number, unit: string, units: UnitSystem): string {
  switch (unit) {
    case "m":
      return formatLength(meters(value), units).text;
    case "m2":
    case "m²":
      return formatArea(squareMeters(value), units).text;
    case "kg":
      return formatWeight(kilograms(value), units).text;
    case "h":
      return formatHours(hours(value), units).text;
    case "kg/m2":
    case "kg/m²":
      return units === "si"
        ? `${decimal(value, 2)} kg/m²`
        : `${decimal(value / KILOGRAMS_PER_SQUARE_METER_PER_PSF, 3)} lb/ft²`;
    case "h/kg":
      return units === "si" ? `${decimal(value, 4)} h/kg` : `${decimal(value * KILOGRAMS_PER_POUND, 4)} h/lb`;
    case "1":
    case "":
      return Number.isInteger(value) ? String(value) : decimal(value, 3);
    default:
      return `${decimal(value, 3)} ${unit}`;
  }
}
