import { useId, useRef, useState, type FormEvent, type ReactNode } from "react";
import type { ClientQuote, ProblemDetail } from "@cleatwork/contracts";
import type { AcceptForm, Answer, DeclineForm } from "./client-quote.api.ts";
import { money } from "./money.ts";

interface AcceptSectionProps {
  readonly quote: ClientQuote;
  readonly onAccept: (form: AcceptForm) => Promise<Answer<ClientQuote>>;
  readonly onDecline: (form: DeclineForm) => Promise<Answer<ClientQuote>>;
}

/** Accept or decline; asked once more, with the sum named, before anything is signed. */
export function AcceptSection({ quote, onAccept, onDecline }: AcceptSectionProps) {
  const [way, setWay] = useState<"accept" | "decline">("accept");
  if (quote.state !== "issued") return null;
  return (
    <section className="letter-accept letter-print-hidden" id="accept">
      {way === "accept" ? (
        <AcceptFields quote={quote} onAccept={onAccept} onRather={() => setWay("decline")} />
      ) : (
        <DeclineFields onDecline={onDecline} onRather={() => setWay("accept")} />
      )}
    </section>
  );
}

function AcceptFields({
  quote,
  onAccept,
  onRather,
}: Pick<AcceptSectionProps, "quote" | "onAccept"> & { onRather: () => void }) {
  const confirm = useRef<HTMLDialogElement>(null);
  const [form, setForm] = useState<AcceptForm | null>(null);
  const { problem, busy, send } = useSending(onAccept);
  const sum = money(quote.price_minor, quote.currency);

  const ask = (event: FormEvent<HTMLFormElement>) => {
    event.preventDefault();
    const data = new FormData(event.currentTarget);
    setForm({
      name: text(data, "name"),
      title: text(data, "title"),
      poNumber: text(data, "poNumber"),
      consent: data.has("consent"),
    });
    confirm.current?.showModal();
  };

  return (
    <form onSubmit={ask}>
      <h2>Accept this quote</h2>
      <p className="letter-sum">
        <span>You would accept</span> <b>{sum}</b>
      </p>
      <div className="letter-fields">
        <Field label="Your name" name="name" required maxLength={120} autoComplete="name" problem={problem} />
        <Field label="Title" name="title" maxLength={200} autoComplete="organization-title" problem={problem} />
        <Field label="Purchase order number, if you have one" name="poNumber" maxLength={60} problem={problem} />
      </div>
      <label className="letter-consent">
        <input type="checkbox" name="consent" required />
        <span>{quote.consent}</span>
      </label>
      <ProblemText problem={problem} />
      <div className="letter-actions">
        <button type="submit" className="letter-button" disabled={busy}>
          {busy ? "Sending…" : `Accept ${sum}`}
        </button>
        <button type="button" className="letter-link" onClick={onRather}>
          Decline, with a word on why
        </button>
      </div>
      <dialog ref={confirm} className="letter-dialog" aria-labelledby="confirm-accept">
        <h2 id="confirm-accept">Accept {sum}?</h2>
        <p>
          {form?.name} signs for {quote.clientName}. {quote.company.name} is told at once, and you get a copy.
        </p>
        <div className="letter-actions">
          <button
            type="button"
            className="letter-button"
            onClick={() => {
              confirm.current?.close();
              if (form) void send(form);
            }}
          >
            Yes, accept
          </button>
          <button type="button" className="letter-button letter-button-quiet" onClick={() => confirm.current?.close()}>
            Not yet
          </button>
        </div>
      </dialog>
    </form>
  );
}

function DeclineFields({ onDecline, onRather }: Pick<AcceptSectionProps, "onDecline"> & { onRather: () => void }) {
  const { problem, busy, send } = useSending(onDecline);
  const decline = (event: FormEvent<HTMLFormElement>) => {
    event.preventDefault();
    const data = new FormData(event.currentTarget);
    void send({ name: text(data, "name"), reason: text(data, "reason") });
  };
  return (
    <form onSubmit={decline}>
      <h2>Decline this quote</h2>
      <div className="letter-fields">
        <Field label="Your name" name="name" required maxLength={120} autoComplete="name" problem={problem} />
        <Field label="Why, in a few words" name="reason" required maxLength={2000} problem={problem} />
      </div>
      <ProblemText problem={problem} />
      <div className="letter-actions">
        <button type="submit" className="letter-button" disabled={busy}>
          {busy ? "Sending…" : "Decline"}
        </button>
        <button type="button" className="letter-link" onClick={onRather}>
          Back to accepting
        </button>
      </div>
    </form>
  );
}

function useSending<Form>(onSend: (form: Form) => Promise<Answer<ClientQuote>>) {
  const [problem, setProblem] = useState<ProblemDetail | null>(null);
  const [busy, setBusy] = useState(false);
  const send = async (form: Form) => {
    setBusy(true);
    const answer = await onSend(form);
    setBusy(false);
    setProblem(answer.ok ? null : answer.problem);
  };
  return { problem, busy, send };
}

function Field({
  label,
  name,
  problem,
  ...input
}: {
  label: string;
  name: string;
  problem: ProblemDetail | null;
  required?: boolean;
  maxLength: number;
  autoComplete?: string;
}): ReactNode {
  const id = useId();
  const error = problem?.errors?.find((each) => each.pointer === `/${name}`);
  return (
    <div className="letter-field">
      <label htmlFor={id}>{label}</label>
      <input
        id={id}
        name={name}
        {...input}
        aria-invalid={error !== undefined}
        aria-describedby={error && `${id}-error`}
      />
      {error && (
        <span id={`${id}-error`} className="letter-error">
          {error.message}
        </span>
      )}
    </div>
  );
}

const ProblemText = ({ problem }: { problem: ProblemDetail | null }) =>
  problem && (
    <p className="letter-error" role="alert">
      {problem.title}. {problem.detail}
    </p>
  );

function text(data: FormData, name: string): string {
  const value = data.get(name);
  return typeof value === "string" ? value.trim() : "";
}
