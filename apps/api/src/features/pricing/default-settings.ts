/**
 * What a new company starts with. No wage and no price is invented: labor has no parts until the owner enters them, and
 * the price book is empty, so the estimate says what is missing. The percentages are common practice of the trade with
 * no single source, and the owner's to change.
 */
import type { PricingSettings, ProjectPricing } from "@cleatwork/contracts";

export const defaultPricingSettings: Omit<PricingSettings, "version"> = {
  labor: [
    { key: "shop", name: "Shop", parts: [] },
    { key: "field", name: "Field", parts: [] },
  ],
  rates: {
    wasteOnMetal_bp: 1_200,
    /** Sales and use tax differ by state and by the contract: the owner's to enter. */
    tax_bp: 0,
    overhead_bp: 1_500,
    contingency_bp: 300,
    profit_bp: 800,
    bond_bp: 0,
  },
  staleAfterDays: 60,
  marginFloor_bp: 500,
  conditionFactor: 1,
};

/** Until someone changes it, a project goes by the company's rates and has no added lines. */
export const untouchedProjectPricing: ProjectPricing = {
  rates: null,
  conditionFactor: null,
  conditionReason: "",
  adds: [],
  version: 1,
};
