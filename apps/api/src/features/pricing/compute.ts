/** From a project's documents to its numbers: layout, air, takeoff, estimate. Pure. */
import {
  price,
  shippedStandards,
  solve,
  takeOff,
  type AirSystem,
  type Estimate,
  type PriceItem,
  type ShopStandards,
  type Solution,
  type SystemProblem,
  type Takeoff,
} from "@cleatwork/calc";
import type { LayoutRecord, PricingSettings, Project, ProjectPricing, Spec } from "@cleatwork/contracts";
import { airSystemsFrom, createLayout } from "@cleatwork/layout";

export interface ProjectDocuments {
  readonly project: Project;
  readonly sequence: number;
  readonly records: readonly LayoutRecord[];
  readonly specs: readonly Spec[];
  readonly currency: string;
  readonly items: readonly PriceItem[];
  readonly settings: PricingSettings;
  readonly pricing: ProjectPricing;
  /** The day the prices are read for, YYYY-MM-DD. */
  readonly pricedOn: string;
}

export interface ProjectNumbers {
  readonly project: Project;
  readonly sequence: number;
  readonly systems: readonly AirSystem[];
  readonly solutions: readonly Solution[];
  readonly takeoffs: readonly Takeoff[];
  /** Null when a system has problems: a price without one system would be a wrong price. */
  readonly estimate: Estimate | null;
  readonly problems: readonly SystemProblem[];
}

export function computeNumbers(documents: ProjectDocuments): ProjectNumbers {
  const { project, sequence, settings, pricing } = documents;
  const layout = createLayout(documents.records);
  const systems = airSystemsFrom(layout, { specs: documents.specs, altitude_m: project.altitude_m });
  const standards = withCondition(shippedStandards, pricing.conditionFactor ?? settings.conditionFactor);

  const solutions: Solution[] = [];
  const takeoffs: Takeoff[] = [];
  const problems: SystemProblem[] = [];
  for (const system of systems) {
    const solved = solve(system);
    if (!solved.ok) {
      problems.push(...solved.problems);
      continue;
    }
    solutions.push(solved.value);
    takeoffs.push(takeOff({ system, standards }, solved.value));
  }

  const estimate =
    problems.length > 0
      ? null
      : price(takeoffs, {
          currency: documents.currency,
          items: documents.items,
          labor: settings.labor,
          rates: pricing.rates ?? settings.rates,
          adds: pricing.adds,
          pricedOn: documents.pricedOn,
          staleAfterDays: settings.staleAfterDays,
          marginFloor_bp: settings.marginFloor_bp,
        });
  return { project, sequence, systems, solutions, takeoffs, estimate, problems };
}

const withCondition = (standards: ShopStandards, conditionFactor: number): ShopStandards => ({
  ...standards,
  productivity: { ...standards.productivity, conditionFactor },
});
