import { LINE_GROUPS, type PriceItem } from "@cleatwork/calc";
import { useSuspenseQuery } from "@tanstack/react-query";
import { useMemo, useState } from "react";
import { calendarDateText, daysBetween, todayIn } from "../../lib/format/dates.ts";
import { unitPriceText } from "../../lib/format/money.ts";
import { useNow } from "../../lib/use-now.ts";
import { useActions } from "../../ui/actions/registry.ts";
import { Button } from "../../ui/button.tsx";
import { EmptyState } from "../../ui/empty-state.tsx";
import { PlusIcon } from "../../ui/icons/icon.tsx";
import { Notice } from "../../ui/notice.tsx";
import { SeverityText } from "../../ui/severity.tsx";
import { DataTable, type RowGroup } from "../../ui/table/data-table.tsx";
import type { TableColumn } from "../../ui/table/table-column.ts";
import { Toggle } from "../../ui/toggle.tsx";
import { useSession } from "../session/index.ts";
import { PriceCell } from "./price-cell.tsx";
import { PriceDialog } from "./price-dialog.tsx";
import { groupWords, unitWords } from "./price-words.ts";
import { priceQueries } from "./prices.queries.ts";
import { useSavePrice } from "./use-save-price.ts";

/** Every price of the company, changed where it stands, with its age in view. */
export function PriceBookScreen() {
  const { slug, company, may } = useSession();
  const { data: book } = useSuspenseQuery(priceQueries.book(slug));
  const { data: settings } = useSuspenseQuery(priceQueries.settings(slug));
  const today = todayIn(company.timeZone, useNow());
  const [editing, setEditing] = useState<PriceItem | "new" | null>(null);
  const [only, setOnly] = useState<"all" | "stale">("all");
  const { save } = useSavePrice();
  const mayWrite = may("prices.write");
  useActions(
    mayWrite ? [{ id: "new price", label: "New price", group: "Make", keys: "n", run: () => setEditing("new") }] : [],
  );

  const ageOf = (item: PriceItem) => daysBetween(item.effectiveOn, today);
  const stale = book.items.filter((item) => ageOf(item) > settings.staleAfterDays);
  const { mutate } = save;
  const columns = useMemo(
    () =>
      columnsFor({
        currency: book.currency,
        today,
        staleAfterDays: settings.staleAfterDays,
        onPrice: mayWrite
          ? (item, micro) => mutate({ item: { ...item, unitPrice_micro: micro, effectiveOn: today }, before: item })
          : null,
      }),
    [book.currency, today, settings.staleAfterDays, mayWrite, mutate],
  );
  const keys = useMemo(() => new Set(book.items.map((item) => item.key)), [book.items]);
  const add = mayWrite && (
    <Button size="small" rank="primary" onClick={() => setEditing("new")}>
      <PlusIcon />
      New price
    </Button>
  );
  return (
    <main className="flex min-h-0 flex-1 flex-col gap-4 p-4">
      {stale.length > 0 && (
        <Notice
          severity="warn"
          title={`${stale.length} of ${book.items.length} prices are older than ${settings.staleAfterDays} days`}
        >
          Quotes that use them say so. Typing a price, even the same one, dates it today.
        </Notice>
      )}
      <DataTable
        live
        title={book.name}
        fact={`${book.items.length} prices in ${book.currency}`}
        rows={only === "stale" ? stale : book.items}
        columns={columns}
        rowId={(item) => item.key}
        groups={groups}
        sort={{ id: "description", desc: false }}
        csvName="price-book"
        findLabel="Find a price"
        className="min-h-0 flex-1"
        {...(mayWrite ? { onOpen: setEditing } : {})}
        filters={
          stale.length > 0 && (
            <Toggle
              label="Which prices"
              value={only}
              onChange={setOnly}
              choices={[
                { value: "all", label: "All" },
                { value: "stale", label: "Old ones" },
              ]}
            />
          )
        }
        actions={add}
        empty={
          <EmptyState title={only === "stale" ? "No old prices" : "No prices yet"} actions={add}>
            Metal by the pound, devices by the piece, insulation by the square foot: what a takeoff counts is priced
            from here.
          </EmptyState>
        }
      />
      <PriceDialog
        item={editing === "new" ? null : editing}
        taken={keys}
        open={editing !== null}
        onOpenChange={(open) => {
          if (!open) setEditing(null);
        }}
      />
    </main>
  );
}

const groups: readonly RowGroup<PriceItem>[] = LINE_GROUPS.map((group) => ({
  id: group,
  label: groupWords[group],
  has: (item) => item.group === group,
}));

const columnsFor = ({
  currency,
  today,
  staleAfterDays,
  onPrice,
}: {
  currency: string;
  today: string;
  staleAfterDays: number;
  onPrice: ((item: PriceItem, micro: number) => void) | null;
}): readonly TableColumn<PriceItem>[] => [
  { id: "description", head: "Description", value: (item) => item.description },
  { id: "key", head: "Key", value: (item) => item.key, className: "text-ink-2" },
  {
    id: "price",
    head: `Unit price, ${currency}`,
    align: "right",
    value: (item) => item.unitPrice_micro / 1e6,
    cell: (item) =>
      onPrice ? (
        <PriceCell item={item} onChange={(micro) => onPrice(item, micro)} />
      ) : (
        <b className="font-[620]">{unitPriceText(item.unitPrice_micro, currency)}</b>
      ),
  },
  { id: "unit", head: "For one", value: (item) => unitWords[item.unit] },
  { id: "supplier", head: "Supplier", value: (item) => item.supplier || null },
  {
    id: "date",
    head: "Price of",
    value: (item) => item.effectiveOn,
    cell: (item) => {
      const age = daysBetween(item.effectiveOn, today);
      return (
        <span className="flex items-center gap-2 whitespace-nowrap">
          {calendarDateText(item.effectiveOn)}
          {age > staleAfterDays && <SeverityText severity="warn">{age} days old</SeverityText>}
        </span>
      );
    },
  },
  { id: "tax", head: "Tax", value: (item) => (item.taxable ? "taxable" : "not taxed"), className: "text-ink-2" },
];
