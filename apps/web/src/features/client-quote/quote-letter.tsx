import type { ClientQuote } from "@cleatwork/contracts";
import { dateInWords, money } from "./money.ts";

/** What is offered, in the order a client asks: how much, for what, what is in, what is not. */
export function QuoteLetter({ quote, pdfHref }: { quote: ClientQuote; pdfHref: string }) {
  return (
    <>
      <header className="letter-head">
        <div>
          <b className="letter-company">{quote.company.name}</b>
          <span className="letter-number">
            Quote {quote.quoteNumber}, revision {quote.revision}, {dateInWords(quote.issuedAt)}
          </span>
        </div>
        <a className="letter-button letter-button-quiet letter-print-hidden" href={pdfHref}>
          PDF
        </a>
      </header>
      <StateNotice quote={quote} />
      <div className="letter-offer">
        <div>
          <p className="letter-sub">{quote.projectName}</p>
          <h1 className="letter-title">{quote.title}</h1>
        </div>
        <p className="letter-amount">{money(quote.price_minor, quote.currency)}</p>
      </div>
      <p className="letter-sub letter-ruled">Valid through {dateInWords(quote.validUntilOn)}.</p>
      <Paragraphs text={quote.greeting} />
      <p className="letter-from">
        <b>{quote.estimator.name}</b>, estimator
        <br />
        <a className="letter-link" href={`mailto:${quote.estimator.email}`}>
          {quote.estimator.email}
        </a>
      </p>
      <Parts quote={quote} />
      {quote.scope !== "" && (
        <section>
          <h2>Scope</h2>
          <Paragraphs text={quote.scope} />
        </section>
      )}
      <div className="letter-two">
        <Lines title="Included" lines={quote.inclusions} mark="in" />
        <Lines title="Not included" lines={quote.exclusions} mark="out" />
      </div>
      <Lines title="Clarifications" lines={quote.clarifications} mark="none" />
      <Lines title="Addenda acknowledged" lines={quote.addenda} mark="none" />
      {quote.terms !== "" && (
        <section>
          <h2>Terms</h2>
          <Paragraphs text={quote.terms} />
        </section>
      )}
    </>
  );
}

function StateNotice({ quote }: { quote: ClientQuote }) {
  const text = {
    issued: null,
    accepted: quote.response && `Accepted by ${quote.response.name} on ${dateInWords(quote.response.at)}.`,
    declined: quote.response && `Declined by ${quote.response.name} on ${dateInWords(quote.response.at)}.`,
    superseded: "A newer revision of this quote has been sent. Please use the link in the newer e-mail.",
    expired: `This quote was valid through ${dateInWords(quote.validUntilOn)}. Ask ${quote.estimator.name} for a new one.`,
    withdrawn: `${quote.company.name} has taken this quote back. Ask ${quote.estimator.name} about it.`,
  }[quote.state];
  return text ? (
    <p className="letter-notice" role="status">
      {text}
    </p>
  ) : null;
}

function Parts({ quote }: { quote: ClientQuote }) {
  if (quote.parts.length === 0) return null;
  return (
    <section>
      <h2 id="price-by-part">The price, by part</h2>
      <table className="letter-parts" aria-labelledby="price-by-part">
        <tbody>
          {quote.parts.map((part) => (
            <tr key={part.name}>
              <th scope="row">{part.name}</th>
              <td>{money(part.price_minor, quote.currency, "plain")}</td>
            </tr>
          ))}
          <tr className="letter-total">
            <th scope="row">Price</th>
            <td>{money(quote.price_minor, quote.currency)}</td>
          </tr>
        </tbody>
      </table>
    </section>
  );
}

function Lines({ title, lines, mark }: { title: string; lines: readonly string[]; mark: "in" | "out" | "none" }) {
  if (lines.length === 0) return null;
  return (
    <section>
      <h2>{title}</h2>
      <ul className="letter-lines" data-mark={mark}>
        {lines.map((line) => (
          <li key={line}>{line}</li>
        ))}
      </ul>
    </section>
  );
}

function Paragraphs({ text }: { text: string }) {
  return (
    <div className="letter-text">
      {text
        .split(/\n{2,}/)
        .filter((paragraph) => paragraph.trim() !== "")
        .map((paragraph) => (
          <p key={paragraph}>{paragraph}</p>
        ))}
    </div>
  );
}
