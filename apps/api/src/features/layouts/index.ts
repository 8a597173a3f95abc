/** The door of layouts. */
export { layoutHandlers } from "./layouts.routes.ts";
export { layoutQuestion } from "./layouts.repository.ts";
export { startLayout } from "./layouts.service.ts";
