import { ClientQuotePage } from "../features/client-quote/index.ts";

/** Opened from a mail, outside the router: the token is all there is. */
export function ClientQuote() {
  const token = decodeURIComponent(window.location.pathname.split("/")[2] ?? "");
  return <ClientQuotePage token={token} />;
}
