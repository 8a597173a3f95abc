/** What changed in prices, rates and markups, told with the old and the new value for the audit trail. */
import type { PriceItem, PricingRates } from "@cleatwork/calc";
import type { PricingSettings, ProjectPricing } from "@cleatwork/contracts";
import { isDeepStrictEqual } from "node:util";

export interface OldAndNew {
  readonly old: unknown;
  readonly new: unknown;
}
export type Differences = Readonly<Record<string, OldAndNew>>;

export const priceItemDifferences = (before: PriceItem, after: PriceItem): Differences =>
  differencesOf(before, after, [
    "description",
    "group",
    "unit",
    "unitPrice_micro",
    "supplier",
    "effectiveOn",
    "taxable",
  ]);

export function settingsDifferences(
  before: Omit<PricingSettings, "version">,
  after: Omit<PricingSettings, "version">,
): Differences {
  const labor: Record<string, OldAndNew> = {};
  for (const key of ["shop", "field"] as const) {
    const old = before.labor.find((rate) => rate.key === key);
    const now = after.labor.find((rate) => rate.key === key);
    if (!isDeepStrictEqual(old, now)) labor[`labor.${key}`] = { old: old ?? null, new: now ?? null };
  }
  return {
    ...labor,
    ...ratesDifferences(before.rates, after.rates),
    ...differencesOf(before, after, ["staleAfterDays", "marginFloor_bp", "conditionFactor"]),
  };
}

export function projectPricingDifferences(
  before: Omit<ProjectPricing, "version">,
  after: Omit<ProjectPricing, "version">,
): Differences {
  const adds: Record<string, OldAndNew> = {};
  const ids = new Set([...before.adds, ...after.adds].map((added) => added.id));
  for (const id of ids) {
    const old = before.adds.find((added) => added.id === id) ?? null;
    const now = after.adds.find((added) => added.id === id) ?? null;
    if (!isDeepStrictEqual(old, now)) adds[`adds.${id}`] = { old, new: now };
  }
  return { ...differencesOf(before, after, ["rates", "conditionFactor", "conditionReason"]), ...adds };
}

export const isEmpty = (differences: Differences): boolean => Object.keys(differences).length === 0;

/** Both kinds of labor, each once: the contract asks for two, this asks for the right two. */
export function laborProblems(labor: PricingSettings["labor"]) {
  return labor.flatMap((rate, index) =>
    labor.findIndex((other) => other.key === rate.key) < index
      ? [
          {
            pointer: `/labor/${index}/key`,
            code: "labor-twice",
            message: "one rate for shop and one for field",
            value: rate.key,
          },
        ]
      : [],
  );
}

/** Added lines are told apart by their ids. */
export function addedItemProblems(adds: ProjectPricing["adds"]) {
  return adds.flatMap((added, index) =>
    adds.findIndex((other) => other.id === added.id) < index
      ? [{ pointer: `/adds/${index}/id`, code: "id-twice", message: "each line its own id", value: added.id }]
      : [],
  );
}

function ratesDifferences(before: PricingRates, after: PricingRates): Differences {
  const keys = Object.keys(after) as (keyof PricingRates)[];
  return Object.fromEntries(
    keys
      .filter((key) => before[key] !== after[key])
      .map((key) => [`rates.${key}`, { old: before[key], new: after[key] }]),
  );
}

function differencesOf<T extends object>(before: T, after: T, keys: readonly (keyof T & string)[]): Differences {
  return Object.fromEntries(
    keys
      .filter((key) => !isDeepStrictEqual(before[key], after[key]))
      .map((key) => [key, { old: before[key], new: after[key] }]),
  );
}
