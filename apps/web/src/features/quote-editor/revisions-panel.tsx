import { formatMoney } from "@cleatwork/calc";
import { endpoints, type Quote, type RevisionItem } from "@cleatwork/contracts";
import { apiUrl } from "../../lib/http.ts";
import { Button } from "../../ui/button.tsx";
import { ConfirmByName } from "../../ui/confirm-dialog.tsx";
import { Panel, PanelHead } from "../../ui/panel.tsx";
import { SeverityText, type Severity } from "../../ui/severity.tsx";
import { useWorkspace } from "../workspace/index.ts";
import { useState } from "react";
import type { useQuoteActions } from "./quotes.queries.ts";

const stateMarks: Readonly<Record<RevisionItem["state"], { severity: Severity; label: string }>> = {
  issued: { severity: "note", label: "Open" },
  accepted: { severity: "good", label: "Accepted" },
  declined: { severity: "stop", label: "Declined" },
  superseded: { severity: "note", label: "Superseded" },
  expired: { severity: "warn", label: "Expired" },
  withdrawn: { severity: "warn", label: "Withdrawn" },
};
const mailMarks: Readonly<Record<RevisionItem["links"][number]["mailState"], { severity: Severity; label: string }>> = {
  queued: { severity: "note", label: "waiting to be sent" },
  sent: { severity: "good", label: "sent" },
  refused: { severity: "stop", label: "refused" },
  dead: { severity: "stop", label: "given up" },
};

const when = (instant: string) =>
  new Intl.DateTimeFormat("en-US", { dateStyle: "medium", timeStyle: "short" }).format(new Date(instant));

/** What was sent, to whom, what became of the mail, and what they answered. */
export function RevisionsPanel({ quote, actions }: { quote: Quote; actions: ReturnType<typeof useQuoteActions> }) {
  const { company, project, mayEdit } = useWorkspace();
  const [withdrawing, setWithdrawing] = useState<RevisionItem | null>(null);
  if (quote.revisions.length === 0) return null;
  return (
    <Panel label="Revisions">
      <PanelHead title="Revisions" fact={`${quote.revisions.length} issued`} />
      <ol>
        {quote.revisions.map((revision) => (
          <li key={revision.id} className="border-b border-line px-4 py-2 last:border-b-0">
            <div className="flex flex-wrap items-baseline gap-x-3">
              <b>Revision {revision.number}</b>
              <SeverityText severity={stateMarks[revision.state].severity}>
                {stateMarks[revision.state].label}
              </SeverityText>
              <span className="ml-auto font-semibold">{formatMoney(revision.price_minor, revision.currency).text}</span>
            </div>
            <p className="text-help text-ink-3">
              {when(revision.issuedAt)} by {revision.issuedBy}, valid through {revision.validUntilOn}, record{" "}
              {revision.snapshotHash.slice(0, 12).toUpperCase()}
            </p>
            {revision.response && (
              <p>
                {revision.response.kind === "accepted" ? "Accepted" : "Declined"} by {revision.response.name}
                {revision.response.title && `, ${revision.response.title}`}, {when(revision.response.at)}
                {revision.response.poNumber && `, PO ${revision.response.poNumber}`}
                {revision.response.reason && `: ${revision.response.reason}`}
              </p>
            )}
            <ul className="mt-1">
              {revision.links.map((link) => (
                <li key={link.id} className="flex flex-wrap items-baseline gap-x-2 text-help">
                  <span>
                    {link.recipientName}, {link.recipientEmail}
                  </span>
                  <SeverityText severity={mailMarks[link.mailState].severity}>
                    {mailMarks[link.mailState].label}
                  </SeverityText>
                  {link.mailError && <span className="text-ink-3">{link.mailError}</span>}
                  {link.openedAt && <span className="text-ink-2">opened {when(link.openedAt)}</span>}
                  {link.revokedAt ? (
                    <span className="text-ink-3">link ended</span>
                  ) : (
                    mayEdit && (
                      <button
                        type="button"
                        className="text-dye-ink underline"
                        onClick={() => actions.revokeLink.mutate({ quoteId: quote.id, linkId: link.id })}
                      >
                        end this link
                      </button>
                    )
                  )}
                </li>
              ))}
            </ul>
            <div className="mt-1 flex gap-2">
              <a
                className="text-dye-ink underline"
                href={apiUrl(endpoints.getRevisionPdf, {
                  company: company.slug,
                  projectId: project.id,
                  quoteId: quote.id,
                  revisionId: revision.id,
                })}
                target="_blank"
                rel="noreferrer"
              >
                PDF as sent
              </a>
              {mayEdit && revision.state === "issued" && (
                <Button size="small" rank="danger" onClick={() => setWithdrawing(revision)}>
                  Take back
                </Button>
              )}
            </div>
          </li>
        ))}
      </ol>
      {withdrawing && (
        <ConfirmByName
          open
          title={`Take back revision ${withdrawing.number}?`}
          name={quote.number}
          consequence="The client’s page will say that it was taken back. It cannot be accepted any more."
          action="Take it back"
          onConfirm={() => {
            actions.withdraw.mutate({ quoteId: quote.id, revisionId: withdrawing.id });
            setWithdrawing(null);
          }}
          onOpenChange={(open) => !open && setWithdrawing(null)}
        />
      )}
    </Panel>
  );
}
