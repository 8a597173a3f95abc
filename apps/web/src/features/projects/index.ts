export { projectQueries } from "./projects.queries.ts";
