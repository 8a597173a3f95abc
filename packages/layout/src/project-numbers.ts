/** From a project's documents to its numbers: air, takeoff, estimate. The browser's worker and the server run this. */
import {
  createTakeoff,
  price,
  shippedPractice,
  solve,
  standardsOf,
  takeOff,
  type AirSystem,
  type CompanyStandards,
  type Estimate,
  type FrictionBasis,
  type Meters,
  type PriceItem,
  type Solution,
  type SystemProblem,
  type Takeoff,
} from "@cleatwork/calc";
import type { LayoutRecord, PricingSettings, ProjectPricing, Spec } from "@cleatwork/contracts";
import { airSystemsFrom, type MeasuredDrawing } from "./air-systems.ts";
import { createLayout } from "./layout.ts";

export interface PricingDocuments {
  readonly records: readonly LayoutRecord[];
  readonly specs: readonly Pick<Spec, "id" | "construction">[];
  readonly altitude_m: Meters;
  readonly frictionBasis: FrictionBasis;
  readonly drawings?: readonly MeasuredDrawing[] | undefined;
  readonly currency: string;
  readonly items: readonly PriceItem[];
  readonly settings: PricingSettings;
  /** The company's own schedules, in force on the day. */
  readonly standards: CompanyStandards;
  readonly pricing: ProjectPricing;
  /** The day the prices are read for, YYYY-MM-DD. */
  readonly pricedOn: string;
}

export interface Numbers {
  readonly systems: readonly AirSystem[];
  readonly solutions: readonly Solution[];
  readonly takeoffs: readonly Takeoff[];
  /** Null when a system has problems: a price without one system would be a wrong price. */
  readonly estimate: Estimate | null;
  readonly problems: readonly SystemProblem[];
}

export const computeNumbers = (documents: PricingDocuments): Numbers => numbersOf(documents, () => takeOff);

/** The same, remembering each system's takeoff, so that after an edit only the pieces that it touches are made anew. */
export function createNumbers(): typeof computeNumbers {
  const remembered = new Map<string, typeof takeOff>();
  return (documents) =>
    numbersOf(documents, (systemId) => {
      let taking = remembered.get(systemId);
      if (!taking) remembered.set(systemId, (taking = createTakeoff()));
      return taking;
    });
}

function numbersOf(documents: PricingDocuments, taking: (systemId: string) => typeof takeOff): Numbers {
  const { settings, pricing } = documents;
  const layout = createLayout(documents.records);
  const systems = airSystemsFrom(layout, {
    specs: documents.specs,
    altitude_m: documents.altitude_m,
    frictionBasis: documents.frictionBasis,
    drawings: documents.drawings,
  });
  const standards = standardsOf(documents.standards, pricing.conditionFactor ?? settings.conditionFactor);

  const solutions: Solution[] = [];
  const takeoffs: Takeoff[] = [];
  const problems: SystemProblem[] = [];
  for (const system of systems) {
    const solved = solve(system, documents.standards.coefficients ?? shippedPractice);
    if (!solved.ok) {
      problems.push(...solved.problems);
      continue;
    }
    solutions.push(solved.value);
    takeoffs.push(taking(system.id)({ system, standards }, solved.value));
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
  return { systems, solutions, takeoffs, estimate, problems };
}
