/** The door of takeoffs. */
export { takeoffHandlers } from "./takeoffs.routes.ts";
