/** A project's documents and its numbers, as the door of pricing answers them. */
import type { Project } from "@cleatwork/contracts";
import { computeNumbers as compute, type Numbers, type PricingDocuments } from "@cleatwork/layout";

export interface ProjectDocuments extends Omit<PricingDocuments, "altitude_m"> {
  readonly project: Project;
  readonly sequence: number;
}

export interface ProjectNumbers extends Numbers {
  readonly project: Project;
  readonly sequence: number;
}

export function computeNumbers({ project, sequence, ...documents }: ProjectDocuments): ProjectNumbers {
  return { project, sequence, ...compute({ ...documents, altitude_m: project.altitude_m }) };
}
