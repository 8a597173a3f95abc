/** The door of the takeoff. */
export { TakeoffScreen } from "./takeoff-screen.tsx";
