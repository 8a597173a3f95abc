/** The door of people. */
export { peopleHandlers } from "./people.routes.ts";
