import { formatMoney } from "@cleatwork/calc";
import { endpoints, type Quote, type QuoteDraft } from "@cleatwork/contracts";
import { useQuery, useSuspenseQuery } from "@tanstack/react-query";
import { useCallback, useEffect, useRef, useState } from "react";
import { apiUrl } from "../../lib/http.ts";
import { Button } from "../../ui/button.tsx";
import { EmptyState } from "../../ui/empty-state.tsx";
import { Panel, PanelBody, PanelHead } from "../../ui/panel.tsx";
import { SeverityText } from "../../ui/severity.tsx";
import { notify } from "../../ui/toast.tsx";
import { clientQueries } from "../clients/index.ts";
import { useSession } from "../session/index.ts";
import { useWorkspace } from "../workspace/index.ts";
import { DraftForm } from "./draft-form.tsx";
import { IssueDialog } from "./issue-dialog.tsx";
import { quoteQueries, useQuoteActions } from "./quotes.queries.ts";
import { RevisionsPanel } from "./revisions-panel.tsx";

/** The words beside the page they make. */
export function QuoteScreen() {
  const { company, project } = useWorkspace();
  const { may } = useSession();
  const { data } = useSuspenseQuery(quoteQueries.list(company.slug, project.id));
  const actions = useQuoteActions(company.slug, project.id);
  const quote = data.items.at(-1);

  if (!quote)
    return (
      <main className="p-4">
        <h1 className="sr-only">Quote</h1>
        <EmptyState
          title="No quote yet"
          actions={
            may("quotes.write") && (
              <Button
                rank="primary"
                busy={actions.create.isPending}
                onClick={() =>
                  actions.create.mutate(undefined, { onError: (error) => notify(error.message, { severity: "warn" }) })
                }
              >
                Start the quote
              </Button>
            )
          }
        >
          Its scope is written from the systems as drawn; you change the words before anything is sent.
        </EmptyState>
      </main>
    );
  return <Editor key={quote.id} quote={quote} actions={actions} />;
}

const SAVE_AFTER_MS = 900;

function Editor({ quote, actions }: { quote: Quote; actions: ReturnType<typeof useQuoteActions> }) {
  const { company, project, numbers, mayEdit } = useWorkspace();
  const { data: clients } = useQuery(clientQueries.list(company.slug));
  const contacts = clients?.items.find(({ id }) => id === project.clientId)?.contacts ?? [];
  const [issuing, setIssuing] = useState(false);
  const { save, saved } = useDraftSaving(quote, actions.saveDraft);
  const price = numbers?.estimate?.price_minor ?? null;
  const sold = quote.revisions.some(({ state }) => state === "accepted");
  const pdf = apiUrl(endpoints.getDraftPdf, { company: company.slug, projectId: project.id, quoteId: quote.id });

  return (
    <main className="grid min-h-0 grow grid-cols-[minmax(320px,440px)_minmax(0,1fr)] gap-3 overflow-auto p-4 max-lg:grid-cols-1">
      <h1 className="sr-only">Quote {quote.number}</h1>
      <div className="grid content-start gap-3">
        <Panel live label="Quote">
          <PanelHead
            title={`Quote ${quote.number}`}
            fact={price === null ? "no price yet" : formatMoney(price, company.currency).text}
          >
            <span className="text-label text-ink-3" role="status">
              {saved}
            </span>
            {mayEdit && !sold && (
              <Button rank="primary" size="small" disabled={price === null} onClick={() => setIssuing(true)}>
                Issue…
              </Button>
            )}
          </PanelHead>
          <PanelBody>
            {sold && (
              <div className="mb-3">
                <SeverityText severity="good">Accepted. What was sold stays as it is.</SeverityText>
              </div>
            )}
            <DraftForm quote={quote} disabled={!mayEdit || sold} onChange={save} />
          </PanelBody>
        </Panel>
        <RevisionsPanel quote={quote} actions={actions} />
      </div>
      <Panel label="The page">
        <PanelHead title="The page" fact="as it would be sent now">
          <a className="text-dye-ink underline" href={pdf} target="_blank" rel="noreferrer">
            Open the PDF
          </a>
        </PanelHead>
        <div className="h-[calc(100%-3rem)] min-h-[60rem]">
          <QuotePages key={`${quote.version} ${price ?? ""}`} url={pdf} />
        </div>
      </Panel>
      {issuing && price !== null && (
        <IssueDialog
          quote={quote}
          contacts={contacts}
          price_minor={price}
          issue={actions.issue}
          onClose={() => setIssuing(false)}
        />
      )}
    </main>
  );
}

/** Saves the latest words a moment after the last key, one save at a time, each on the version before it. */
function useDraftSaving(quote: Quote, saveDraft: ReturnType<typeof useQuoteActions>["saveDraft"]) {
  const waiting = useRef<QuoteDraft | null>(null);
  const version = useRef(quote.version);
  const busy = useRef(false);
  const [saved, setSaved] = useState("");
  const timer = useRef<ReturnType<typeof setTimeout>>(undefined);
  useEffect(() => {
    version.current = Math.max(version.current, quote.version);
  }, [quote.version]);

  const flush = useCallback(async () => {
    if (busy.current) return;
    busy.current = true;
    // What is typed while one save is under way is saved by the next turn.
    for (let draft = waiting.current; draft; draft = waiting.current) {
      waiting.current = null;
      setSaved("Saving");
      try {
        const after = await saveDraft.mutateAsync({ quoteId: quote.id, version: version.current, draft });
        version.current = after.version;
        setSaved("Saved");
      } catch (error) {
        // What was typed stays in the form; the next key tries again.
        setSaved(error instanceof Error ? error.message : "Not saved");
      }
    }
    busy.current = false;
  }, [quote.id, saveDraft]);

  const save = useCallback(
    (draft: QuoteDraft) => {
      waiting.current = draft;
      setSaved("Typing");
      clearTimeout(timer.current);
      timer.current = setTimeout(() => void flush(), SAVE_AFTER_MS);
    },
    [flush],
  );
  return { save, saved };
}

/** The PDF's own pages, drawn here: what is seen is what is sent. */
function QuotePages({ url }: { url: string }) {
  const host = useRef<HTMLDivElement>(null);
  const [state, setState] = useState<"drawing" | "drawn" | "failed">("drawing");
  useEffect(() => {
    const stopped = new AbortController();
    void (async () => {
      try {
        const response = await fetch(url, { signal: stopped.signal });
        if (!response.ok) throw new Error("the page could not be made");
        const { drawPdf } = await import("./draw-pdf.ts");
        const pages = await drawPdf(await response.arrayBuffer(), 760);
        if (stopped.signal.aborted) return;
        host.current?.replaceChildren(...pages);
        setState("drawn");
      } catch {
        if (!stopped.signal.aborted) setState("failed");
      }
    })();
    return () => stopped.abort();
  }, [url]);
  return (
    <div className="h-full overflow-auto bg-ground p-4" aria-busy={state === "drawing"}>
      {state === "failed" && (
        <p className="text-ink-2">The page cannot be shown while a stop stands or there is no connection.</p>
      )}
      {state === "drawing" && <p className="text-ink-3">Drawing the page</p>}
      <div ref={host} className="mx-auto grid max-w-[760px] gap-4" />
    </div>
  );
}
