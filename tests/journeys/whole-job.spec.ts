/** The whole job, as people do it: lay out, check, price, quote, accept, build. Accessibility is checked on every page. */
import type { Browser, Page } from "@playwright/test";
import { expectAccessible } from "../support/accessible.ts";
import { linkInMail } from "../support/inbox.ts";
import { expect, test, type Product } from "../support/product.ts";

const CLIENT = "priya.lindqvist@oxbowbuilders.example";

test("a duct becomes a price, a quote, a signature and a cut list without a price", async ({ browser, product }) => {
  const estimator = await signedIn(browser, product, "estimator");
  const priceBefore = await test.step("open the project and read its numbers", () => openProject(estimator));
  await test.step("change a size: pressure, pounds, hours and price move", () => changeSize(estimator, priceBefore));
  await test.step("every step of the project is there and accessible", () => walkSteps(estimator));
  await test.step("the edit survives a reload", () => survivesReload(estimator));
  const price = await test.step("issue the quote", () => issueQuote(estimator));

  const client = await (await browser.newContext({ viewport: { width: 390, height: 844 } })).newPage();
  await test.step("the client reads and accepts on a phone", () => acceptAsClient(client, product, price));

  const foreman = await signedIn(browser, product, "foreman", { width: 390, height: 844 });
  await test.step("the foreman sees what was sold and no price", () => buildAsForeman(foreman, price));
  await test.step("the estimator sees the acceptance", async () => {
    await estimator.reload();
    await expect(estimator.getByText(/Accepted by Priya Lindqvist/)).toBeVisible();
  });
});

