/** The door of quotes. */
export { quoteHandlers } from "./quotes.routes.ts";
