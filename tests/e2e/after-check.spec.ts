import { expect, test, type Page } from "@playwright/test";
import { expectAccessible, expectNoSidewaysScroll } from "./support/accessible";
import { readScreen } from "./support/lead-card";
import { signIn } from "./support/people";
import { answerAll, machine, startUnknown } from "./support/run-check";

test.describe.configure({ timeout: 240_000 });

const SENTENCE = /^(It is|Most likely it is) an? /;

async function toVerdict(page: Page, heading: string): Promise<string> {
  await answerAll(page, machine("potentiometer with an open wire"));
  await page.getByRole("button", { name: "See the verdict" }).click();
  await expect(page.getByRole("heading", { level: 1, name: heading, exact: true })).toBeVisible({ timeout: 20_000 });
  return (await page.getByText(SENTENCE).first().innerText()).trim();
}

test("a verdict is found in the log, printed as a report, re-checked, and shown beside the first run", async ({ page }) => {
  await signIn(page, "technician");
  await startUnknown(page);
  const sentence = await toVerdict(page, "Verdict");
  const address = page.url();

  await page.getByRole("link", { name: "Back to the log" }).click();
  await expect(page.getByRole("heading", { level: 1, name: "Checks" })).toBeVisible();
  await expectAccessible(page, "log");
  await expectNoSidewaysScroll(page);
  await page.locator("summary").filter({ hasText: "Filter" }).click();
  await page.getByLabel("Kind").selectOption({ label: "Potentiometer" });
  await page.getByLabel("Person").selectOption({ label: "Tilda Marsh" });
  await page.getByRole("button", { name: "Show" }).click();
  await expect(page).toHaveURL(/kind=potentiometer/);
  await page.getByRole("link", { name: /wire.*open/i }).first().click();
  await expect(page).toHaveURL(address);
  await expect(page.getByRole("group", { name: "Keypad" })).toHaveCount(0);

  await page.getByRole("link", { name: "Report" }).click();
  await expect(page.getByRole("button", { name: /print/i })).toBeVisible();
  await expectAccessible(page, "report");
  await expectNoSidewaysScroll(page);
  await page.emulateMedia({ media: "print" });
  await expect(page.getByRole("button", { name: /print/i })).toBeHidden();
  await expect(page.getByRole("banner")).toBeHidden();
  await expect(page.getByText(sentence)).toBeVisible();
  await expect(page.getByText("Signed")).toBeVisible();
  await page.emulateMedia({ media: null });

  await page.getByRole("link", { name: "Back to the verdict" }).click();
  await page.getByRole("button", { name: "Re-check after repair" }).click();
  await expect(page).not.toHaveURL(address);
  await readScreen(page);
  await toVerdict(page, "Verdict of the re-check");
  await page.getByRole("link", { name: "Compare the runs" }).click();
  await expect(page.getByRole("main")).toContainText(/before/i);
  await expect(page.getByRole("main")).toContainText(/after/i);
  await expectAccessible(page, "comparison");
  await expectNoSidewaysScroll(page);
});

test("a machine's page shows its checks", async ({ page }) => {
  await signIn(page, "technician");
  await page.goto("/machines");
  await page.getByRole("main").getByRole("link").first().click();
  await expect(page).toHaveURL(/\/machines\/.+/);
  await expect(page.getByRole("heading", { level: 1 })).toBeVisible();
  await expectAccessible(page, "machine");
  await expectNoSidewaysScroll(page);
});
