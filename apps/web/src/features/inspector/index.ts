/** The door of the inspector. */
export { Inspector } from "./inspector.tsx";
export { accessoryNames, fittingNames } from "./words.ts";
