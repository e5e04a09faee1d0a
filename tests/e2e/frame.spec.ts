import { expect, test } from "@playwright/test";
import { expectAccessible } from "./support/accessible";
import { signIn } from "./support/people";

test("night colours are kept in this browser and keep their contrast", async ({ page }) => {
  await signIn(page, "everyRole");
  await page.goto("/account");
  await page.getByRole("button", { name: /^Night/ }).click();
  await expect(page.locator("html")).toHaveAttribute("data-theme", "night");
  for (const path of ["/account", "/today", "/checks/chances", "/workshop", "/sign-in"]) {
    await page.goto(path);
    await expect(page.locator("html")).toHaveAttribute("data-theme", "night");
    await expectAccessible(page, `${path} at night`);
  }
});

test("the keyboard reaches the content first, and every focused thing is seen", async ({ page }) => {
  await signIn(page, "technician");
  await page.goto("/today");
  await page.keyboard.press("Tab");
  const skip = page.getByRole("link", { name: "Skip to content" });
  await expect(skip).toBeFocused();
  await page.keyboard.press("Enter");
  await page.keyboard.press("Tab");
  await expect(page.getByRole("link", { name: "Start a check" })).toBeFocused();
  await expect(page.getByRole("link", { name: "Start a check" })).toHaveCSS("outline-style", "solid");
  await expect(page.getByRole("navigation", { name: "Places" }).locator("[aria-current=page]").filter({ visible: true })).toHaveText("Today");
});
