import { defineConfig } from "vitest/config";

const setupFiles = ["./tests/support/quiet.ts"];
const needsDatabase = ["**/*.api.test.ts", "tests/isolation/**/*.test.ts", "tests/faults/**/*.test.ts"];
const elsewhere = ["**/node_modules/**", "**/dist/**", ".cache/**", ".data/**"];

export default defineConfig({
  test: {
    projects: [
      {
        test: {
          name: "unit",
          environment: "node",
          include: ["{apps,packages,migrations,tests}/**/*.test.{ts,mjs}"],
          exclude: [...elsewhere, ...needsDatabase],
          setupFiles,
        },
      },
      {
        test: {
          name: "screen",
          environment: "jsdom",
          include: ["apps/web/src/**/*.test.tsx"],
          exclude: elsewhere,
          setupFiles: [...setupFiles, "./tests/support/screen.ts"],
        },
      },
      {
        test: {
          name: "database",
          environment: "node",
          include: needsDatabase,
          exclude: elsewhere,
          setupFiles: [...setupFiles, "./tests/support/database.ts"],
          testTimeout: 30_000,
          hookTimeout: 60_000,
          pool: "forks",
          maxWorkers: 2,
          // After the others: they may use every core, these share one database server.
          sequence: { groupOrder: 1 },
        },
      },
    ],
  },
});
