import { formatMoney } from "@cleatwork/calc";
import type { Contact, Quote } from "@cleatwork/contracts";
import { useState } from "react";
import { isProblem } from "../../lib/problem.ts";
import { Button } from "../../ui/button.tsx";
import { CheckField, TextAreaField, TextField } from "../../ui/controls.tsx";
import { Dialog, DialogActions } from "../../ui/dialog.tsx";
import { SeverityText } from "../../ui/severity.tsx";
import { notify } from "../../ui/toast.tsx";
import { useWorkspace } from "../workspace/index.ts";
import type { useQuoteActions } from "./quotes.queries.ts";

/** Who gets it, with which words. Sent once, however often the button is pressed. */
export function IssueDialog({
  quote,
  contacts,
  price_minor,
  issue,
  onClose,
}: {
  quote: Quote;
  contacts: readonly Contact[];
  price_minor: number;
  issue: ReturnType<typeof useQuoteActions>["issue"];
  onClose: () => void;
}) {
  const { state, company, project } = useWorkspace();
  const reachable = contacts.filter(({ email }) => email !== "");
  const [chosen, setChosen] = useState<ReadonlySet<string>>(
    new Set(reachable.filter(({ id }) => id === project.contactId || reachable.length === 1).map(({ id }) => id)),
  );
  const [name, setName] = useState("");
  const [email, setEmail] = useState("");
  const [message, setMessage] = useState("");
  const [tried, setTried] = useState(false);
  const [key] = useState(() => crypto.randomUUID());
  const extra = name.trim() !== "" || email.trim() !== "";
  const wrongEmail = extra && !/^\S+@\S+\.\S+$/.test(email.trim());
  const recipients = [
    ...reachable.filter(({ id }) => chosen.has(id)).map((contact) => ({ name: contact.name, email: contact.email })),
    ...(extra && !wrongEmail ? [{ name: name.trim() || email.trim(), email: email.trim() }] : []),
  ];
  const unsaved = state.save.kind !== "saved";
  const next = (quote.revisions[0]?.number ?? 0) + 1;

  const send = () => {
    setTried(true);
    if (recipients.length === 0 || wrongEmail || unsaved) return;
    issue.mutate(
      {
        quoteId: quote.id,
        version: quote.version,
        key,
        request: { recipients, message, layoutSequence: state.sequence, price_minor },
      },
      {
        onSuccess: () => {
          notify(`Revision ${next} is on its way to ${recipients.map((each) => each.name).join(", ")}.`);
          onClose();
        },
      },
    );
  };

  return (
    <Dialog
      open
      title={`Issue ${quote.number}, revision ${next}`}
      description={`${formatMoney(price_minor, company.currency).text}. What is issued is frozen: later changes make a new revision.`}
      onOpenChange={(open) => !open && onClose()}
    >
      <form
        className="grid gap-3"
        onSubmit={(event) => {
          event.preventDefault();
          send();
        }}
      >
        {reachable.length > 0 && (
          <fieldset>
            <legend className="label-width text-help font-medium text-ink-2">To</legend>
            {reachable.map((contact) => (
              <CheckField
                key={contact.id}
                label={`${contact.name}, ${contact.email}`}
                checked={chosen.has(contact.id)}
                onChange={(event) => {
                  const after = new Set(chosen);
                  if (event.target.checked) after.add(contact.id);
                  else after.delete(contact.id);
                  setChosen(after);
                }}
              />
            ))}
          </fieldset>
        )}
        <div className="grid grid-cols-2 gap-3">
          <TextField
            label="Someone else"
            value={name}
            maxLength={120}
            onChange={(event) => setName(event.target.value)}
          />
          <TextField
            label="E-mail"
            type="email"
            value={email}
            error={tried && wrongEmail ? `“${email}”: an address such as name@company.example.` : undefined}
            onChange={(event) => setEmail(event.target.value)}
          />
        </div>
        <TextAreaField
          label="Words in the mail"
          rows={3}
          value={message}
          maxLength={5000}
          onChange={(event) => setMessage(event.target.value)}
        />
        {tried && recipients.length === 0 && (
          <SeverityText severity="stop">Choose at least one recipient.</SeverityText>
        )}
        {unsaved && <SeverityText severity="warn">Some edits are still being saved; wait a moment.</SeverityText>}
        {issue.isError && (
          <div role="alert">
            <SeverityText severity="stop">{issue.error.message}</SeverityText>
            {isProblem(issue.error, "wrong-state", "stale") && (
              <p className="text-help text-ink-2">Load the page again to see the present state.</p>
            )}
          </div>
        )}
        <DialogActions>
          <Button onClick={onClose}>Not yet</Button>
          <Button rank="primary" type="submit" busy={issue.isPending}>
            Issue and send
          </Button>
        </DialogActions>
      </form>
    </Dialog>
  );
}
