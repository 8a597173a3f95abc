import type { Project, ProjectItem, projectRequest } from "@cleatwork/contracts";
import type { z } from "zod";
import { fromJson, instantFromColumn, type InstantColumn } from "../../platform/db/columns.ts";

export type ProjectRequest = z.infer<typeof projectRequest>;

export interface ProjectRow {
  readonly id: Project["id"];
  readonly name: string;
  readonly number: string;
  readonly client_id: Project["clientId"];
  readonly client_name: string;
  readonly contact_id: Project["contactId"];
  readonly site_address: unknown;
  readonly altitude_m: number;
  readonly due_at: InstantColumn | null;
  readonly due_zone: string;
  readonly unit_system: Project["unitSystem"];
  readonly state: Project["state"];
  readonly created_at: InstantColumn;
  readonly version: number;
}

export const projectFromRow = (row: ProjectRow): Project => ({
  id: row.id,
  name: row.name,
  number: row.number,
  clientId: row.client_id,
  clientName: row.client_name,
  contactId: row.contact_id,
  siteAddress: fromJson(row.site_address),
  altitude_m: row.altitude_m as Project["altitude_m"],
  dueAt: row.due_at === null ? null : instantFromColumn(row.due_at),
  dueZone: row.due_zone,
  unitSystem: row.unit_system,
  state: row.state,
  createdAt: instantFromColumn(row.created_at),
  version: row.version,
});

export const rowFromProject = (project: ProjectRequest) => ({
  name: project.name,
  number: project.number,
  client_id: project.clientId,
  contact_id: project.contactId,
  site_address: JSON.stringify(project.siteAddress),
  altitude_m: project.altitude_m,
  due_at: project.dueAt === null ? null : new Date(project.dueAt),
  due_zone: project.dueZone,
  unit_system: project.unitSystem,
});

export interface ProjectItemRow extends Pick<
  ProjectRow,
  "id" | "name" | "number" | "client_name" | "state" | "due_at" | "due_zone"
> {
  readonly segment_count: number | null;
  readonly price_minor: number | string | null;
  /** The company's, and of the latest revision where there is one. */
  readonly currency: string;
  readonly quote_currency: string | null;
  readonly quote_state: string | null;
}

export const projectItemFromRow = (row: ProjectItemRow): ProjectItem => ({
  id: row.id,
  name: row.name,
  number: row.number,
  clientName: row.client_name,
  state: row.state,
  dueAt: row.due_at === null ? null : instantFromColumn(row.due_at),
  dueZone: row.due_zone,
  segmentCount: row.segment_count ?? 0,
  price_minor: row.price_minor === null ? null : Number(row.price_minor),
  currency: row.quote_currency ?? row.currency,
  quoteState: row.quote_state,
});
