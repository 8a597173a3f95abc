export { FieldHome } from "./field-home.tsx";
export { FieldTakeoffPage } from "./field-takeoff.tsx";
export { fieldQueries } from "./field.queries.ts";
