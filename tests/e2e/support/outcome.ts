import { expect, type Locator, type Page } from "@playwright/test";
import { answerAll, machine, startUnknown } from "./run-check";

export const PROOF = "Wire renewed, 0.2 Ω end to end; the fault stays away.";

/** A finished check of the technician's own on an unknown device, and its address. */
export async function finishCheck(page: Page): Promise<string> {
  await startUnknown(page);
  await answerAll(page, machine("potentiometer with an open wire"));
  await page.getByRole("button", { name: "See the verdict" }).click();
  await expect(page.getByRole("heading", { level: 1, name: "Verdict", exact: true })).toBeVisible({ timeout: 20_000 });
  return new URL(page.url()).pathname;
}

export const outcome = (page: Page): Locator => page.getByRole("region", { name: "What it turned out to be" });

export async function recordOpenWire(page: Page): Promise<void> {
  const form = outcome(page);
  const option = form.getByLabel("What it was").locator("option").filter({ hasText: /^Wire to . open$/ }).first();
  await form.getByLabel("What it was").selectOption((await option.getAttribute("value")) ?? "");
  await form.getByLabel("Kind of device").selectOption("potentiometer");
  await form.getByLabel("How it was proved").fill(PROOF);
  await form.getByRole("button", { name: "Record it" }).click();
  await expect(form.getByText("Confirmed", { exact: true })).toBeVisible();
}
