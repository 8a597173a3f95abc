import { useSuspenseQuery } from "@tanstack/react-query";
import { calendarDateText, momentText } from "../../lib/format/dates.ts";
import { EmptyState } from "../../ui/empty-state.tsx";
import { Panel, PanelBody, PanelHead } from "../../ui/panel.tsx";
import { useSession } from "../session/index.ts";
import { standardsQueries } from "./standards.queries.ts";

/** Who changed which value, when, and from what day it counts. Nothing here can be changed. */
export function HistoryPanel() {
  const { slug, company } = useSession();
  const { data } = useSuspenseQuery(standardsQueries.history(slug));
  return (
    <Panel live label="What changed">
      <PanelHead title="What changed" fact={`${data.items.length} versions`} />
      {data.items.length === 0 && (
        <EmptyState title="Nothing of your own yet">The shipped schedules count until an owner writes some.</EmptyState>
      )}
      {data.items.map((version) => (
        <PanelBody key={version.version} className="border-b border-line-soft">
          <h3 className="font-[640]">
            Version {version.version}, in force from {calendarDateText(version.effectiveOn)}
          </h3>
          <p className="text-ink-2">
            {version.by.name}, {momentText(version.at, company.timeZone)}
            {version.note && `: ${version.note}`}
          </p>
          <ul className="mt-2 grid gap-0.5">
            {version.changes.slice(0, SHOWN).map((change, index) => (
              <li key={index}>
                {change.subject}: {change.field} <span className="text-ink-3">{change.before ?? "nothing"}</span> →{" "}
                <b>{change.after ?? "nothing"}</b>
              </li>
            ))}
          </ul>
          {version.changes.length + version.moreChanges > SHOWN && (
            <p className="text-help text-ink-3">
              and {version.changes.length + version.moreChanges - SHOWN} more values
            </p>
          )}
        </PanelBody>
      ))}
    </Panel>
  );
}

const SHOWN = 12;
