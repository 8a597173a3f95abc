import { AxeBuilder } from "@axe-core/playwright";
import { expect, type Page } from "@playwright/test";

/** Nothing that axe can find against WCAG 2.2 A and AA. */
export async function expectAccessible(page: Page, where: string): Promise<void> {
  const { violations } = await new AxeBuilder({ page })
    .withTags(["wcag2a", "wcag2aa", "wcag21a", "wcag21aa", "wcag22aa"])
    .analyze();
  const found = violations.map(
    ({ id, help, nodes }) =>
      `${id}: ${help} (${nodes
        .slice(0, 3)
        .map(({ target }) => String(target))
        .join(" | ")})`,
  );
  expect(found, `accessibility of ${where}`).toEqual([]);
}
