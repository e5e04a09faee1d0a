import { expect, test } from "@playwright/test";
import { expectAccessible, expectNoSidewaysScroll } from "./support/accessible";
import { signIn } from "./support/people";

test.beforeEach(async ({ page }) => {
  await signIn(page, "technician");
  await page.goto("/catalogue");
});

const results = "Entries found";

test("search, narrow down, open an entry, convert a reading, start a check on it", async ({ page }) => {
  await expectAccessible(page, "catalogue");
  await expectNoSidewaysScroll(page);
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

test("a value typed into the converter comes out on the other side, and back", async ({ page }) => {
  await page.getByRole("list", { name: results }).getByRole("link").first().click();
  await expect(page.getByRole("heading", { level: 1 })).toBeVisible();
  const fields = page.getByRole("heading", { name: /Convert/ }).locator("..").getByRole("textbox");
  const example = /for example (.+)/.exec(await page.getByText(/^for example/).first().innerText())?.[1] ?? "";
  await fields.nth(0).fill(example);
  await expect(fields.nth(1)).not.toHaveValue("");
  const value = await fields.nth(1).inputValue();
  await fields.nth(1).fill(value);
  await expect(fields.nth(0)).not.toHaveValue("");
  await fields.nth(0).fill("plenty");
  await expect(page.getByText(/cannot be read/)).toBeVisible();
  await expect(fields.nth(0)).toHaveValue("plenty");
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

test("the list is walked by keyboard alone", async ({ page }) => {
  // The first press may come before the script does.
  await expect(async () => {
    await page.keyboard.press("/");
    await expect(page.getByRole("searchbox")).toBeFocused({ timeout: 500 });
  }).toPass({ timeout: 15_000 });
  await page.keyboard.press("ArrowDown");
  await page.keyboard.press("ArrowDown");
  await page.keyboard.press("Enter");
  await expect(page).toHaveURL(/\/catalogue\/.+/);
});
