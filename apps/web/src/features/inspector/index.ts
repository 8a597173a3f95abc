/** The door of the inspector. */
export { Inspector } from "./inspector.tsx";
export { fittingNames } from "./words.ts";
