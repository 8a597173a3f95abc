export * from "./layout.ts";
export * from "./layout-index.ts";
export * from "./change-set.ts";
export * from "./check-layout.ts";
export * from "./air-systems.ts";
