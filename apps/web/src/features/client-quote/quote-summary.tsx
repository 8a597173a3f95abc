import type { ClientQuote } from "@cleatwork/contracts";
import { dateInWords, money } from "./money.ts";

/** The sum and what to do about it, always in reach: a bar on a phone, a card beside the letter on a desk. */
export function QuoteSummary({ quote, pdfHref }: { quote: ClientQuote; pdfHref: string }) {
  const open = quote.state === "issued";
  return (
    <aside className="letter-summary letter-print-hidden" aria-label="Price and answer">
      <div>
        <span className="letter-sub">{open ? "Price" : stateWords[quote.state]}</span>
        <b className="letter-summary-sum">{money(quote.price_minor, quote.currency)}</b>
        <span className="letter-sub letter-wide-only">Valid through {dateInWords(quote.validUntilOn)}</span>
      </div>
      <a
        className="letter-button letter-button-quiet"
        href={`mailto:${quote.estimator.email}?subject=${encodeURIComponent(`Question on quote ${quote.quoteNumber}, ${quote.projectName}`)}`}
      >
        Ask
      </a>
      {open ? (
        <a className="letter-button" href="#accept">
          Accept
        </a>
      ) : (
        <a className="letter-button" href={pdfHref}>
          PDF
        </a>
      )}
    </aside>
  );
}

const stateWords = {
  issued: "Open",
  accepted: "Accepted",
  declined: "Declined",
  superseded: "Replaced",
  expired: "Expired",
  withdrawn: "Withdrawn",
} as const;
