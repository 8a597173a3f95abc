/** Who may know whom. The package manifests are the first wall, this is the second. */
const never = (name, from, to, comment) => ({ name, severity: "error", comment, from, to });

module.exports = {
  forbidden: [
    never(
      "calc-is-an-island",
      { path: "^packages/calc/src", pathNot: "\\.(test|check|bench)\\.ts$|/cli\\.ts$" },
      { pathNot: "^packages/calc/src" },
      "Calculations read arguments and return values.",
    ),
    never(
      "contracts-know-zod-and-calc-types",
      { path: "^packages/contracts/src", pathNot: "\\.test\\.ts$" },
      { pathNot: "^packages/(contracts|calc)/src|node_modules/.*zod" },
      "Contracts travel to both sides.",
    ),
    never(
      "layout-knows-contracts-and-calc",
      { path: "^packages/layout/src", pathNot: "\\.test\\.ts$" },
      { pathNot: "^packages/(layout|contracts|calc)/src|node_modules/.*zod" },
      "The same edit on both sides.",
    ),
    never("packages-do-not-know-apps", { path: "^packages/" }, { path: "^apps/" }, "Arrows point down."),
    never(
      "apps-meet-on-the-wire",
      { path: "^apps/([^/]+)/" },
      { path: "^apps/", pathNot: "^apps/$1/" },
      "HTTP is the only way from one app to another.",
    ),
    never(
      "features-meet-at-the-door",
      { path: "^apps/([^/]+)/src/features/([^/]+)/" },
      { path: "^apps/$1/src/features/", pathNot: "^apps/$1/src/features/($2/|[^/]+/index\\.tsx?$)" },
      "Insides may change any day; index.ts is a promise.",
    ),
    never(
      "shared-code-does-not-know-the-product",
      { path: "^apps/[^/]+/src/(platform|ui|lib)/" },
      { path: "^apps/[^/]+/src/(features|routes|app)/" },
      "Arrows point down.",
    ),
    never(
      "sql-lives-in-repositories",
      { path: "^apps/api/src", pathNot: "\\.repository\\.ts$|^apps/api/src/platform/db/" },
      { path: "node_modules/.*knex" },
      "Tenancy holds only if every query passes the same door.",
    ),
    never(
      "board-core-is-headless",
      { path: "^apps/web/src/features/board/core/" },
      { path: "node_modules/.*react" },
      "The editor runs, and is tested, without a screen.",
    ),
    never("no-circles", {}, { circular: true }, "Two files that need each other are one file."),
  ],
  options: {
    tsPreCompilationDeps: true,
    doNotFollow: { path: "node_modules" },
    exclude: { path: "(^|/)dist/" },
    enhancedResolveOptions: { exportsFields: ["exports"], conditionNames: ["import", "types", "default"] },
    tsConfig: { fileName: "tsconfig.base.json" },
  },
};
