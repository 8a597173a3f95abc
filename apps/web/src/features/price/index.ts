/** The door of price. */
export { PriceScreen } from "./price-screen.tsx";
