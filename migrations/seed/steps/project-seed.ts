import type { Client } from "@cleatwork/contracts";
import type { DemoProject } from "../projects.ts";

/** What seeding one project needs to know. */
export interface ProjectSeed {
  readonly project: DemoProject;
  readonly clients: ReadonlyMap<string, Client>;
  readonly today: Date;
  readonly mailApiUrl: string;
}
