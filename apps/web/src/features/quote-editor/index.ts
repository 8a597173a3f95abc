/** The door of the quote editor. */
export { QuoteScreen } from "./quote-screen.tsx";
export { quoteQueries } from "./quotes.queries.ts";
