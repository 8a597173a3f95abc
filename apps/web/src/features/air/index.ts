/** The door of the air check. */
export { GradeLineDock } from "./grade-line-dock.tsx";
export { AirCheck } from "./air-check.tsx";
