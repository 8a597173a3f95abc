/** The door of standards. */
export { standardsHandlers } from "./standards.routes.ts";
export { standardsOn, standardsQuestion } from "./standards.repository.ts";
