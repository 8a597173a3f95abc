import { companyStandardsSchema, endpoints, type Standards } from "@cleatwork/contracts";
import { useMutation, useQueryClient, useSuspenseQuery } from "@tanstack/react-query";
import { useCallback, useReducer, useState } from "react";
import { calendarDateText, todayIn } from "../../lib/format/dates.ts";
import { api } from "../../lib/http.ts";
import { isProblem } from "../../lib/problem.ts";
import { useNow } from "../../lib/use-now.ts";
import { useActions } from "../../ui/actions/registry.ts";
import { Button } from "../../ui/button.tsx";
import { TextField } from "../../ui/controls.tsx";
import { useUnsavedGuard } from "../../ui/form/use-unsaved-guard.tsx";
import { Notice } from "../../ui/notice.tsx";
import { notify } from "../../ui/toast.tsx";
import { Toggle } from "../../ui/toggle.tsx";
import { useSession } from "../session/index.ts";
import { CoefficientsPanel } from "./coefficients-panel.tsx";
import { readNumber } from "./cells.ts";
import { GaugePanel } from "./gauge-panel.tsx";
import { HistoryPanel } from "./history-panel.tsx";
import { HoursPanel } from "./hours-panel.tsx";
import { draftAfter, draftOf, isChanged } from "./standards-draft.ts";
import { standardsQueries } from "./standards.queries.ts";

type Part = "gauges" | "hours" | "coefficients" | "history";

/** The owner's schedules: edited here, saved as a version that counts from its day. */
export function StandardsScreen() {
  const { slug, may } = useSession();
  const { data } = useSuspenseQuery(standardsQueries.latest(slug));
  // Another version from elsewhere starts the editor anew only when nothing was typed: the screen asks.
  return <Editor key={slug} stored={data} mayWrite={may("standards.write")} />;
}

function Editor({ stored, mayWrite }: { stored: Standards; mayWrite: boolean }) {
  const { slug, company } = useSession();
  const today = todayIn(company.timeZone, useNow());
  const cache = useQueryClient();
  const [draft, act] = useReducer(draftAfter, stored.document, draftOf);
  const [version, setVersion] = useState(stored.version);
  const [part, setPart] = useState<Part>("gauges");
  const [effectiveOn, setEffectiveOn] = useState(today);
  const [note, setNote] = useState("");
  const [unclear, setUnclear] = useState<ReadonlySet<string>>(new Set());
  // A put-back takes what stood in the cells with it.
  const [round, setRound] = useState(0);
  const onUnclear = useCallback((name: string, is: boolean) => {
    setUnclear((known) => {
      if (known.has(name) === is) return known;
      const next = new Set(known);
      if (is) next.add(name);
      else next.delete(name);
      return next;
    });
  }, []);
  const putBack = (kind: "undo" | "redo" | "discard") => {
    act({ kind });
    setUnclear(new Set());
    setRound(round + 1);
  };
  const changed = isChanged(draft);
  const guard = useUnsavedGuard(changed);
  const check = companyStandardsSchema.safeParse(draft.now);
  const wrong = unclear.size + (check.error?.issues.length ?? 0);

  const save = useMutation({
    mutationFn: (on: number) =>
      api(endpoints.updateStandards, {
        params: { company: slug },
        version: on,
        body: { effectiveOn, note, document: draft.now },
      }),
    onSuccess: async (saved) => {
      setVersion(saved.version);
      act({ kind: "saved", document: saved.document });
      setNote("");
      notify(`Saved. In force from ${calendarDateText(effectiveOn)}; issued quotes keep their numbers.`, {
        severity: "good",
      });
      cache.setQueryData(standardsQueries.latest(slug).queryKey, saved);
      await cache.invalidateQueries({ queryKey: [slug, "standards"] });
    },
  });
  useActions(
    mayWrite
      ? [
          { id: "undo", label: "Undo", group: "Schedules", keys: "mod z", run: () => putBack("undo") },
          { id: "redo", label: "Redo", group: "Schedules", keys: "mod shift z", run: () => putBack("redo") },
        ]
      : [],
  );
  const panel = {
    document: draft.now,
    onChange: (document: typeof draft.now) => act({ kind: "set", document }),
    onUnclear,
    mayWrite,
  };

  return (
    <main className="flex min-h-0 flex-1 flex-col gap-3 overflow-auto p-4" tabIndex={mayWrite ? undefined : 0}>
      {guard}
      <div className="flex flex-wrap items-center gap-3">
        <Toggle
          label="What is shown"
          value={part}
          onChange={setPart}
          choices={[
            { value: "gauges", label: "Gauges" },
            { value: "hours", label: "Hours and conditions" },
            { value: "coefficients", label: "Loss coefficients" },
            { value: "history", label: "What changed" },
          ]}
        />
        <span className="text-help text-ink-3">
          {stored.effectiveOn === null
            ? "Nothing of your own yet: the shipped schedules count."
            : `Version ${version}, in force from ${calendarDateText(stored.effectiveOn)}.`}
          {!mayWrite && " An owner of the company can change these."}
        </span>
      </div>
      {save.isError && (
        <Notice
          severity="stop"
          title={isProblem(save.error, "stale") ? "Someone saved before you" : "Not saved"}
          actions={
            isProblem(save.error, "stale") && (
              <Button
                size="small"
                onClick={() => {
                  void cache.fetchQuery({ ...standardsQueries.latest(slug), staleTime: 0 }).then((now) => {
                    setVersion(now.version);
                    save.reset();
                  });
                }}
              >
                Keep mine, build on theirs
              </Button>
            )
          }
        >
          {save.error.message} What you typed is still here.
        </Notice>
      )}
      <div key={round} className="grid gap-3">
        {part === "gauges" && <GaugePanel {...panel} />}
        {part === "hours" && <HoursPanel {...panel} />}
        {part === "coefficients" && <CoefficientsPanel {...panel} />}
        {part === "history" && <HistoryPanel />}
      </div>
      {mayWrite && part !== "history" && (
        <div className="sticky -bottom-4 mt-auto flex flex-wrap items-end gap-3 border-t border-line bg-ground py-3">
          <TextField
            label="In force from"
            type="date"
            value={effectiveOn}
            onChange={(event) => setEffectiveOn(event.target.value)}
          />
          <TextField
            label="Why"
            value={note}
            maxLength={200}
            className="w-80"
            onChange={(event) => setNote(event.target.value)}
          />
          <TextField
            label="Point a job out when its ratios are off by"
            unit="%"
            className="w-56"
            defaultValue={String(Math.round(draft.now.ratioTolerance * 100))}
            onBlur={(event) => {
              const read = readNumber(event.target.value, "5 to 500", { min: 5, max: 500 });
              if (read.ok && read.value / 100 !== draft.now.ratioTolerance)
                panel.onChange({ ...draft.now, ratioTolerance: read.value / 100 });
            }}
          />
          <Button disabled={draft.before.length === 0} onClick={() => putBack("undo")}>
            Undo
          </Button>
          <Button disabled={!changed && unclear.size === 0} onClick={() => putBack("discard")}>
            Discard
          </Button>
          <Button
            rank="primary"
            busy={save.isPending}
            disabled={!changed || wrong > 0 || effectiveOn === ""}
            onClick={() => save.mutate(version)}
          >
            Save
          </Button>
          <span role="status" className="text-help text-ink-2">
            {wrong > 0
              ? `${wrong} ${wrong === 1 ? "cell" : "cells"} to mend before it can be saved.`
              : changed
                ? "Changed, not saved."
                : ""}
          </span>
        </div>
      )}
    </main>
  );
}
