import { expect, test } from "@playwright/test";
import { finishCheck, outcome, recordOpenWire } from "../support/outcome";
import { signIn } from "../support/people";
import { startUnknown } from "../support/run-check";

test.describe.configure({ timeout: 240_000 });

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
