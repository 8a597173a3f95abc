import type { PriceItem } from "@cleatwork/calc";
import type { PricingSettings, ProjectId, ProjectPricing } from "@cleatwork/contracts";
import type { TenantDb } from "../../platform/db/tenant-db.ts";
import {
  priceItemFromRow,
  projectPricingFromRow,
  rowFromPriceItem,
  settingsFromRow,
  type DocumentRow,
  type PriceItemRow,
} from "./pricing.rows.ts";

export const pricingRepository = (db: TenantDb) => ({
  async currency(): Promise<string> {
    const row: { currency: string } = await db.organization().first("currency");
    return row.currency;
  },

  async listItems(): Promise<PriceItem[]> {
    const rows = (await db.from("price_items").orderBy("item_key")) as PriceItemRow[];
    return rows.map(priceItemFromRow);
  },

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

  async getSettings(): Promise<PricingSettings> {
    return settingsFromRow(foundedRow((await db.from("pricing_settings").first()) as DocumentRow | undefined));
  },

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
  async findProjectPricing(projectId: ProjectId): Promise<ProjectPricing | null> {
    const row: { document: unknown; version: number | null } | undefined = await db
      .from("projects", "p")
      .leftJoin("project_pricing as x", { "x.organization_id": "p.organization_id", "x.project_id": "p.id" })
      .where("p.id", projectId)
      .first({ document: "x.document", version: "x.version" });
    return row ? projectPricingFromRow(row) : null;
  },

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
