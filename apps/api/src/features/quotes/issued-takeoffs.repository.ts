/** Takeoffs as they were issued: to compare a later one with, and for the company's own ratios. No price leaves with them. */
import { ratiosOf, type Piece } from "@cleatwork/calc";
import type { ProjectId, QuoteId, RevisionId } from "@cleatwork/contracts";
import { fromJson, instantFromColumn, type InstantColumn } from "../../platform/db/columns.ts";
import type { TenantDb } from "../../platform/db/tenant-db.ts";
import { problem } from "../../platform/http/problem.ts";
import type { QuoteSnapshot } from "./snapshot.ts";

export async function issuedTakeoff(
  db: TenantDb,
  at: { projectId: ProjectId; quoteId: QuoteId; revisionId: RevisionId },
) {
  const row: { snapshot: unknown; issued_at: InstantColumn } | undefined = await db
    .from("quote_revisions")
    .where({ id: at.revisionId, quote_id: at.quoteId, project_id: at.projectId })
    .first("snapshot", "issued_at");
  if (!row) throw problem("not-found", "There is no such revision.");
  const { takeoffs } = fromJson<Pick<QuoteSnapshot, "takeoffs">>(row.snapshot);
  return {
    revisionId: at.revisionId,
    issuedAt: instantFromColumn(row.issued_at),
    pieces: takeoffs.flatMap(({ pieces }) => [...pieces]),
  };
}

interface RatioRow {
  readonly project_id: ProjectId;
  readonly name: string;
  readonly issued_at: InstantColumn;
  readonly kinds: unknown;
  readonly lengths: unknown;
  readonly weights: unknown;
  readonly areas: unknown;
  readonly airflows: unknown;
}

const JOBS = 50;

/** The latest issued revision of each project, the last fifty projects. Only what the ratios need is read from the snapshots. */
export async function issuedRatios(db: TenantDb) {
  const rows = (await db
    .from("quote_revisions", "r")
    .join("projects as p", { "p.organization_id": "r.organization_id", "p.id": "r.project_id" })
    .whereNotExists(
      db
        .from("quote_revisions", "later")
        .select("later.id")
        .whereRaw("later.project_id = r.project_id and (later.issued_at, later.id) > (r.issued_at, r.id)"),
    )
    .orderBy("r.issued_at", "desc")
    .limit(JOBS)
    .select("r.project_id", "p.name", "r.issued_at")
    .jsonExtract([
      ["r.snapshot", "$.takeoffs[*].pieces[*].kind", "kinds"],
      ["r.snapshot", "$.takeoffs[*].pieces[*].length_m", "lengths"],
      ["r.snapshot", "$.takeoffs[*].pieces[*].weight_kg", "weights"],
      ["r.snapshot", "$.takeoffs[*].pieces[*].netArea_m2", "areas"],
      ["r.snapshot", "$.air[*].outletAirflow_m3s", "airflows"],
    ])) as RatioRow[];
  return rows.map((row) => {
    const [lengths, weights, areas] = [listOf(row.lengths), listOf(row.weights), listOf(row.areas)];
    const pieces = (fromJson<Piece["kind"][] | null>(row.kinds) ?? []).map((kind, index) => ({
      kind,
      length_m: lengths[index] as Piece["length_m"],
      weight_kg: weights[index] as Piece["weight_kg"],
      netArea_m2: areas[index] as Piece["netArea_m2"],
    }));
    const airflow = listOf(row.airflows).reduce((sum, each) => sum + each, 0);
    return {
      projectId: row.project_id,
      projectName: row.name,
      issuedAt: instantFromColumn(row.issued_at),
      ratios: ratiosOf(pieces, airflow),
    };
  });
}

const listOf = (column: unknown): readonly number[] => fromJson<number[] | null>(column) ?? [];
