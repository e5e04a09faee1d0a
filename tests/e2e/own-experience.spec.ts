import { expect, test, type Locator, type Page } from "@playwright/test";
import { expectAccessible, expectNoSidewaysScroll } from "./support/accessible";
import { signIn } from "./support/people";
import { answerAll, machine, startUnknown } from "./support/run-check";

test.describe.configure({ timeout: 240_000 });

const PROOF = "Wire renewed, 0.2 Ω end to end; the fault stays away.";

/** A finished check of the technician's own on an unknown device, and its address. */
async function finishCheck(page: Page): Promise<string> {
  await startUnknown(page);
  await answerAll(page, machine("potentiometer with an open wire"));
  await page.getByRole("button", { name: "See the verdict" }).click();
  await expect(page.getByRole("heading", { level: 1, name: "Verdict", exact: true })).toBeVisible({ timeout: 20_000 });
  return new URL(page.url()).pathname;
}

const outcome = (page: Page): Locator => page.getByRole("region", { name: "What it turned out to be" });
const row = (page: Page, title: string): Locator => page.getByRole("listitem").filter({ has: page.getByRole("heading", { level: 3, name: title, exact: true }) });

async function recordOpenWire(page: Page): Promise<void> {
  const form = outcome(page);
  const option = form.getByLabel("What it was").locator("option").filter({ hasText: /^Wire to . open$/ }).first();
  await form.getByLabel("What it was").selectOption((await option.getAttribute("value")) ?? "");
  await form.getByLabel("Kind of device").selectOption("potentiometer");
  await form.getByLabel("How it was proved").fill(PROOF);
  await form.getByRole("button", { name: "Record it" }).click();
  await expect(form.getByText("Confirmed", { exact: true })).toBeVisible();
}

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

test("a check counts what was confirmed before it began, and nothing that came after", async ({ page }) => {
  await signIn(page, "technician");
  const check = await finishCheck(page);
  const experienceOf = async (address: string) => ((await (await page.request.get(`/api${address}`)).json()) as { setup: { experience?: { findings: Record<string, number> } } }).setup.experience;
  const before = await experienceOf(check);
  await recordOpenWire(page);
  expect(await experienceOf(check)).toEqual(before);
  await startUnknown(page);
  const started = new URL(page.url()).pathname;
  // One is the demo workshop's own.
  await expect(async () => expect((await experienceOf(started))?.findings["wire-open"]).toBeGreaterThanOrEqual(2)).toPass({ timeout: 15_000 });
  await page.goto(check);
  await outcome(page).locator("summary").filter({ hasText: /^Withdraw/ }).click();
  await outcome(page).getByRole("button", { name: /^Withdraw it/ }).click();
  await expect(outcome(page).getByRole("button", { name: "Record it" })).toBeVisible();
});

test("every role sees the chances; who may not record or switch is not offered it, and is refused if they ask", async ({ page }) => {
  await signIn(page, "administrator");
  await page.goto("/today");
  await page.getByRole("link", { name: "Chances before the first reading" }).click();
  await expect(page.getByRole("heading", { level: 1, name: "Chances before the first reading" })).toBeVisible();
  await expect(page.getByRole("main").locator("summary").filter({ hasText: "Withdraw" })).toHaveCount(0);
  await expect(page.getByRole("button", { name: /own checks/i })).toBeVisible();
  const check = (await page.getByRole("region", { name: "Confirmations that shifted them" }).getByRole("link").first().getAttribute("href"))?.split("#")[0] ?? "";
  const answer = await page.request.post(`/api${check}/confirm`, { headers: { origin: new URL(page.url()).origin }, data: { finding: "none", kind: "pwm", proof: "Nothing was found." } });
  expect([answer.status(), ((await answer.json()) as { error: { code: string } }).error.code]).toEqual([403, "not-allowed"]);
});

test("the trainer is not offered the switch, and may withdraw what others confirmed", async ({ page }) => {
  await signIn(page, "trainer");
  await page.goto("/checks/chances");
  await expect(page.getByRole("button", { name: /own checks/i })).toHaveCount(0);
  await expect(page.getByRole("main").locator("summary").filter({ hasText: "Withdraw" }).first()).toBeVisible();
});
