import type { ProjectId } from "@cleatwork/contracts";
import { NO_COMPANY_STANDARDS } from "@cleatwork/calc";
import { computeNumbers } from "@cleatwork/layout";
import type { People } from "./people.ts";

/** What the estimator has on screen when pressing the button: the same calculation on the same documents. */
export async function priceAsTheBrowserWould(
  { estimator, company }: People,
  projectId: ProjectId,
): Promise<{ sequence: number; price_minor: number }> {
  const params = { company, projectId };
  const [project, layout, { items: specs }, book, settings, pricing] = await Promise.all([
    estimator.call("getProject", { params }),
    estimator.call("getLayout", { params }),
    estimator.call("listSpecs", { params: { company } }),
    estimator.call("getPriceBook", { params: { company } }),
    estimator.call("getPricingSettings", { params: { company } }),
    estimator.call("getProjectPricing", { params }),
  ]);
  const { estimate, problems } = computeNumbers({
    records: layout.records,
    specs,
    altitude_m: project.altitude_m,
    frictionBasis: "hydraulic-diameter",
    currency: book.currency,
    items: book.items,
    settings,
    standards: NO_COMPANY_STANDARDS,
    pricing,
    pricedOn: new Date().toISOString().slice(0, 10),
  });
  if (!estimate) throw new Error(`${project.name} cannot be priced: ${JSON.stringify(problems)}`);
  const missing = estimate.warnings.filter((warning) => warning.severity === "stop");
  if (missing.length > 0) throw new Error(`${project.name}: ${missing.map((warning) => warning.message).join("; ")}`);
  return { sequence: layout.sequence, price_minor: estimate.price_minor };
}
