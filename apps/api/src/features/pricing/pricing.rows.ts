import type { PriceItem } from "@cleatwork/calc";
import type { PricingSettings, ProjectPricing } from "@cleatwork/contracts";
import { dayFromColumn, fromJson, type DayColumn } from "../../platform/db/columns.ts";
import { untouchedProjectPricing } from "./default-settings.ts";

export interface PriceItemRow {
  readonly item_key: string;
  readonly description: string;
  readonly line_group: PriceItem["group"];
  readonly unit: PriceItem["unit"];
  readonly unit_price_micro: number | string;
  readonly supplier: string;
  readonly effective_on: DayColumn;
  readonly taxable: number | boolean;
}

export const priceItemFromRow = (row: PriceItemRow): PriceItem => ({
  key: row.item_key,
  description: row.description,
  group: row.line_group,
  unit: row.unit,
  unitPrice_micro: Number(row.unit_price_micro),
  supplier: row.supplier,
  effectiveOn: dayFromColumn(row.effective_on),
  taxable: Boolean(row.taxable),
});

export const rowFromPriceItem = (item: PriceItem) => ({
  item_key: item.key,
  description: item.description,
  line_group: item.group,
  unit: item.unit,
  unit_price_micro: item.unitPrice_micro,
  supplier: item.supplier,
  effective_on: item.effectiveOn,
  taxable: item.taxable,
});

export interface DocumentRow {
  readonly document: unknown;
  readonly version: number;
}

export const settingsFromRow = (row: DocumentRow): PricingSettings => ({
  ...fromJson<Omit<PricingSettings, "version">>(row.document),
  version: row.version,
});

/** Columns are null where nobody has changed the project's pricing yet. */
export const projectPricingFromRow = (row: { document: unknown; version: number | null }): ProjectPricing =>
  row.version === null
    ? untouchedProjectPricing
    : { ...fromJson<Omit<ProjectPricing, "version">>(row.document), version: row.version };
