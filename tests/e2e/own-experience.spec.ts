import { expect, test, type Locator, type Page } from "@playwright/test";
import { expectAccessible, expectNoSidewaysScroll } from "./support/accessible";
import { finishCheck, outcome, PROOF, recordOpenWire } from "./support/outcome";
import { signIn } from "./support/people";

test.describe.configure({ timeout: 240_000 });

const row = (page: Page, title: string): Locator => page.getByRole("listitem").filter({ has: page.getByRole("heading", { level: 3, name: title, exact: true }) });

/** Both screen sizes run on one workshop at a time: what belongs to this run is found by its check. */
const own = (page: Page, check: string): Locator => page.getByRole("listitem").filter({ has: page.locator(`a[href^="${check}"]`) });

test("a confirmed check shows among the chances, and withdrawing it takes it out again", async ({ page }) => {
  await signIn(page, "technician");
  const check = await finishCheck(page);
  await page.getByRole("link", { name: "Record what it turned out to be" }).click();
  await expectAccessible(page, "form of a confirmation");
  await outcome(page).getByLabel("How it was proved").fill("short");
  await outcome(page).getByRole("button", { name: "Record it" }).click();
  await expect(outcome(page).getByRole("alert").filter({ hasText: "Choose what it was" })).toBeVisible();
  await expect(outcome(page).getByLabel("How it was proved")).toHaveValue("short");
  await recordOpenWire(page);
  await expectAccessible(page, "confirmed check");
  await expectNoSidewaysScroll(page);

  await page.goto("/checks");
  await expect(page.getByRole("listitem").filter({ has: page.locator(`a[href="${check}"]`) })).toContainText(/Confirmed: Wire to . open/);
  await page.goto("/checks/chances");
  await expect(row(page, "Open wire")).toContainText(/up .*points/);
  await expect(row(page, "Sound")).toContainText(/(up|down) .*points/);
  await expect(own(page, check)).toContainText(PROOF);
  await expectAccessible(page, "chances before the first reading");
  await expectNoSidewaysScroll(page);

  await own(page, check).locator("summary").filter({ hasText: "Withdraw" }).click();
  await own(page, check).getByRole("button", { name: /^Withdraw it/ }).click();
  await expect(page.getByText("Withdrawn. It no longer shifts the chances.")).toBeFocused();
  await expect(own(page, check)).toHaveCount(0);
  await page.goto(check);
  await expect(outcome(page).getByText("One record was withdrawn")).toBeVisible();
  await expect(outcome(page).getByRole("button", { name: "Record it" })).toBeVisible();
});
