/** The JavaScript that a real browser asks for on first load, as the built files weigh in gzip. */
import { chromium, type Browser } from "@playwright/test";
import type { WholeStack } from "@cleatwork/local-stack/stack";
import { readFileSync } from "node:fs";
import { join } from "node:path";
import { gzipSync } from "node:zlib";
import { chromiumOptions } from "../support/chromium.ts";
import { linkInMail, recipientOf } from "../support/inbox.ts";
import type { Figure } from "./figure.ts";

const MOST_KB = 90;

export async function firstLoadFigures(stack: WholeStack): Promise<readonly Figure[]> {
  const link = await linkInMail(stack.mailUrl, await recipientOf(stack.mailUrl, "Quote"), "/q/");
  const browser = await chromium.launch(chromiumOptions);
  try {
    return [
      await firstLoad(browser, stack, "sign-in", `${stack.publicUrl}/sign-in`),
      await firstLoad(browser, stack, "client page", link),
    ];
  } finally {
    await browser.close();
  }
}

async function firstLoad(browser: Browser, stack: WholeStack, what: string, url: string): Promise<Figure> {
  const context = await browser.newContext({ viewport: { width: 390, height: 844 } });
  const page = await context.newPage();
  const scripts = new Set<string>();
  page.on("request", (request) => {
    const { origin, pathname } = new URL(request.url());
    // A preloaded module is a script, whatever the browser calls it.
    if (origin === stack.publicUrl && pathname.endsWith(".js")) scripts.add(pathname);
  });
  await page.goto(url);
  await page.getByRole("heading", { level: 1 }).waitFor();
  await page.waitForLoadState("networkidle");
  await context.close();

  const dist = stack.env["WEB_DIST"] ?? "";
  const bytes = [...scripts].map((path) => gzipSync(readFileSync(join(dist, path)), { level: 9 }).length);
  return {
    what: `first-load JavaScript of the ${what}, gzip`,
    figure: Math.round(bytes.reduce((sum, each) => sum + each, 0) / 100) / 10,
    unit: "kB",
    most: MOST_KB,
    note: `${scripts.size} files`,
  };
}
