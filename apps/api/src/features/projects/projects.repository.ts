import type { Project, ProjectId, ProjectItem } from "@cleatwork/contracts";
import { ask, type Question } from "../../platform/db/question.ts";
import type { TenantDb } from "../../platform/db/tenant-db.ts";
import {
  projectFromRow,
  projectItemFromRow,
  rowFromProject,
  type ProjectItemRow,
  type ProjectRequest,
  type ProjectRow,
} from "./projects.rows.ts";

export const projectQuestion = (db: TenantDb, id: ProjectId): Question<Project | null> => ({
  from: db
    .from("projects", "p")
    .join("clients as c", { "c.organization_id": "p.organization_id", "c.id": "p.client_id" })
    .where("p.id", id),
  columns: PROJECT_COLUMNS,
  order: "p.id",
  read: ([row]: readonly ProjectRow[]) => (row ? projectFromRow(row) : null),
});

const PROJECT_COLUMNS = {
  id: "p.id",
  name: "p.name",
  number: "p.number",
  client_id: "p.client_id",
  client_name: "c.name",
  contact_id: "p.contact_id",
  site_address: "p.site_address",
  altitude_m: "p.altitude_m",
  due_at: "p.due_at",
  due_zone: "p.due_zone",
  unit_system: "p.unit_system",
  state: "p.state",
  created_at: "p.created_at",
  version: "p.version",
} satisfies Readonly<Record<keyof ProjectRow, string>>;

export const projectsRepository = (db: TenantDb) => ({
  /** By bid date, undated last; with the price and state of the latest issued revision. */
  async list(): Promise<ProjectItem[]> {
    const rows: ProjectItemRow[] = await db
      .from("projects", "p")
      .join("organizations as o", "o.id", "p.organization_id")
      .join("clients as c", { "c.organization_id": "p.organization_id", "c.id": "p.client_id" })
      .leftJoin("layouts as l", { "l.organization_id": "p.organization_id", "l.project_id": "p.id" })
      .joinRaw(
        `LEFT JOIN quote_revisions AS r ON r.organization_id = p.organization_id AND r.project_id = p.id AND r.id = (
           SELECT x.id FROM quote_revisions AS x
           WHERE x.organization_id = p.organization_id AND x.project_id = p.id
           ORDER BY x.issued_at DESC, x.id DESC LIMIT 1)`,
      )
      .select("p.id", "p.name", "p.number", "p.state", "p.due_at", "p.due_zone", "r.price_minor", "o.currency")
      .select({
        client_name: "c.name",
        segment_count: "l.segment_count",
        quote_state: "r.state",
        quote_currency: "r.currency",
      })
      .orderByRaw("p.due_at IS NULL, p.due_at, p.name, p.id");
    return rows.map(projectItemFromRow);
  },

  find: (id: ProjectId): Promise<Project | null> => ask(projectQuestion(db, id)),

  /** The version and state now, with the row locked; null when there is no such project here. */
  async lock(id: ProjectId): Promise<Pick<Project, "version" | "state"> | null> {
    const row: Pick<Project, "version" | "state"> | undefined = await db
      .from("projects")
      .where({ id })
      .forUpdate()
      .first("version", "state");
    return row ?? null;
  },

  async insert(id: ProjectId, project: ProjectRequest, now: Date): Promise<void> {
    await db.insert("projects", {
      id,
      ...rowFromProject(project),
      state: "bidding" satisfies Project["state"],
      version: 1,
      created_at: now,
    });
  },

  async update(id: ProjectId, project: ProjectRequest, expected: number): Promise<void> {
    await db
      .from("projects")
      .where({ id, version: expected })
      .update({ ...rowFromProject(project), version: expected + 1 });
  },

  async setState(id: ProjectId, state: Project["state"]): Promise<boolean> {
    const changed = await db.from("projects").where({ id }).update({ state });
    return changed === 1;
  },
});
