export { priceQueries } from "./prices.queries.ts";
export { PriceBookScreen } from "./price-book-screen.tsx";
export { RatesForm } from "./rates-form.tsx";
