/** The door of companies. */
export { companyQuestion } from "./companies.repository.ts";
export { companyHandlers } from "./companies.routes.ts";
