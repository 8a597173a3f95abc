export { specQueries } from "./specs.queries.ts";
export { SpecsScreen } from "./specs-screen.tsx";
