import { defineConfig } from "@playwright/test";
import { chromiumOptions } from "./support/chromium.ts";

export default defineConfig({
  testDir: "journeys",
  // Two at once gain nothing on two cores, and each journey keeps a whole product running.
  workers: 1,
  fullyParallel: false,
  retries: 0,
  timeout: 480_000,
  expect: { timeout: 20_000 },
  reporter: [
    ["list"],
    ["json", { outputFile: process.env["PLAYWRIGHT_JSON_OUTPUT_NAME"] ?? "../.cache/reports/playwright.json" }],
  ],
  outputDir: "../.cache/playwright",
  use: {
    launchOptions: chromiumOptions,
    actionTimeout: 20_000,
    trace: "retain-on-failure",
    screenshot: "only-on-failure",
    viewport: { width: 1440, height: 900 },
    reducedMotion: "reduce",
  },
});
