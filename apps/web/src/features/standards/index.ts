export { standardsQueries } from "./standards.queries.ts";
export { StandardsScreen } from "./standards-screen.tsx";
