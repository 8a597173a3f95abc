import { formatWeight } from "@cleatwork/calc/display/index";
import type { Kilograms } from "@cleatwork/calc";
import type { CompanySlug, UnitSystem } from "@cleatwork/contracts";
import { useSuspenseQuery } from "@tanstack/react-query";
import { Link } from "react-router-dom";
import { fieldQueries } from "./field.queries.ts";

/** The foreman's first page: the jobs that are sold, newest first. */
export function FieldHome({ company, units }: { company: CompanySlug; units: UnitSystem }) {
  const { data } = useSuspenseQuery(fieldQueries.projects(company));
  return (
    <main className="mx-auto w-full max-w-2xl p-4">
      <h1 className="text-2xl font-semibold text-ink">Sold jobs</h1>
      {data.items.length === 0 ? (
        <p className="mt-4 text-ink-2">
          Nothing is sold yet. When a client accepts a quote, its approved takeoff appears here.
        </p>
      ) : (
        <ul className="mt-4 grid gap-3">
          {data.items.map((project) => (
            <li key={project.projectId}>
              <Link
                to={`/c/${company}/field/${project.projectId}`}
                className="block border border-line-strong bg-sheet-hi p-4 text-ink"
              >
                <b className="block text-lg leading-6">{project.projectName}</b>
                <span className="text-ink-2">
                  {project.siteCity}
                  {project.siteCity ? " · " : ""}
                  {project.pieceCount} pieces · {formatWeight(project.weight_kg as Kilograms, units).text}
                </span>
              </Link>
            </li>
          ))}
        </ul>
      )}
    </main>
  );
}
