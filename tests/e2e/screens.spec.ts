import { expect, test, type Page } from "@playwright/test";
import { expectAccessible, expectNoSidewaysScroll } from "./support/accessible";
import { complaints } from "./support/complaints";
import { signIn, type PEOPLE } from "./support/people";
import { startUnknown } from "./support/run-check";

/** Most JavaScript a route may bring, gzipped; a route with nothing on it brings 131 KB. */
const MOST_KILOBYTES = 190;

const ROUTES: readonly (readonly [path: string, who: keyof typeof PEOPLE | null])[] = [
  ["/", null], ["/sign-in", null], ["/today", "everyRole"], ["/catalogue", "everyRole"], ["/checks", "everyRole"], ["/checks/chances", "everyRole"],
  ["/checks/new", "everyRole"], ["/machines", "everyRole"], ["/account", "everyRole"], ["/workshop", "everyRole"],
];

declare global {
  interface Window { shifts?: number }
}

/** JavaScript that came over the network for a page, in kilobytes as sent; the engine's worker loads its own beside the page. */
async function scriptKilobytes(page: Page, path: string): Promise<number> {
  const sizes: Promise<number>[] = [];
  page.on("requestfinished", (request) => {
    if (request.resourceType() === "script") sizes.push(request.sizes().then(({ responseBodySize }) => responseBodySize));
  });
  await page.goto(path, { waitUntil: "networkidle" });
  return (await Promise.all(sizes)).reduce((sum, size) => sum + size, 0) / 1024;
}

test.beforeAll(async ({ browser }) => {
  // Signed in beforehand by another window, so that no script of the sign-in page is in the cache of the ones measured.
  const page = await browser.newPage();
  await signIn(page, "everyRole");
  await page.context().close();
});

for (const [path, who] of ROUTES) {
  test(`${path} is light, does not jump while it loads, fits, is accessible, and runs under the content security policy`, async ({ page }) => {
    if (who) await signIn(page, who);
    const heard = complaints(page);
    await page.addInitScript(() => {
      window.shifts = 0;
      new PerformanceObserver((list) => {
        for (const entry of list.getEntries()) window.shifts = (window.shifts ?? 0) + (entry as PerformanceEntry & { value: number }).value;
      }).observe({ type: "layout-shift", buffered: true });
    });
    const kilobytes = await scriptKilobytes(page, path);
    expect(kilobytes).toBeGreaterThan(20);
    expect(kilobytes).toBeLessThanOrEqual(MOST_KILOBYTES);
    expect(await page.evaluate(() => window.shifts)).toBeLessThan(0.01);
    await expectAccessible(page, path);
    await expectNoSidewaysScroll(page);
    expect(heard).toEqual([]);
  });
}

test("a finished check, an entry and, where no drawing stands beside it, a running check stay under the same weight", async ({ page, browser, isMobile }, { project }) => {
  await signIn(page, "everyRole");
  await startUnknown(page);
  const running = new URL(page.url()).pathname;
  await page.goto("/checks?state=finished");
  const finished = (await page.getByRole("main").getByRole("list").getByRole("link").first().getAttribute("href")) ?? "";
  await page.goto("/catalogue");
  const entry = (await page.getByRole("list", { name: "Entries found" }).getByRole("link").first().getAttribute("href")) ?? "";
  const narrow = (project.use.viewport?.width ?? 1280) < 1024 || isMobile;
  for (const path of [finished, entry, ...(narrow ? [running] : [])]) {
    const fresh = await browser.newPage();
    await signIn(fresh, "everyRole");
    expect(await scriptKilobytes(fresh, path), path).toBeLessThanOrEqual(MOST_KILOBYTES);
    await fresh.context().close();
  }
});

test("a page that a person's roles do not allow says so, and is accessible", async ({ page }) => {
  await signIn(page, "technician");
  await page.goto("/workshop");
  await expect(page.getByRole("heading", { level: 1 })).toHaveText(/do not allow/);
  await expectAccessible(page, "refused page");
});
