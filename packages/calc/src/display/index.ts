export * from "./unit-system.ts";
export * from "./format.ts";
export * from "./format-size.ts";
export * from "./parse.ts";
