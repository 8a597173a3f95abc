/** What `price` reads and answers. Money is integer minor units; a unit price may be finer, in millionths of a major unit. */

export interface Money {
  readonly minor: number;
  readonly currency: string;
}

export const LINE_GROUPS = ["metal", "devices", "accessories", "labor", "subcontracts", "rentals-freight"] as const;
export type LineGroup = (typeof LINE_GROUPS)[number];

export const PRICE_UNITS = ["kg", "lb", "m", "ft", "m2", "ft2", "ea", "L", "gal", "h", "day", "week", "lot"] as const;
export type PriceUnit = (typeof PRICE_UNITS)[number];

/** One price of one item in a company's price book. */
export interface PriceItem {
  /** "metal:galvanized:24 ga", "flexible:8", "wrap", "liner", "hanger", "sealant", "volume-damper", "diffuser-24x24"… */
  readonly key: string;
  readonly description: string;
  readonly group: LineGroup;
  readonly unit: PriceUnit;
  /** Millionths of the currency's major unit: $1.0625 is 1_062_500. */
  readonly unitPrice_micro: number;
  readonly supplier: string;
  /** YYYY-MM-DD. */
  readonly effectiveOn: string;
  readonly taxable: boolean;
}

/** Labor cost per hour, built up from wage and burden. */
export interface LaborRate {
  readonly key: "shop" | "field";
  readonly name: string;
  readonly parts: readonly { readonly label: string; readonly amount_micro: number }[];
}

/** An item that was not drawn. */
export interface AddedItem {
  readonly id: string;
  readonly description: string;
  readonly group: LineGroup;
  readonly quantity: number;
  readonly unit: PriceUnit;
  readonly unitPrice_micro: number;
  readonly taxable: boolean;
}

/** Basis points: 1,400 is 14 %. */
export interface PricingRates {
  readonly wasteOnMetal_bp: number;
  readonly tax_bp: number;
  readonly overhead_bp: number;
  readonly contingency_bp: number;
  /** Markup: profit over cost. */
  readonly profit_bp: number;
  readonly bond_bp: number;
}

export interface PricingBasis {
  readonly currency: string;
  readonly items: readonly PriceItem[];
  readonly labor: readonly LaborRate[];
  readonly rates: PricingRates;
  readonly adds: readonly AddedItem[];
  /** The day the prices are read for (YYYY-MM-DD), and how old a price may be before it is called stale. */
  readonly pricedOn: string;
  readonly staleAfterDays: number;
  /** Margin under this needs an owner (basis points of price). */
  readonly marginFloor_bp: number;
}

export interface EstimateLine {
  readonly key: string;
  readonly group: LineGroup;
  readonly description: string;
  readonly quantity: number;
  readonly unit: PriceUnit;
  readonly unitPrice_micro: number;
  /** Quantity × unit price, rounded once, half away from zero. */
  readonly amount_minor: number;
  readonly taxable: boolean;
  readonly origin: "takeoff" | "by-hand" | "labor";
  /** Days between the price's date and the pricing day; null for labor and lines by hand. */
  readonly priceAge_days: number | null;
  /** Short terms that explain the quantity: "1,100 lb net × 1.10 waste". */
  readonly arithmetic: readonly { readonly label: string; readonly value: number; readonly unit: string }[];
}

export interface EstimateWarning {
  readonly code: "price-missing" | "price-stale" | "hours-zero" | "carried-twice" | "margin-under-floor";
  readonly severity: "stop" | "warn";
  readonly key: string;
  readonly message: string;
}

export interface Estimate {
  readonly currency: string;
  readonly lines: readonly EstimateLine[];
  readonly groups: readonly { readonly group: LineGroup; readonly amount_minor: number }[];
  /** Integer steps from cost to price, in order; each percentage applied once to an integer total. */
  readonly steps: readonly {
    readonly step: "direct" | "tax" | "cost" | "overhead" | "contingency" | "profit" | "bond" | "price";
    readonly amount_minor: number;
    readonly rate_bp: number | null;
  }[];
  readonly directCost_minor: number;
  readonly cost_minor: number;
  readonly profit_minor: number;
  readonly price_minor: number;
  /** Profit over price. */
  readonly margin_bp: number;
  readonly bySystem: readonly { readonly systemId: string; readonly price_minor: number }[];
  readonly warnings: readonly EstimateWarning[];
}
