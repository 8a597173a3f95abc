import type { AddedItem, PricingBasis } from "@cleatwork/calc";
import { useSuspenseQueries } from "@tanstack/react-query";
import { useMemo, useState } from "react";
import { EmptyState } from "../../ui/empty-state.tsx";
import { ScreenSkeleton } from "../../ui/skeleton.tsx";
import { SeverityText } from "../../ui/severity.tsx";
import { notify } from "../../ui/toast.tsx";
import { useSession } from "../session/index.ts";
import { useWorkspace, workspaceQueries } from "../workspace/index.ts";
import { AddLineDialog } from "./add-line-dialog.tsx";
import { CostLadder } from "./cost-ladder.tsx";
import { EstimatePanel } from "./estimate-panel.tsx";
import { useSaveProjectPricing } from "./price.queries.ts";
import { RatesPanel } from "./rates-panel.tsx";
import { WhatIfPanel } from "./what-if-panel.tsx";

/** From pieces and hours to a price: lines, the ladder from cost to price, percentages, what-ifs. */
export function PriceScreen() {
  const { numbers, company, project } = useWorkspace();
  const { may } = useSession();
  const [book, settings, pricing] = useSuspenseQueries({
    queries: [
      workspaceQueries.priceBook(company.slug),
      workspaceQueries.settings(company.slug),
      workspaceQueries.pricing(company.slug, project.id),
    ],
  });
  const save = useSaveProjectPricing(company.slug, project.id);
  const [dialog, setDialog] = useState<{ item: AddedItem | null } | null>(null);
  const basis = useMemo<PricingBasis>(
    () => ({
      currency: book.data.currency,
      items: book.data.items,
      labor: settings.data.labor,
      rates: pricing.data.rates ?? settings.data.rates,
      adds: pricing.data.adds,
      pricedOn: new Date().toISOString().slice(0, 10),
      staleAfterDays: settings.data.staleAfterDays,
      marginFloor_bp: settings.data.marginFloor_bp,
    }),
    [book.data, settings.data, pricing.data],
  );
  if (!numbers) return <ScreenSkeleton />;
  const { estimate } = numbers;
  const mayEdit = may("estimates.write");
  const saveAdds = (adds: AddedItem[], words: string) => {
    const before = pricing.data.adds;
    save.mutate(
      { ...pricing.data, adds },
      {
        onSuccess: (saved) => notify(words, { undo: () => save.mutate({ ...saved, adds: before }) }),
        onError: (error) => notify(error.message, { severity: "warn" }),
      },
    );
  };

  return (
    <main className="grid min-h-0 grow grid-cols-[minmax(0,1fr)_minmax(0,1fr)] content-start gap-3 overflow-auto p-4 max-lg:grid-cols-1">
      <h1 className="sr-only">Price</h1>
      {estimate ? (
        <>
          <EstimatePanel
            estimate={estimate}
            adds={pricing.data.adds}
            mayAdd={mayEdit}
            staleAfterDays={settings.data.staleAfterDays}
            csvName={`${project.name} estimate.csv`}
            onAdd={() => setDialog({ item: null })}
            onEdit={(item) => setDialog({ item })}
            onRemove={(item) =>
              saveAdds(
                pricing.data.adds.filter(({ id }) => id !== item.id),
                `${item.description} removed.`,
              )
            }
          />
          <div className="grid content-start gap-3">
            <CostLadder estimate={estimate} />
            <div className="grid grid-cols-2 gap-3 max-md:grid-cols-1">
              <WhatIfPanel takeoffs={numbers.takeoffs} basis={basis} />
              <RatesPanel
                settings={settings.data}
                pricing={pricing.data}
                mayEdit={mayEdit}
                busy={save.isPending}
                onSave={(next) =>
                  save.mutate(next, { onError: (error) => notify(error.message, { severity: "warn" }) })
                }
              />
            </div>
          </div>
        </>
      ) : (
        <EmptyState title="No price while a stop stands">
          A price without one system would be a wrong price. Mend these first:
          <ul className="mt-2 grid gap-1">
            {numbers.problems.map(({ subject, limit }, position) => (
              <li key={position}>
                <SeverityText severity="stop">
                  {subject.name || subject.kind}: needs {limit}
                </SeverityText>
              </li>
            ))}
          </ul>
        </EmptyState>
      )}
      {dialog && (
        <AddLineDialog
          item={dialog.item}
          onClose={() => setDialog(null)}
          onSave={(item) => {
            setDialog(null);
            saveAdds([...pricing.data.adds.filter(({ id }) => id !== item.id), item], `${item.description} saved.`);
          }}
        />
      )}
    </main>
  );
}
