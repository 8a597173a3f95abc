import type { PriceItem } from "@cleatwork/calc";
import type { PricingSettings, ProjectId, ProjectPricing } from "@cleatwork/contracts";
import { ask, type Question } from "../../platform/db/question.ts";
import type { TenantDb } from "../../platform/db/tenant-db.ts";
import {
  priceItemFromRow,
  projectPricingFromRow,
  rowFromPriceItem,
  settingsFromRow,
  type DocumentRow,
  type PriceItemRow,
} from "./pricing.rows.ts";

export const priceItemsQuestion = (db: TenantDb): Question<PriceItem[]> => ({
  from: db.from("price_items"),
  columns: PRICE_ITEM_COLUMNS,
  order: "item_key",
  read: (rows: readonly PriceItemRow[]) => rows.map(priceItemFromRow),
});

export const settingsQuestion = (db: TenantDb): Question<PricingSettings> => ({
  from: db.from("pricing_settings"),
  columns: { document: "document", version: "version" },
  order: "version",
  read: ([row]: readonly DocumentRow[]) => settingsFromRow(foundedRow(row)),
});

/** Null when there is no such project here. */
export const projectPricingQuestion = (db: TenantDb, projectId: ProjectId): Question<ProjectPricing | null> => ({
  from: db
    .from("projects", "p")
    .leftJoin("project_pricing as x", { "x.organization_id": "p.organization_id", "x.project_id": "p.id" })
    .where("p.id", projectId),
  columns: { document: "x.document", version: "x.version" },
  order: "p.id",
  read: ([row]: readonly { document: unknown; version: number | null }[]) => (row ? projectPricingFromRow(row) : null),
});

const PRICE_ITEM_COLUMNS = {
  item_key: "item_key",
  description: "description",
  line_group: "line_group",
  unit: "unit",
  unit_price_micro: "unit_price_micro",
  supplier: "supplier",
  effective_on: "effective_on",
  taxable: "taxable",
} satisfies Readonly<Record<keyof PriceItemRow, string>>;

export const pricingRepository = (db: TenantDb) => ({
  async currency(): Promise<string> {
    const row: { currency: string } = await db.organization().first("currency");
    return row.currency;
  },

  listItems: (): Promise<PriceItem[]> => ask(priceItemsQuestion(db)),

  /** The item as it stands, locked. */
  async lockItem(key: string): Promise<PriceItem | null> {
    const row = (await db.from("price_items").where({ item_key: key }).forUpdate().first()) as PriceItemRow | undefined;
    return row ? priceItemFromRow(row) : null;
  },

  insertItem: (item: PriceItem): Promise<void> => db.insert("price_items", rowFromPriceItem(item)),

  async updateItem(item: PriceItem): Promise<void> {
    await db.from("price_items").where({ item_key: item.key }).update(rowFromPriceItem(item));
  },

  async deleteItem(key: string): Promise<void> {
    await db.from("price_items").where({ item_key: key }).delete();
  },

  getSettings: (): Promise<PricingSettings> => ask(settingsQuestion(db)),

  async lockSettings(): Promise<PricingSettings> {
    const row = (await db.from("pricing_settings").forUpdate().first()) as DocumentRow | undefined;
    return settingsFromRow(foundedRow(row));
  },

  insertSettings: (settings: Omit<PricingSettings, "version">): Promise<void> =>
    db.insert("pricing_settings", { document: JSON.stringify(settings), version: 1 }),

  async updateSettings(settings: Omit<PricingSettings, "version">, expected: number): Promise<void> {
    await db
      .from("pricing_settings")
      .where({ version: expected })
      .update({ document: JSON.stringify(settings), version: expected + 1 });
  },

  /** Null when there is no such project here. */
  findProjectPricing: (projectId: ProjectId): Promise<ProjectPricing | null> =>
    ask(projectPricingQuestion(db, projectId)),

  /** The same, with the project's row locked: two first changes at once wait for each other. */
  async lockProjectPricing(projectId: ProjectId): Promise<ProjectPricing | null> {
    const project: unknown = await db.from("projects").where({ id: projectId }).forUpdate().first("id");
    return project === undefined ? null : this.findProjectPricing(projectId);
  },

  async saveProjectPricing(
    projectId: ProjectId,
    pricing: Omit<ProjectPricing, "version">,
    expected: number,
  ): Promise<void> {
    const columns = { document: JSON.stringify(pricing), version: expected + 1 };
    const changed = await db
      .from("project_pricing")
      .where({ project_id: projectId, version: expected })
      .update(columns);
    if (changed === 0) await db.insert("project_pricing", { project_id: projectId, ...columns });
  },
});

function foundedRow(row: DocumentRow | undefined): DocumentRow {
  if (!row) throw new Error("a company without pricing settings: founding writes them");
  return row;
}
