import { shippedPractice } from "@cleatwork/calc";
import { Button } from "../../ui/button.tsx";
import { Panel, PanelBody, PanelHead } from "../../ui/panel.tsx";
import { coefficientRows, coefficientText, copyCoefficients, readCoefficient } from "./coefficient-rows.ts";
import type { PanelProps } from "./gauge-panel.tsx";
import { GridCell } from "./grid-cell.tsx";

/** Loss coefficients that no formula gives: shipped as common practice, a company's own to set. */
export function CoefficientsPanel({ document, onChange, onUnclear, mayWrite }: PanelProps) {
  const own = document.coefficients ?? null;
  const shown = own ?? shippedPractice;
  return (
    <Panel live label="Loss coefficients">
      <PanelHead title="Loss coefficients" fact={own ? "ours" : `shipped, ${shippedPractice.source}`}>
        {mayWrite &&
          (own ? (
            <Button size="small" onClick={() => onChange({ ...document, coefficients: null })}>
              Back to shipped
            </Button>
          ) : (
            <Button size="small" onClick={() => onChange(copyCoefficients(document))}>
              Copy to ours
            </Button>
          ))}
      </PanelHead>
      <PanelBody>
        <p className="max-w-prose text-ink-2">
          All other fittings are computed by published formulas, named beside each loss. These few have no formula that
          may be printed here; each loss that rests on one of them says so.
        </p>
      </PanelBody>
      <div className="overflow-x-auto">
        <table className="grid-table">
          <thead>
            <tr>
              <th>Fitting</th>
              <th>Value</th>
              <th>Unit</th>
              <th>Shipped</th>
            </tr>
          </thead>
          <tbody>
            <tr data-hover>
              <td>Where they come from</td>
              <GridCell
                wide
                column="coefficient"
                name="Where they come from"
                text={own ? own.source : ""}
                disabled={!mayWrite || own === null}
                onUnclear={onUnclear}
                read={(typed) => {
                  const value = typed.trim();
                  return value !== "" && value.length <= 200
                    ? { ok: true, value }
                    : { ok: false, allowed: "1 to 200 characters" };
                }}
                onChange={(source) => own && onChange({ ...document, coefficients: { ...own, source } })}
              />
              <td />
              <td />
            </tr>
            {coefficientRows.map((row) => (
              <tr key={row.name} data-hover>
                <td>{row.name}</td>
                <GridCell
                  column="coefficient"
                  name={row.name}
                  text={coefficientText(row, shown)}
                  disabled={!mayWrite || own === null}
                  onUnclear={onUnclear}
                  read={(typed) => readCoefficient(row, typed)}
                  onChange={(value) => own && onChange({ ...document, coefficients: row.set(own, value) })}
                />
                <td className="text-ink-2">{row.unit}</td>
                <td className="text-ink-3">{coefficientText(row, shippedPractice)}</td>
              </tr>
            ))}
          </tbody>
        </table>
      </div>
    </Panel>
  );
}
