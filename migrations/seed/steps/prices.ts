import { labor, MARGIN_FLOOR_BP, priceBook, rates, STALE_AFTER_DAYS } from "../price-book.ts";
import type { People } from "./people.ts";

export async function seedPrices({ owner, company }: People, today: Date): Promise<void> {
  const { items } = await owner.call("getPriceBook", { params: { company } });
  const known = new Set(items.map((item) => item.key));
  for (const item of priceBook(today))
    if (!known.has(item.key)) await owner.call("putPriceItem", { params: { company, itemKey: item.key }, body: item });

  const settings = await owner.call("getPricingSettings", { params: { company } });
  if (settings.labor.every((rate) => rate.parts.length === 0))
    await owner.call("updatePricingSettings", {
      params: { company },
      version: settings.version,
      body: {
        labor: labor.map((rate) => ({ ...rate, parts: [...rate.parts] })),
        rates,
        staleAfterDays: STALE_AFTER_DAYS,
        marginFloor_bp: MARGIN_FLOOR_BP,
        conditionFactor: 1,
      },
    });
}
