/** The board by mouse: choose, draw, take back; and every edit is there after a reload and a restart of the API. */
import type { Page } from "@playwright/test";
import { expect, test } from "../support/product.ts";

test("a duct drawn by mouse outlasts undo, a reload and a restart", async ({ browser, product }) => {
  const { email, password } = product.signIn("owner");
  const page = await (
    await browser.newContext({ viewport: { width: 1440, height: 900 }, reducedMotion: "reduce" })
  ).newPage();
  await page.goto(`${product.url}/sign-in`);
  await page.getByLabel("E-mail").fill(email);
  await page.getByLabel("Password", { exact: true }).fill(password);
  await page.getByRole("button", { name: "Sign in" }).click();
  await page
    .getByRole("link", { name: /Tern Lake Visitor Center/ })
    .first()
    .click();
  const board = page.getByTestId("board");
  await expect(board).toBeVisible();
  const before = await segmentCount(page);
  expect(before).toBeGreaterThan(5);

  await test.step("a click chooses what is under it", async () => {
    await page.goto(`${page.url().split("?")[0] ?? ""}?view=schedule`);
    await page.getByRole("grid").getByRole("row").nth(1).getByRole("gridcell").nth(1).click();
    await page.getByRole("radio", { name: "Board" }).click();
    await expect(page.getByRole("complementary", { name: "Inspector" }).getByLabel("Size")).toBeVisible();
  });

  await test.step("a run is drawn from the middle of a duct: a tap, with a typed length, size and airflow", async () => {
    const box = await board.boundingBox();
    if (!box) throw new Error("the board has a place");
    const canvas = board.locator("canvas");
    await canvas.click({ position: { x: box.width / 2, y: 12 } });
    await page.keyboard.press("r");
    await expect(page.getByRole("button", { name: "Run" })).toHaveAttribute("aria-pressed", "true");
    const spot = await findDuct(page, box);
    await page.mouse.click(spot.x, spot.y);
    await page.mouse.move(spot.x, spot.y - 120, { steps: 4 });
    await page.keyboard.type("8'");
    await page.keyboard.press("Tab");
    await page.keyboard.type("8o");
    await page.keyboard.press("Tab");
    await page.keyboard.type("120");
    await page.keyboard.press("Enter");
    // The tapped duct is two now, and the new one hangs between them.
    await expect.poll(() => segmentCount(page)).toBe(before + 2);
    await page.keyboard.press("Escape");
    await page.keyboard.press("Escape");
    await expect(page.getByTestId("save-state")).toContainText("All changes saved");
  });

  await test.step("undo takes the whole run back, redo brings it again", async () => {
    await page.keyboard.press("Control+z");
    await expect.poll(() => segmentCount(page)).toBe(before);
    await page.keyboard.press("Control+y");
    await expect.poll(() => segmentCount(page)).toBe(before + 2);
    await expect(page.getByTestId("save-state")).toContainText("All changes saved");
  });

  await test.step("all of it is there after a reload and a restart of the API", async () => {
    await product.stack.kill("api");
    await product.stack.startApi();
    await page.reload();
    await expect(board).toBeVisible();
    await expect.poll(() => segmentCount(page)).toBe(before + 2);
  });
});

async function segmentCount(page: Page): Promise<number> {
  const step = page.getByRole("navigation", { name: "Steps" }).getByRole("link", { name: /^Layout/ });
  await expect(step).toContainText("segments");
  return Number(/(\d+) segments/.exec((await step.textContent()) ?? "")?.[1] ?? 0);
}

/** Moves over the board until the run tool says that it would tap a duct: the pointer there starts a run. */
async function findDuct(
  page: Page,
  box: { x: number; y: number; width: number; height: number },
): Promise<{ x: number; y: number }> {
  for (const share of [0.75, 0.7, 0.65, 0.6, 0.55]) {
    for (let y = 24; y < box.height - 24; y += 6) {
      const spot = { x: box.x + box.width * share, y: box.y + y };
      await page.mouse.move(spot.x, spot.y);
      const caught = await page.getByTestId("board").locator("canvas").getAttribute("data-snap");
      if (caught === "duct") return spot;
    }
  }
  throw new Error("no duct lies in the right half of the board");
}
