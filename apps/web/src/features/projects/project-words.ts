import type { ProjectItem } from "@cleatwork/contracts";

/** Where a project stands, in a few words. */
export function standing(project: Pick<ProjectItem, "state" | "segmentCount" | "quoteState">): string {
  switch (project.state) {
    case "bidding":
      return project.segmentCount === 0 ? "Not started" : "Laying out and pricing";
    case "quoted":
      return project.quoteState ? `Quote ${project.quoteState}` : "Quoted";
    case "won":
      return "Accepted, in shop and field";
    case "lost":
      return project.quoteState ? `Quote ${project.quoteState}` : "Lost";
  }
}
