import type { CompanySlug, LayoutRecord, ProjectId, RecordId } from "@cleatwork/contracts";
import { endpoints } from "@cleatwork/contracts";
import { indexOf, systemsInOrder, treeOf, type PricingDocuments, type TreeRow } from "@cleatwork/layout";
import { useSuspenseQueries } from "@tanstack/react-query";
import { useEffect, useMemo, useState, useSyncExternalStore, type ReactNode } from "react";
import { api } from "../../lib/http.ts";
import { notify } from "../../ui/toast.tsx";
import { projectQueries } from "../projects/index.ts";
import { useSession } from "../session/index.ts";
import { LayoutStore } from "./core/layout-store.ts";
import { browserShelf } from "./core/saved-edits.ts";
import { TrialDesk, type TrialWorker } from "./core/trial-desk.ts";
import { sendBatch } from "./send-batch.ts";
import { dayIn } from "./today.ts";
import { useNumbers } from "./use-numbers.ts";
import { useSelection } from "./use-selection.ts";
import { WorkspaceContext, type Workspace } from "./workspace-context.ts";
import { workspaceQueries } from "./workspace.queries.ts";

/** Opens a project: its documents in parallel, its layout in a store, its numbers in a worker. */
export function WorkspaceProvider({
  company,
  projectId,
  children,
}: {
  company: CompanySlug;
  projectId: ProjectId;
  children: ReactNode;
}) {
  const session = useSession();
  const { timeZone, frictionBasis } = session.company;
  const pricedOn = dayIn(timeZone, new Date());
  const [project, layoutRead, specs, book, settings, pricing, standards, drawings] = useSuspenseQueries({
    queries: [
      projectQueries.detail(company, projectId),
      workspaceQueries.layout(company, projectId),
      workspaceQueries.specs(company),
      workspaceQueries.priceBook(company),
      workspaceQueries.settings(company),
      workspaceQueries.pricing(company, projectId),
      workspaceQueries.standards(company, pricedOn),
      workspaceQueries.drawings(company, projectId),
    ],
  });

  const [store] = useState(
    () =>
      new LayoutStore(
        {
          project: `${company}/${projectId}`,
          shelf: browserShelf,
          load: () => api(endpoints.getLayout, { params: { company, projectId } }),
          send: (request) => sendBatch({ company, projectId }, request),
          newBatchId: () => crypto.randomUUID(),
          now: () => new Date(),
          later: (work, after_ms) => {
            const timer = setTimeout(work, after_ms);
            return () => clearTimeout(timer);
          },
        },
        layoutRead.data,
      ),
  );
  const state = useSyncExternalStore(store.subscribe, store.getState);
  useLifeOf(store);

  const { layout } = state;
  const index = useMemo(() => indexOf(layout), [layout]);
  const units = project.data.unitSystem;
  const documents = useMemo<PricingDocuments>(
    () => ({
      records: [...layout.records.values()],
      specs: specs.data.items,
      altitude_m: project.data.altitude_m,
      frictionBasis,
      drawings: drawings.data.items,
      currency: book.data.currency,
      items: book.data.items,
      settings: settings.data,
      standards: standards.data.document,
      pricing: pricing.data,
      pricedOn,
    }),
    [
      layout,
      frictionBasis,
      specs.data,
      project.data.altitude_m,
      drawings.data,
      book.data,
      settings.data,
      standards.data,
      pricing.data,
      pricedOn,
    ],
  );
  const numbers = useNumbers(documents);
  const [trials] = useState(() => new TrialDesk(hireTrialWorker));
  useEffect(() => () => trials.close(), [trials]);
  const selection = useSelection();

  const systems = useMemo(() => systemsInOrder(layout), [layout]);
  const trees = useMemo(() => new Map(systems.map(({ id }) => [id as string, treeOf(index, id)])), [systems, index]);
  const rowNumbers = useMemo(
    () =>
      new Map(
        [...trees.values()].flatMap((rows) =>
          rows.map(({ segment, number }) => [segment.id as string, String(number)]),
        ),
      ),
    [trees],
  );
  const solved = useMemo(
    () =>
      new Map(
        (numbers?.solutions ?? []).flatMap(({ segments }) => segments.map((segment) => [segment.segmentId, segment])),
      ),
    [numbers],
  );

  const workspace = useMemo<Workspace>(() => {
    const say = (answer: ReturnType<LayoutStore["apply"]>) => {
      if (!answer.ok) notify(answer.message, { severity: "warn" });
      return answer;
    };
    return {
      project: project.data,
      company: session.company,
      units,
      store,
      state,
      layout,
      index,
      systems,
      rowsOf: (systemId) => trees.get(systemId) ?? NO_ROWS,
      numberOf: (segmentId) => rowNumbers.get(segmentId) ?? "",
      documents,
      trials,
      numbers,
      solutionOf: (systemId) => numbers?.solutions.find((solution) => solution.systemId === systemId) ?? null,
      solvedOf: (segmentId) => solved.get(segmentId) ?? null,
      standards: standards.data.document,
      selection,
      mayEdit: session.may("layouts.write"),
      run: (command) => say(store.run(command)),
      undo: () => void say(store.undo()),
      redo: () => void say(store.redo()),
      record: (id): LayoutRecord | null => layout.records.get(id as RecordId) ?? null,
    };
  }, [
    project.data,
    session,
    units,
    store,
    state,
    layout,
    index,
    systems,
    trees,
    rowNumbers,
    documents,
    trials,
    numbers,
    solved,
    standards.data,
    selection,
  ]);

  return <WorkspaceContext value={workspace}>{children}</WorkspaceContext>;
}

const hireTrialWorker = (): TrialWorker =>
  new Worker(new URL("./trial.worker.ts", import.meta.url), { type: "module" });

const NO_ROWS: readonly TreeRow[] = [];

/** Takes up unsent edits, sends before the page goes, and tries again when the network is back. */
function useLifeOf(store: LayoutStore) {
  useEffect(() => {
    void store.resume();
    const flush = () => void store.flush();
    const hidden = () => {
      if (document.visibilityState === "hidden") flush();
    };
    window.addEventListener("online", flush);
    document.addEventListener("visibilitychange", hidden);
    return () => {
      window.removeEventListener("online", flush);
      document.removeEventListener("visibilitychange", hidden);
      flush();
    };
  }, [store]);
}
