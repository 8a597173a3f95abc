/** The door of systems and levels. */
export { SystemDialog } from "./system-dialog.tsx";
export { LevelDialog } from "./level-dialog.tsx";
export { SystemChoice } from "./system-choice.tsx";
export { useChosenSystem } from "./use-chosen-system.ts";
