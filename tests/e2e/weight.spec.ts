import { expect, test, type Page } from "@playwright/test";
import { signIn } from "./support/people";

/** Most JavaScript a route may bring, gzipped; a route with nothing on it brings 131 KB. */
const MOST_KILOBYTES = 190;

const ROUTES = ["/", "/sign-in", "/today", "/catalogue", "/checks", "/checks/new", "/machines", "/account"];

declare global {
  interface Window { shifts?: number }
}

/** JavaScript that came over the network for a page, in kilobytes as sent, without what the page loads on demand later. */
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

for (const path of ROUTES) {
  test(`${path} brings no more than ${MOST_KILOBYTES} KB of JavaScript, and does not jump while it loads`, async ({ page }) => {
    if (path !== "/" && path !== "/sign-in") await signIn(page, "everyRole");
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
  });
}
