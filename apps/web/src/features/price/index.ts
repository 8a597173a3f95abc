/** The door of price. */
export { useSaveProjectPricing } from "./price.queries.ts";
export { PriceScreen } from "./price-screen.tsx";
