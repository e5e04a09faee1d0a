import { expect, test } from "@playwright/test";
import { expectAccessible, expectNoSidewaysScroll } from "./support/accessible";
import { complaints } from "./support/complaints";
import { PEOPLE, signInByForm } from "./support/people";

test("the front page says what it is for and leads to sign-in", async ({ page }) => {
  await page.goto("/");
  await expect(page.getByRole("heading", { level: 1 })).toBeVisible();
  await page.getByRole("link", { name: /sign in/i }).first().click();
  await expect(page.getByRole("heading", { level: 1, name: "Sign in" })).toBeVisible();
});

test("a wrong password is refused in a sentence, and the address stays typed", async ({ page }) => {
  await page.goto("/sign-in");
  await page.getByLabel("E-mail address").fill(PEOPLE.otherTechnician);
  await page.getByLabel("Password").fill("not this one at all");
  await page.getByRole("button", { name: "Sign in" }).click();
  const refusal = page.getByRole("alert").filter({ hasText: /\w/ });
  await expect(refusal).toBeVisible();
  await expect(page.getByLabel("E-mail address")).toHaveValue(PEOPLE.otherTechnician);
  await expectAccessible(page, "sign-in, refused");
});

test("signing in leads to Today, signing out ends the session", async ({ page }) => {
  const heard = complaints(page);
  await signInByForm(page, "technician");
  expect(heard).toEqual([]);
  await expectAccessible(page, "Today");
  await expectNoSidewaysScroll(page);
  const kept = await page.context().cookies();
  const menu = page.getByRole("button", { name: /Tilda Marsh|account/i }).first();
  if (await menu.isVisible()) await menu.click();
  await page.getByRole("button", { name: /sign out/i }).first().click();
  await expect(page).toHaveURL(/sign-in/);
  // The cookie of before opens nothing any more: the session itself has ended.
  await page.context().addCookies(kept);
  await page.goto("/today");
  await expect(page).toHaveURL(/sign-in/);
});
