import AxeBuilder from "@axe-core/playwright";
import { expect, type Page } from "@playwright/test";

const TAGS = ["wcag2a", "wcag2aa", "wcag21a", "wcag21aa", "wcag22aa", "best-practice"];

/** No axe violation on the screen as it stands: WCAG 2.2 AA, target size, and contrast of 7:1 as our look asks. */
export async function expectAccessible(page: Page, screen: string): Promise<void> {
  const { violations } = await new AxeBuilder({ page })
    .setLegacyMode()
    .options({ resultTypes: ["violations"], rules: { "target-size": { enabled: true }, "color-contrast-enhanced": { enabled: true } } })
    .withTags(TAGS)
    .analyze();
  const found = violations.flatMap(({ id, nodes }) => nodes.map(({ target, failureSummary }) => `${id}: ${target.join(" ")}: ${failureSummary ?? ""}`));
  expect(found, `axe on ${screen}`).toEqual([]);
}

/** Nothing is cut off sideways: the page itself never scrolls to the right. */
export async function expectNoSidewaysScroll(page: Page): Promise<void> {
  const [content, screen] = await page.evaluate(() => [document.documentElement.scrollWidth, document.documentElement.clientWidth]);
  expect(content).toBeLessThanOrEqual(screen ?? 0);
}
