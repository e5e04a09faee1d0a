import { expect, test } from "@playwright/test";
import { expectAccessible, expectNoSidewaysScroll } from "./support/accessible";
import { signIn } from "./support/people";

test.beforeEach(async ({ page }) => {
  await signIn(page, "technician");
  await page.goto("/catalogue");
});

const results = "Entries found";

test("search, open an entry, start a check on it", async ({ page }) => {
  await page.getByRole("searchbox").fill("ladder angel");
  const first = page.getByRole("list", { name: results }).getByRole("link").first();
  await expect(first).toHaveText(/ladder/i);
  await expect(page).toHaveURL(/q=ladder/);

  await first.click();
  await expect(page.getByRole("heading", { level: 1 })).toHaveText(/ladder/i);
  await expect(page.getByRole("table").first()).toContainText(/supply/i);
  await expectAccessible(page, "entry");
  await expectNoSidewaysScroll(page);

  await page.getByRole("link", { name: /start a check/i }).first().click();
  await expect(page.getByRole("heading", { level: 1 })).toHaveText(/What do you have/);
  await expect(page.getByRole("main")).toContainText(/ladder/i);
  await expectAccessible(page, "start a check on an entry");
});

test("nothing found says what to try, and an address with a search brings the same list back", async ({ page }) => {
  await page.getByRole("searchbox").fill("zzqqxx");
  await expect(page.getByText(/No entry fits/)).toBeVisible();
  await expectAccessible(page, "nothing found");
  await page.getByRole("searchbox").fill("boom");
  const list = page.getByRole("list", { name: results });
  await expect(list.getByRole("link").first()).toBeVisible();
  await expect(page).toHaveURL(/q=boom/);
  const names = await list.getByRole("link").allInnerTexts();
  await page.reload();
  expect(await list.getByRole("link").allInnerTexts()).toEqual(names);
});
