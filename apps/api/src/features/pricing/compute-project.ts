import type { Company, ProjectId } from "@cleatwork/contracts";
import type { TenantDb } from "../../platform/db/tenant-db.ts";
import { companyQuestion } from "../companies/index.ts";
import { layoutQuestion } from "../layouts/index.ts";
import { projectQuestion, sheetsQuestion } from "../projects/index.ts";
import { specsQuestion } from "../specs/index.ts";
import { standardsOn, standardsQuestion } from "../standards/index.ts";
import { computeNumbers, type ProjectNumbers } from "./compute.ts";
import { priceItemsQuestion, projectPricingQuestion, settingsQuestion } from "./pricing.repository.ts";

/** All that a project's numbers are computed from, to be asked in one statement, so that all of it is of one moment. */
export const projectQuestions = (db: TenantDb, projectId: ProjectId) => ({
  company: companyQuestion(db),
  project: projectQuestion(db, projectId),
  layout: layoutQuestion(db, projectId),
  drawings: sheetsQuestion(db, projectId),
  specs: specsQuestion(db),
  standards: standardsQuestion(db),
  items: priceItemsQuestion(db),
  settings: settingsQuestion(db),
  pricing: projectPricingQuestion(db, projectId),
});

/** What the database answered to them. */
export type ProjectAnswers = Awaited<ReturnType<typeof askProject>>;
const askProject = (db: TenantDb, projectId: ProjectId) => db.askTogether(projectQuestions(db, projectId));

/** Null when there is no such project here. */
export function numbersFrom(answers: ProjectAnswers, pricedOn: string): ProjectNumbers | null {
  const { company, project, layout, drawings, pricing, ...documents } = answers;
  if (!project || !layout || !pricing) return null;
  const { specs, items, settings } = documents;
  const standards = standardsOn(documents.standards, pricedOn);
  const { currency, frictionBasis } = company;
  return computeNumbers({
    project,
    ...layout,
    drawings,
    specs,
    standards,
    items,
    settings,
    currency,
    frictionBasis,
    pricing,
    pricedOn,
  });
}

/** A project's numbers from what is stored now, with the company they are for; null when there is no such project here. */
export async function computeProject(
  db: TenantDb,
  projectId: ProjectId,
  pricedOn: (company: Company) => string,
): Promise<{ company: Company; numbers: ProjectNumbers } | null> {
  const answers = await askProject(db, projectId);
  const numbers = numbersFrom(answers, pricedOn(answers.company));
  return numbers && { company: answers.company, numbers };
}
