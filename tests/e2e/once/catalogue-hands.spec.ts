import { expect, test } from "@playwright/test";
import { signIn } from "../support/people";

test.beforeEach(async ({ page }) => {
  await signIn(page, "technician");
  await page.goto("/catalogue");
});

const results = "Entries found";

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
