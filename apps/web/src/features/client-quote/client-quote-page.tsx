import { useEffect, useState } from "react";
import type { ClientQuote } from "@cleatwork/contracts";
import { acceptQuote, declineQuote, readQuote, type Answer } from "./client-quote.api.ts";
import { AcceptSection } from "./accept-section.tsx";
import { brandStyle } from "./brand.ts";
import { LinkProblem } from "./link-problem.tsx";
import { QuoteLetter } from "./quote-letter.tsx";
import { QuoteSummary } from "./quote-summary.tsx";
import "./client-quote.css";

/**
 * The client's page: a letter, not a dashboard. No account, phone first, printable. It loads no table, form or schema
 * library, so that it opens fast on a phone with a poor signal.
 */
export function ClientQuotePage({ token }: { token: string }) {
  const [answer, setAnswer] = useState<Answer<ClientQuote> | null>(null);

  useEffect(() => {
    const stopped = new AbortController();
    void readQuote(token, stopped.signal).then((read) => {
      if (!stopped.signal.aborted) setAnswer(read);
    });
    return () => stopped.abort();
  }, [token]);

  if (answer === null) return <LetterSkeleton />;
  if (!answer.ok) return <LinkProblem problem={answer.problem} />;
  const quote = answer.value;

  const respond = async (request: Promise<Answer<ClientQuote>>) => {
    const responded = await request;
    if (responded.ok) setAnswer(responded);
    return responded;
  };

  return (
    <div className="letter-page" data-theme="light" style={brandStyle(quote.company.brandColor)}>
      <title>{`Quote ${quote.quoteNumber} from ${quote.company.name}`}</title>
      <div className="letter-columns">
        <main className="letter">
          <QuoteLetter quote={quote} pdfHref={pdfHref(token)} />
          <AcceptSection
            quote={quote}
            onAccept={(form) => respond(acceptQuote(token, { ...form, snapshotHash: quote.snapshotHash }))}
            onDecline={(form) => respond(declineQuote(token, form))}
          />
          <footer className="letter-fine">
            <a className="letter-link" href={pdfHref(token)}>
              Download the PDF
            </a>
            <p>
              This private page is for {quote.recipientName}. Record {shortHash(quote.snapshotHash)}. Sizing and
              construction results are an aid to licensed judgment; the adopted code, the project specification and the
              authority having jurisdiction govern.
            </p>
          </footer>
        </main>
        <QuoteSummary quote={quote} pdfHref={pdfHref(token)} />
      </div>
    </div>
  );
}

const pdfHref = (token: string) => `/api/open/quotes/${encodeURIComponent(token)}/pdf`;

/** Enough of the hash to compare by eye with the PDF. */
const shortHash = (hash: string) => (hash.slice(0, 12).toUpperCase().match(/.{4}/g) ?? []).join(" ");

function LetterSkeleton() {
  return (
    <div className="letter-page" data-theme="light" aria-busy="true">
      <div className="letter-columns">
        <main className="letter">
          <h1 className="sr-only">Your quote is loading</h1>
          {["w-1/2", "w-3/4", "w-1/3", "w-full", "w-full", "w-2/3"].map((width, index) => (
            <div key={index} className={`letter-bone ${width}`} />
          ))}
        </main>
      </div>
    </div>
  );
}
