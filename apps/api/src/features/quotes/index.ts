/** The door of quotes. */
export { issuedRatios, issuedTakeoff } from "./issued-takeoffs.repository.ts";
export { quoteHandlers } from "./quotes.routes.ts";
