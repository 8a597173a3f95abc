import type { ApprovedTakeoffId, FieldTakeoff, ProjectId, RevisionId } from "@cleatwork/contracts";
import { fromJson, instantFromColumn } from "../../platform/db/columns.ts";
import type { TenantDb } from "../../platform/db/tenant-db.ts";
import type { ApprovedDocument } from "./approved-takeoff.ts";

interface ListRow {
  projectId: ProjectId;
  projectName: string;
  siteAddress: unknown;
  approvedAt: Date;
  pieceCount: number;
  weight_kg: number;
}

export const fieldRepository = (db: TenantDb) => ({
  async insert(row: {
    id: ApprovedTakeoffId;
    projectId: ProjectId;
    revisionId: RevisionId;
    document: string;
    hash: string;
    pieceCount: number;
    weight_kg: number;
  }): Promise<void> {
    await db.insert("approved_takeoffs", {
      id: row.id,
      project_id: row.projectId,
      revision_id: row.revisionId,
      document: row.document,
      document_hash: row.hash,
      piece_count: row.pieceCount,
      weight_kg: row.weight_kg,
      approved_at: db.now(),
    });
  },

  /** Sold jobs, newest first; of several approvals of one project the latest. */
  async listProjects() {
    const rows: ListRow[] = await db
      .from("approved_takeoffs", "t")
      .join("projects as p", { "p.organization_id": "t.organization_id", "p.id": "t.project_id" })
      .leftJoin("approved_takeoffs as later", function () {
        this.on("later.organization_id", "t.organization_id")
          .andOn("later.project_id", "t.project_id")
          .andOn("later.id", ">", "t.id");
      })
      .whereNull("later.id")
      .orderBy("t.approved_at", "desc")
      .select({
        projectId: "p.id",
        projectName: "p.name",
        siteAddress: "p.site_address",
        approvedAt: "t.approved_at",
        pieceCount: "t.piece_count",
        weight_kg: "t.weight_kg",
      });
    return rows.map(({ siteAddress, approvedAt, ...row }) => ({
      ...row,
      siteCity: fromJson<{ city: string }>(siteAddress).city,
      approvedAt: instantFromColumn(approvedAt),
    }));
  },

  async find(projectId: ProjectId): Promise<FieldTakeoff | null> {
    const row: { id: ApprovedTakeoffId; document: unknown; approved_at: Date } | undefined = await db
      .from("approved_takeoffs")
      .where({ project_id: projectId })
      .orderBy("id", "desc")
      .first("id", "document", "approved_at");
    return row
      ? {
          ...fromJson<ApprovedDocument>(row.document),
          id: row.id,
          projectId,
          approvedAt: instantFromColumn(row.approved_at),
        }
      : null;
  },
});
