import type { ProjectId } from "@cleatwork/contracts";
import type { TenantDb } from "../../platform/db/tenant-db.ts";
import { problem } from "../../platform/http/problem.ts";
import type { Deps, FileAnswer } from "../../platform/http/route.ts";
import { computeProject } from "../pricing/index.ts";
import { takeoffCsv } from "./takeoff-csv.ts";
import { takeoffPdf } from "./takeoff-pdf.ts";
import { piecesTable, takeoffTables } from "./takeoff-tables.ts";
import { takeoffXlsx } from "./takeoff-xlsx.ts";

const SEVERITY_WORDS = { stop: "Stop", warn: "Warning", note: "Note" } as const;

/** The takeoff as it is stored now, in a file. A system with problems would be missing from it, so then there is none. */
export async function takeoffFile(
  tenant: TenantDb,
  projectId: ProjectId,
  format: "csv" | "xlsx" | "pdf",
  { clock }: Pick<Deps, "clock">,
): Promise<FileAnswer> {
  const now = clock.now();
  const dayIn = (timeZone: string) => new Intl.DateTimeFormat("en-CA", { timeZone }).format(now);
  const computed = await computeProject(tenant, projectId, ({ timeZone }) => dayIn(timeZone));
  if (!computed) throw problem("not-found", "There is no such project.");
  const { company, numbers } = computed;
  const { project, systems, takeoffs, sequence, problems } = numbers;
  if (problems.length > 0)
    throw problem(
      "cannot-be-computed",
      "A system cannot be solved yet, and a takeoff without it would be a wrong one.",
    );

  const source = { takeoffs, systems, units: project.unitSystem };
  const fileName = `takeoff-${project.name.toLowerCase().replace(/[^a-z0-9]+/g, "-")}.${format}`;
  switch (format) {
    case "csv":
      return { bytes: takeoffCsv(piecesTable(source)), mediaType: "text/csv; charset=utf-8", fileName };
    case "xlsx":
      return {
        bytes: await takeoffXlsx(takeoffTables(source), { author: company.name, now }),
        mediaType: "application/vnd.openxmlformats-officedocument.spreadsheetml.sheet",
        fileName,
      };
    case "pdf":
      return {
        bytes: await takeoffPdf({
          company,
          projectName: project.name,
          madeOn: dayIn(company.timeZone),
          sequence,
          paper: project.unitSystem === "si" ? "A4" : "LETTER",
          tables: takeoffTables(source),
          findings: takeoffs.flatMap(({ findings }) =>
            findings.map(({ severity, message }) => `${SEVERITY_WORDS[severity]}: ${message}`),
          ),
        }),
        mediaType: "application/pdf",
        fileName,
      };
  }
}
