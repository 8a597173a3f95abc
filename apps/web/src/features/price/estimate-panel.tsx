import {
  decimal,
  formatMoney,
  formatUnitPrice,
  type AddedItem,
  type Estimate,
  type EstimateLine,
} from "@cleatwork/calc";
import { Fragment, useState } from "react";
import { Button, IconButton } from "../../ui/button.tsx";
import { EditIcon, PlusIcon, TrashIcon, DownloadIcon } from "../../ui/icons/icon.tsx";
import { Panel, PanelHead } from "../../ui/panel.tsx";
import { SeverityMark, SeverityText } from "../../ui/severity.tsx";
import { csvText, downloadText } from "../../lib/format/csv.ts";
import { groupNames } from "./words.ts";

/** The lines, by group, each open to its arithmetic. */
export function EstimatePanel({
  estimate,
  adds,
  mayAdd,
  staleAfterDays,
  csvName,
  onAdd,
  onEdit,
  onRemove,
}: {
  estimate: Estimate;
  adds: readonly AddedItem[];
  mayAdd: boolean;
  staleAfterDays: number;
  csvName: string;
  onAdd: () => void;
  onEdit: (item: AddedItem) => void;
  onRemove: (item: AddedItem) => void;
}) {
  const [open, setOpen] = useState<string | null>(null);
  const { currency } = estimate;
  const money = (minor: number) => formatMoney(minor, currency).value;
  return (
    <Panel live label="Estimate">
      <PanelHead title="Estimate" fact={`${estimate.lines.length} lines`}>
        {mayAdd && (
          <Button size="small" onClick={onAdd}>
            <PlusIcon size={14} /> Line
          </Button>
        )}
        <Button size="small" onClick={() => downloadText(csvName, linesCsv(estimate))}>
          <DownloadIcon size={14} /> CSV
        </Button>
      </PanelHead>
      <Warnings estimate={estimate} />
      <div className="overflow-x-auto">
        <table className="grid-table">
          <thead>
            <tr>
              <th>Line</th>
              <th className="num">Quantity</th>
              <th className="num">Unit price</th>
              <th className="num">Price age</th>
              <th className="num">Amount</th>
              <th>
                <span className="sr-only">Change</span>
              </th>
            </tr>
          </thead>
          <tbody>
            {estimate.groups
              .filter(({ group }) => estimate.lines.some((line) => line.group === group))
              .map(({ group, amount_minor }) => (
                <Fragment key={group}>
                  <tr data-group>
                    <td colSpan={4}>{groupNames[group]}</td>
                    <td className="num">{money(amount_minor)}</td>
                    <td />
                  </tr>
                  {estimate.lines
                    .filter((line) => line.group === group)
                    .map((line) => {
                      const key = `${line.origin} ${line.key} ${line.description}`;
                      const item =
                        line.origin === "by-hand"
                          ? adds.find(({ id }) => line.key === id || line.key.endsWith(id))
                          : undefined;
                      return (
                        <Fragment key={key}>
                          <tr data-hover data-selected={open === key ? "" : undefined}>
                            <td className="pl-6!">
                              <button
                                type="button"
                                aria-expanded={open === key}
                                className="text-left underline-offset-2 hover:underline"
                                onClick={() => setOpen(open === key ? null : key)}
                              >
                                {line.description}
                              </button>
                            </td>
                            <td className="num">
                              {decimal(line.quantity, 1)} <span className="text-ink-3">{line.unit}</span>
                            </td>
                            <td className="num">{formatUnitPrice(line.unitPrice_micro, currency).value}</td>
                            <td className="num">
                              <Age line={line} staleAfterDays={staleAfterDays} />
                            </td>
                            <td className="num">{money(line.amount_minor)}</td>
                            <td>
                              {item && mayAdd && (
                                <span className="inline-flex">
                                  <IconButton
                                    size="small"
                                    label={`Change ${item.description}`}
                                    onClick={() => onEdit(item)}
                                  >
                                    <EditIcon size={13} />
                                  </IconButton>
                                  <IconButton
                                    size="small"
                                    label={`Remove ${item.description}`}
                                    onClick={() => onRemove(item)}
                                  >
                                    <TrashIcon size={13} />
                                  </IconButton>
                                </span>
                              )}
                            </td>
                          </tr>
                          {open === key && (
                            <tr>
                              <td colSpan={6} className="border-l-4 border-dye bg-sheet-hi p-3!">
                                <LineArithmetic line={line} money={money} currency={currency} />
                              </td>
                            </tr>
                          )}
                        </Fragment>
                      );
                    })}
                </Fragment>
              ))}
            <tr data-total>
              <td colSpan={4}>Direct cost</td>
              <td className="num">{money(estimate.directCost_minor)}</td>
              <td />
            </tr>
          </tbody>
        </table>
      </div>
    </Panel>
  );
}

function LineArithmetic({
  line,
  money,
  currency,
}: {
  line: EstimateLine;
  money: (minor: number) => string;
  currency: string;
}) {
  return (
    <dl className="grid max-w-2xl grid-cols-[1fr_auto] gap-x-4 gap-y-0.5">
      {line.arithmetic.map(({ label, value, unit }, position) => (
        <Fragment key={position}>
          <dt className="text-ink-2">{label}</dt>
          <dd className="text-right">
            {decimal(value, Number.isInteger(value) ? 0 : 2)} {unit}
          </dd>
        </Fragment>
      ))}
      <dt className="border-t border-line pt-1">
        {decimal(line.quantity, 1)} {line.unit} × {formatUnitPrice(line.unitPrice_micro, currency).value}
      </dt>
      <dd className="border-t border-line pt-1 text-right font-semibold">{money(line.amount_minor)}</dd>
    </dl>
  );
}

function Age({ line, staleAfterDays }: { line: EstimateLine; staleAfterDays: number }) {
  if (line.origin === "labor") return <span className="text-ink-3">built up</span>;
  if (line.origin === "by-hand") return <span className="text-ink-3">by hand</span>;
  if (line.priceAge_days === null) return null;
  if (line.priceAge_days > staleAfterDays)
    return (
      <span className="inline-flex items-center gap-1 font-semibold text-warn-ink">
        <SeverityMark severity="warn" size={12} label="Stale" /> {line.priceAge_days} d old
      </span>
    );
  return <span className="text-ink-3">{line.priceAge_days} d</span>;
}

function Warnings({ estimate }: { estimate: Estimate }) {
  if (estimate.warnings.length === 0) return null;
  return (
    <ul className="grid gap-1 border-b border-line px-4 py-2">
      {estimate.warnings.map(({ code, severity, key, message }) => (
        <li key={`${code} ${key}`}>
          <SeverityText severity={severity}>{message}</SeverityText>
        </li>
      ))}
    </ul>
  );
}

const linesCsv = (estimate: Estimate): string =>
  csvText([
    ["group", "line", "quantity", "unit", `unit_price_${estimate.currency}`, `amount_${estimate.currency}`, "origin"],
    ...estimate.lines.map((line) => [
      line.group,
      line.description,
      line.quantity,
      line.unit,
      line.unitPrice_micro / 1_000_000,
      (line.amount_minor / 100).toFixed(2),
      line.origin,
    ]),
  ]);
