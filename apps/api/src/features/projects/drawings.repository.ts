import type { Drawing, DrawingId, PersonId, ProjectId } from "@cleatwork/contracts";
import type { Question } from "../../platform/db/question.ts";
import type { TenantDb } from "../../platform/db/tenant-db.ts";
import { drawingFromRow, type DrawingRow } from "./drawings.rows.ts";

/** What a project's levels were measured from: only what the title blocks say. */
export const sheetsQuestion = (
  db: TenantDb,
  projectId: ProjectId,
): Question<Pick<Drawing, "id" | "sheetNumber" | "revision">[]> => ({
  from: db.from("drawings", "d").where("d.project_id", projectId),
  columns: { id: "d.id", sheet_number: "d.sheet_number", revision: "d.revision" },
  order: "d.id",
  read: (rows: readonly Pick<DrawingRow, "id" | "sheet_number" | "revision">[]) =>
    rows.map(({ id, sheet_number, revision }) => ({ id, sheetNumber: sheet_number, revision })),
});

export const drawingsRepository = (db: TenantDb) => {
  const withPerson = (projectId: ProjectId) =>
    db
      .from("drawings", "d")
      .join("people as u", "u.id", "d.uploaded_by")
      .where("d.project_id", projectId)
      .select("d.*", { uploaded_by_name: "u.name" });

  return {
    /** Null when there is no such project here. */
    async list(projectId: ProjectId): Promise<Drawing[] | null> {
      const rows = (await db
        .from("projects", "p")
        .leftJoin("drawings as d", { "d.organization_id": "p.organization_id", "d.project_id": "p.id" })
        .leftJoin("people as u", "u.id", "d.uploaded_by")
        .where("p.id", projectId)
        .select("d.*", { uploaded_by_name: "u.name" })
        .orderBy(["d.sheet_number", "d.revision", "d.id"])) as (DrawingRow | { id: null })[];
      if (rows.length === 0) return null;
      return rows.filter((row): row is DrawingRow => row.id !== null).map(drawingFromRow);
    },

    async find(projectId: ProjectId, id: DrawingId): Promise<(Drawing & { fileHash: string }) | null> {
      const row = (await withPerson(projectId).where("d.id", id).first()) as DrawingRow | undefined;
      return row ? { ...drawingFromRow(row), fileHash: row.file_hash } : null;
    },

    async insert(drawing: {
      projectId: ProjectId;
      fields: Omit<Drawing, "uploadedAt" | "uploadedBy">;
      fileHash: string;
      uploadedBy: PersonId;
      uploadedAt: Date;
    }): Promise<void> {
      const { fields } = drawing;
      await db.insert("drawings", {
        id: fields.id,
        project_id: drawing.projectId,
        sheet_number: fields.sheetNumber,
        title: fields.title,
        revision: fields.revision,
        dated_on: fields.datedOn,
        file_name: fields.fileName,
        media_type: fields.mediaType,
        byte_count: fields.byteCount,
        page_count: fields.pageCount,
        file_hash: drawing.fileHash,
        uploaded_by: drawing.uploadedBy,
        uploaded_at: drawing.uploadedAt,
      });
    },

    /** Levels under which the drawing lies. */
    async countUses(projectId: ProjectId, id: DrawingId): Promise<number> {
      const row = (await db
        .from("layout_records")
        .where({ project_id: projectId, drawing_id: id })
        .count({ uses: "*" })
        .first()) as { uses: number | string } | undefined;
      return Number(row?.uses ?? 0);
    },

    async delete(projectId: ProjectId, id: DrawingId): Promise<boolean> {
      const deleted = await db.from("drawings").where({ project_id: projectId, id }).delete();
      return deleted === 1;
    },
  };
};