async function signedIn(
  browser: Browser,
  product: Product,
  role: string,
  viewport = { width: 1440, height: 900 },
): Promise<Page> {
  const { email, password } = product.signIn(role);
  const page = await (await browser.newContext({ viewport, reducedMotion: "reduce" })).newPage();
  await page.goto(`${product.url}/sign-in`);
  await expectAccessible(page, "sign-in");
  await page.getByLabel("E-mail").fill(email);
  await page.getByLabel("Password", { exact: true }).fill(password);
  await page.getByRole("button", { name: "Sign in" }).click();
  await page.waitForURL(/\/c\//);
  return page;
}

const tally = (page: Page) => page.getByRole("region", { name: "Tally" });

async function priceIn(page: Page): Promise<string> {
  await expect(tally(page)).toContainText("$");
  return /\$[\d,]+\.\d{2}/.exec((await tally(page).textContent()) ?? "")?.[0] ?? "";
}

async function openProject(page: Page): Promise<string> {
  await expect(page.getByRole("heading", { level: 1 })).toBeVisible();
  await expectAccessible(page, "projects");
  await page
    .getByRole("link", { name: /Marrow Creek Branch Library/ })
    .first()
    .click();
  await expect(page.getByTestId("board")).toBeVisible();
  const price = await priceIn(page);
  await expectAccessible(page, "board");
  return price;
}

async function changeSize(page: Page, before: string): Promise<void> {
  await page.getByRole("radio", { name: "Schedule" }).click();
  const grid = page.getByRole("grid", { name: "Duct schedule" });
  await expect(grid).toBeVisible();
  await expectAccessible(page, "schedule");
  await grid.getByRole("row").filter({ hasText: "Reading trunk" }).first().getByRole("gridcell").nth(5).click();
  const pressure = await tally(page).textContent();
  await page.keyboard.type("18o");
  await page.keyboard.press("Enter");
  await expect(page.getByTestId("tally-change").first()).toBeVisible();
  await expect.poll(() => priceIn(page)).not.toBe(before);
  expect(await tally(page).textContent()).not.toBe(pressure);
  await expect(page.getByTestId("save-state")).toContainText("All changes saved");

  await test.step("a size that cannot be is refused in its cell, and nothing is lost", async () => {
    const price = await priceIn(page);
    await page.keyboard.press("ArrowUp");
    await page.keyboard.type("14x");
    await page.keyboard.press("Enter");
    await expect(page.getByRole("alert").filter({ hasText: "one side" })).toBeVisible();
    await page.keyboard.press("Escape");
    expect(await priceIn(page)).toBe(price);
  });

  await test.step("undo and redo", async () => {
    const price = await priceIn(page);
    await page.keyboard.press("Control+z");
    await expect.poll(() => priceIn(page)).toBe(before);
    await page.keyboard.press("Control+y");
    await expect.poll(() => priceIn(page)).toBe(price);
    await expect(page.getByTestId("save-state")).toContainText("All changes saved");
  });
}

async function walkSteps(page: Page): Promise<void> {
  for (const [step, heading] of [
    ["Air check", "Air check"],
    ["Takeoff", "Takeoff"],
    ["Price", "Price"],
    ["Field", "Field"],
  ] as const) {
    await page
      .getByRole("navigation", { name: "Steps" })
      .getByRole("link", { name: new RegExp(`^${step}`) })
      .click();
    await expect(page.getByRole("heading", { level: 1, name: heading })).toBeAttached();
    await expectAccessible(page, step);
  }
}

async function survivesReload(page: Page): Promise<void> {
  const price = await priceIn(page);
  await page.reload();
  await expect.poll(() => priceIn(page)).toBe(price);
}

async function issueQuote(page: Page): Promise<string> {
  const price = await priceIn(page);
  await page
    .getByRole("navigation", { name: "Steps" })
    .getByRole("link", { name: /^Quote/ })
    .click();
  await expect(page.getByRole("button", { name: "Issue…" })).toBeEnabled();
  await expectAccessible(page, "quote editor");
  await page.getByRole("button", { name: "Issue…" }).click();
  const dialog = page.getByRole("dialog");
  await expect(dialog).toBeVisible();
  await expectAccessible(page, "issue dialog");
  await dialog.getByLabel(/Priya Lindqvist/).check();
  await dialog.getByRole("button", { name: "Issue and send" }).click();
  await expect(dialog).toBeHidden();
  await expect(page.getByText("Revision 1", { exact: true })).toBeVisible();
  return price;
}

async function acceptAsClient(page: Page, product: Product, price: string): Promise<void> {
  await page.goto(await linkInMail(product.mailUrl, CLIENT, "/q/"));
  await expect(page.getByRole("heading", { level: 1 })).toBeVisible();
  await expect(page.getByText(price).first()).toBeVisible();
  await expectAccessible(page, "client page");
  const pdf = await page.request.get(
    new URL((await page.getByRole("link", { name: "Download the PDF" }).getAttribute("href")) ?? "", page.url()).href,
  );
  expect((await pdf.body()).subarray(0, 5).toString()).toBe("%PDF-");
  await page.getByLabel("Your name").fill("Priya Lindqvist");
  await page.getByLabel("Title").fill("Preconstruction manager");
  await page.getByLabel(/Purchase order/).fill("PO-4471");
  await page.getByRole("checkbox").check();
  await page.getByRole("button", { name: `Accept ${price}` }).click();
  await page.getByRole("dialog").getByRole("button", { name: "Yes, accept" }).click();
  await expect(page.getByRole("status")).toContainText("Accepted by Priya Lindqvist");
  await expect(page.getByRole("button", { name: /^Accept/ })).toHaveCount(0);
  await expectAccessible(page, "client page, accepted");
}

async function buildAsForeman(page: Page, price: string): Promise<void> {
  const bodies: string[] = [];
  // Read on the way, not afterwards: a body is gone once its page has been left.
  await page.route(/\/api\/.*\/field/, async (route) => {
    const response = await route.fetch();
    bodies.push(await response.text());
    await route.fulfill({ response });
  });
  await page.reload();
  await expect(page.getByRole("heading", { level: 1, name: "Sold jobs" })).toBeVisible();
  await expect(page.getByRole("link", { name: /Marrow Creek Branch Library/ })).toBeVisible();
  await expectAccessible(page, "field home");
  await page.getByRole("link", { name: /Marrow Creek Branch Library/ }).click();
  await expect(page.getByRole("heading", { level: 1, name: /Marrow Creek/ })).toBeVisible();
  await expect(page.getByText(/pieces/).first()).toBeVisible();
  await expectAccessible(page, "field takeoff");
  const seen = (await page.locator("body").textContent()) ?? "";
  expect(seen).not.toContain("$");
  expect(seen).not.toContain(price.slice(1));
  expect(bodies.length).toBeGreaterThan(0);
  for (const body of bodies) expect(body).not.toMatch(/_minor|_micro|_bp|"(cost|price|margin|markup|rate)/i);
}
