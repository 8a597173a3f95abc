/** The door of the board. */
export { BoardView } from "./board-view.tsx";
export { HEATS, type Heat } from "./heat.ts";
