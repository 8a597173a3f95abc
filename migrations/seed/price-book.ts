/** The demo company's prices and rates: invented, in dollars. Not a quotation of any supplier. */
import type { LaborRate, PriceItem, PricingRates } from "@cleatwork/calc";

const micro = (dollars: number) => Math.round(dollars * 1_000_000);
const day = (today: Date, daysAgo: number) =>
  new Date(today.getTime() - daysAgo * 86_400_000).toISOString().slice(0, 10);

type Row = readonly [key: string, description: string, unit: PriceItem["unit"], dollars: number, daysAgo?: number];

const METAL: readonly Row[] = [
  ["metal:galvanized:28 ga", "Galvanized sheet, 28 ga", "lb", 1.16, 12],
  ["metal:galvanized:26 ga", "Galvanized sheet, 26 ga", "lb", 1.12, 12],
  ["metal:galvanized:24 ga", "Galvanized sheet, 24 ga", "lb", 1.06, 41],
  ["metal:galvanized:22 ga", "Galvanized sheet, 22 ga", "lb", 1.03, 12],
  ["metal:galvanized:20 ga", "Galvanized sheet, 20 ga", "lb", 1.02, 12],
  ["metal:galvanized:18 ga", "Galvanized sheet, 18 ga", "lb", 1.02, 12],
  ["metal:galvanized:16 ga", "Galvanized sheet, 16 ga", "lb", 1.04, 12],
  ["sealant", "Duct sealant, water base", "gal", 31.5],
  ["hanger", "Hanger, strap and rod set", "ea", 9.4],
  ["liner", "Duct liner, 1 in.", "ft2", 1.18, 19],
  ["gasket", "Flange gasket, butyl", "ft", 0.19],
  ["flange-corner", "Flange corner", "ea", 0.42],
  ["flange-cleat", "Flange cleat", "ea", 0.31],
  ["slip-strip", "Slip, 24 ga", "ft", 0.38],
  ["standing-slip-strip", "Standing slip, 22 ga", "ft", 0.66],
  ["drive-strip", "Drive, 24 ga", "ft", 0.36],
  ["coupling", "Slip coupling, round", "ea", 6.2],
  ["liner-pin", "Liner pin, welded", "ea", 0.09],
  ["liner-adhesive", "Liner adhesive", "gal", 27.4],
  ["vapor-tape", "Vapor barrier tape", "ft", 0.21],
];

const SUBCONTRACTS: readonly Row[] = [["wrap", "Insulation wrap, 1 1/2 in., in place", "ft2", 3.85, 19]];

const ACCESSORIES: readonly Row[] = [
  ["volume-damper", "Volume damper, locking", "ea", 41.5, 26],
  ["fire-damper", "Fire damper, 1 1/2 h, with sleeve", "ea", 412, 26],
  ["smoke-damper", "Smoke damper, with actuator", "ea", 685, 26],
  ["screen", "Wire screen, framed", "ea", 34, 26],
  ["access-door", "Access door", "ea", 68.5, 26],
  ["flexible-connector", "Flexible connector at the unit", "ea", 96, 26],
];

const DEVICES: readonly Row[] = [
  ...[5, 6, 7, 8, 9, 10, 12, 14].map((diameter): Row => [
    `flexible:${diameter}`,
    `Flexible duct, insulated, ${diameter} in.`,
    "ft",
    Number((0.67 + 0.34 * diameter).toFixed(2)),
    19,
  ]),
  ["diffuser-24x24", "Ceiling diffuser, 24 × 24 in.", "ea", 78, 19],
  ["side-outlet-24x8", "Side outlet on round duct, 24 × 8 in.", "ea", 118.5, 19],
  ["grille-return-24x24", "Return grille, 24 × 24 in.", "ea", 82.4, 19],
  ["grille-exhaust-10x10", "Exhaust grille, 10 × 10 in.", "ea", 46, 19],
  ["louver-36x24", "Intake louver, 36 × 24 in.", "ea", 486, 19],
];

export function priceBook(today: Date): PriceItem[] {
  const items =
    (group: PriceItem["group"], supplier: string, taxable: boolean) =>
    ([key, description, unit, dollars, daysAgo]: Row): PriceItem => ({
      key,
      description,
      group,
      unit,
      unitPrice_micro: micro(dollars),
      supplier,
      effectiveOn: day(today, daysAgo ?? 26),
      taxable,
    });
  return [
    ...METAL.map(items("metal", "Prairie Coil & Sheet (invented)", true)),
    ...SUBCONTRACTS.map(items("subcontracts", "Flint Hills Insulation (invented)", false)),
    ...ACCESSORIES.map(items("accessories", "Kaw Air Products (invented)", true)),
    ...DEVICES.map(items("devices", "Kaw Air Products (invented)", true)),
  ];
}

export const labor: readonly LaborRate[] = [
  {
    key: "shop",
    name: "Shop",
    parts: [
      { label: "Wage, shop", amount_micro: micro(36.2) },
      { label: "Payroll taxes, insurance 23.5 %", amount_micro: micro(8.51) },
      { label: "Health, pension, training", amount_micro: micro(19.44) },
      { label: "Shop supplies, power", amount_micro: micro(4.25) },
    ],
  },
  {
    key: "field",
    name: "Field",
    parts: [
      { label: "Wage, journeyman", amount_micro: micro(42.1) },
      { label: "Payroll taxes, insurance 23.5 %", amount_micro: micro(9.89) },
      { label: "Health, pension, training", amount_micro: micro(21.46) },
      { label: "Truck, tools, phone", amount_micro: micro(7.7) },
    ],
  },
];

export const rates: PricingRates = {
  wasteOnMetal_bp: 1_000,
  tax_bp: 750,
  overhead_bp: 1_200,
  contingency_bp: 300,
  profit_bp: 1_400,
  bond_bp: 110,
};

export const STALE_AFTER_DAYS = 30;
export const MARGIN_FLOOR_BP = 1_000;
