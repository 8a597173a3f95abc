import {
  LINE_GROUPS,
  PRICE_UNITS,
  type AddedItem,
  type LaborRate,
  type PriceItem,
  type PricingRates,
} from "@cleatwork/calc";
import { z } from "zod";
import { calendarDate, currency, shortText, version } from "./common.ts";
import { endpoint, member } from "./endpoint.ts";

const basisPoints = z.int().min(0).max(100_000);
const micro = z.int().min(0).max(9_000_000_000_000);

export const priceItemSchema: z.ZodType<PriceItem, PriceItem> = z.strictObject({
  key: z.string().min(1).max(120),
  description: z.string().min(1).max(200),
  group: z.enum(LINE_GROUPS),
  unit: z.enum(PRICE_UNITS),
  unitPrice_micro: micro,
  supplier: z.string().max(120),
  effectiveOn: calendarDate,
  taxable: z.boolean(),
});

export const laborRateSchema: z.ZodType<LaborRate, LaborRate> = z.strictObject({
  key: z.enum(["shop", "field"]),
  name: z.string().min(1).max(120),
  parts: z.array(z.strictObject({ label: z.string().min(1).max(120), amount_micro: micro })).max(40),
});

export const pricingRatesSchema: z.ZodType<PricingRates, PricingRates> = z.strictObject({
  wasteOnMetal_bp: basisPoints,
  tax_bp: basisPoints,
  overhead_bp: basisPoints,
  contingency_bp: basisPoints,
  profit_bp: basisPoints,
  bond_bp: z.int().min(0).max(9_999),
});

export const addedItemSchema: z.ZodType<AddedItem, AddedItem> = z.strictObject({
  id: z.string().min(1).max(64),
  description: z.string().trim().min(1, "what it is").max(200),
  group: z.enum(LINE_GROUPS),
  quantity: z.number().positive("more than zero").max(1_000_000),
  unit: z.enum(PRICE_UNITS),
  unitPrice_micro: micro,
  taxable: z.boolean(),
});

export const priceBookResponse = z.object({ name: z.string(), currency, items: z.array(priceItemSchema) });
export type PriceBook = z.infer<typeof priceBookResponse>;

export const pricingSettingsRequest = z.strictObject({
  labor: z.array(laborRateSchema).min(2).max(2),
  rates: pricingRatesSchema,
  staleAfterDays: z.int().min(1).max(3650),
  marginFloor_bp: z.int().min(0).max(9_999),
  /** Multiplies field hours of every job until a project says otherwise. */
  conditionFactor: z.number().min(0.1).max(10),
});
export const pricingSettingsResponse = pricingSettingsRequest.extend({ version });
export type PricingSettings = z.infer<typeof pricingSettingsResponse>;

/** A project's own rates (null: the company's) and what was added by hand. */
export const projectPricingRequest = z.strictObject({
  rates: pricingRatesSchema.nullable(),
  conditionFactor: z.number().min(0.1).max(10).nullable(),
  conditionReason: shortText,
  adds: z.array(addedItemSchema).max(500),
});
export const projectPricingResponse = projectPricingRequest.extend({ version });
export type ProjectPricing = z.infer<typeof projectPricingResponse>;

export const pricingEndpoints = {
  getPriceBook: endpoint({
    method: "get",
    path: "/companies/:company/price-book",
    access: member("prices.read"),
    summary: "Every price of the company",
    response: priceBookResponse,
  }),
  putPriceItem: endpoint({
    method: "put",
    path: "/companies/:company/price-book/items/:itemKey",
    access: member("prices.write"),
    summary: "Add a price or change it",
    body: priceItemSchema,
    response: priceItemSchema,
  }),
  deletePriceItem: endpoint({
    method: "delete",
    path: "/companies/:company/price-book/items/:itemKey",
    access: member("prices.write"),
    summary: "Take a price out",
  }),
  getPricingSettings: endpoint({
    method: "get",
    path: "/companies/:company/pricing-settings",
    access: member("prices.read"),
    summary: "Labor rates, percentages, limits",
    response: pricingSettingsResponse,
  }),
  updatePricingSettings: endpoint({
    method: "put",
    path: "/companies/:company/pricing-settings",
    access: member("prices.write"),
    summary: "Change labor rates, percentages, limits",
    body: pricingSettingsRequest,
    response: pricingSettingsResponse,
    guards: ["if-match"],
  }),
  getProjectPricing: endpoint({
    method: "get",
    path: "/companies/:company/projects/:projectId/pricing",
    access: member("prices.read"),
    summary: "The project's own rates and added lines",
    response: projectPricingResponse,
  }),
  updateProjectPricing: endpoint({
    method: "put",
    path: "/companies/:company/projects/:projectId/pricing",
    access: member("estimates.write"),
    summary: "Change the project's rates and added lines",
    body: projectPricingRequest,
    response: projectPricingResponse,
    guards: ["if-match"],
  }),
};
