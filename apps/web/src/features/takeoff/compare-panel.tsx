import { formatHours, formatSize, formatWeightChange, hours, kilograms } from "@cleatwork/calc";
import type { ComparedPiece } from "@cleatwork/contracts";
import { useQuery } from "@tanstack/react-query";
import { useMemo } from "react";
import { Link, useSearchParams } from "react-router-dom";
import { dayText } from "../../lib/format/dates.ts";
import { paths } from "../../lib/paths.ts";
import { SelectField } from "../../ui/controls.tsx";
import { Panel, PanelBody, PanelHead } from "../../ui/panel.tsx";
import { quoteQueries } from "../quote-editor/index.ts";
import { useWorkspace } from "../workspace/index.ts";
import { comparePieces, type Compared } from "./compare-pieces.ts";
import { takeoffQueries } from "./takeoff.queries.ts";

const SHOWN = 40;

/** The live takeoff beside one that was issued: what came, what went, what changed. */
export function ComparePanel() {
  const { company, project, numbers, units } = useWorkspace();
  const { data: quotes } = useQuery(quoteQueries.list(company.slug, project.id));
  const [search, setSearch] = useSearchParams();
  const revisions = (quotes?.items ?? []).flatMap((quote) => quote.revisions.map((revision) => ({ quote, revision })));
  const chosen = revisions.find(({ revision }) => revision.id === search.get("against"));
  const { data: issued } = useQuery({
    ...takeoffQueries.issued(
      company.slug,
      project.id,
      chosen?.quote.id ?? ("" as never),
      chosen?.revision.id ?? ("" as never),
    ),
    enabled: chosen !== undefined,
  });
  const pieces = useMemo(() => (numbers?.takeoffs ?? []).flatMap((takeoff) => takeoff.pieces), [numbers]);
  const comparison = useMemo(() => (issued ? comparePieces(issued.pieces, pieces) : null), [issued, pieces]);
  if (revisions.length === 0) return null;
  return (
    <Panel label="Compare">
      <PanelHead title="Compare with" />
      <PanelBody className="grid gap-2">
        <SelectField
          label="An issued quote"
          hideLabel
          empty="Nothing"
          value={chosen?.revision.id ?? ""}
          onChange={(event) => setSearch(event.target.value ? { against: event.target.value } : {}, { replace: true })}
          choices={revisions.map(({ quote, revision }) => ({
            value: revision.id,
            label: `${quote.number}, revision ${revision.number}, ${dayText(revision.issuedAt)}`,
          }))}
        />
        {comparison && (
          <>
            <p role="status">
              <b>{formatWeightChange(kilograms(comparison.weight_kg), units).text}</b>, shop{" "}
              {signedHours(comparison.shop_h)}, field {signedHours(comparison.field_h)}; {comparison.unchanged} pieces
              as they were.
            </p>
            <ul className="grid max-h-80 gap-1 overflow-auto">
              {comparison.pieces.slice(0, SHOWN).map((compared) => {
                const piece = compared.after ?? compared.before;
                return (
                  piece && (
                    <li key={`${piece.systemId} ${piece.mark}`}>
                      <span className="label-width text-help text-ink-3">{compared.state}</span>{" "}
                      <b>
                        {piece.systemTag} {piece.mark}
                      </b>{" "}
                      {wordsOf(compared, (one) => formatSize(one.section, units).text)}{" "}
                      {compared.after && (
                        <Link to={`${paths.project(company.slug, project.id)}?at=${piece.segmentId}`}>
                          on the board
                        </Link>
                      )}
                    </li>
                  )
                );
              })}
            </ul>
            {comparison.pieces.length > SHOWN && (
              <p className="text-help text-ink-3">and {comparison.pieces.length - SHOWN} more pieces</p>
            )}
          </>
        )}
      </PanelBody>
    </Panel>
  );
}

const signedHours = (value: number) => `${value > 0 ? "+" : ""}${formatHours(hours(value), "si").text}`;

function wordsOf({ before, after, fields }: Compared, sizeOf: (piece: ComparedPiece) => string): string {
  if (!before || !after) return describe(after ?? before, sizeOf);
  return `${describe(before, sizeOf)} → ${describe(after, sizeOf)} (${fields.join(", ")})`;
}

const describe = (piece: ComparedPiece | null, sizeOf: (piece: ComparedPiece) => string): string =>
  piece ? [piece.kind, sizeOf(piece), piece.gauge].filter(Boolean).join(" ") : "";
