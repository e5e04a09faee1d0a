import { expect, test, type Page } from "@playwright/test";
import { readScreen } from "../support/lead-card";
import { signIn } from "../support/people";
import { enter, field, giveReading, machine, startUnknown, toReading } from "../support/run-check";

const bench = machine("potentiometer with an open wire");

/** One reading given, so that there is something to lose. */
async function firstReading(page: Page): Promise<string> {
  const check = await toReading(page);
  await giveReading(page, bench, check);
  return check;
}

const readingsSoFar = async (page: Page): Promise<number> => {
  await page.getByRole("button", { name: "Readings so far" }).click();
  const rows = await page.getByRole("button", { name: "Correct it" }).count();
  await page.getByRole("button", { name: "Close" }).click();
  return rows;
};

test.beforeEach(async ({ page }) => {
  await signIn(page, "technician");
  await startUnknown(page);
});

test("a reload in mid-check comes back to the same screen, with its readings and the half-typed text", async ({ page }) => {
  await firstReading(page);
  const asked = await toReading(page);
  await field(page).fill("4k");
  await page.reload();
  expect(await toReading(page)).toBe(asked);
  await expect(field(page)).toHaveValue("4k");
  expect(await readingsSoFar(page)).toBe(1);
});

test("a wrong unit is named beside the field, and what was typed stays", async ({ page }) => {
  await page.getByRole("button", { name: "Another reading" }).click();
  await page.getByRole("dialog").locator("summary").filter({ hasText: /power on \(1\)/i }).click();
  await page.getByRole("dialog").getByRole("button", { name: /^Voltage, battery/ }).click();
  await toReading(page);
  await field(page).fill("12 kΩ");
  await enter(page).click();
  await expect(page.getByRole("alert").filter({ hasText: "volts" })).toBeVisible();
  await expect(field(page)).toHaveValue("12 kΩ");
  await expect(field(page)).toHaveAttribute("aria-invalid", "true");
});

test("with the server dead the check goes on, and is sent when it answers again", async ({ page }) => {
  await page.route("**/api/**", (route) => route.abort());
  await firstReading(page);
  const next = await toReading(page);
  await giveReading(page, bench, next);
  await expect(page.getByText(/Kept on this phone, will be sent/)).toBeVisible();
  await page.unroute("**/api/**");
  const sent = page.waitForResponse((response) => response.url().includes("/steps") && response.ok(), { timeout: 70_000 });
  await page.evaluate(() => window.dispatchEvent(new Event("online")));
  await sent;
  await expect(page.getByText("Kept on this phone and sent.")).toBeVisible({ timeout: 70_000 });
  const id = new URL(page.url()).pathname.split("/").at(-1) ?? "";
  const kept = await (await page.request.get(`/api/checks/${id}`)).text();
  expect(kept).toContain(next);
});

test("a reading can be skipped with a reason, taken out of turn, and undone", async ({ page }) => {
  const first = await toReading(page);
  await page.getByRole("button", { name: "Can’t do this one" }).click();
  await page.getByRole("button", { name: "I cannot reach it" }).click();
  await expect(async () => expect(await toReading(page)).not.toBe(first)).toPass({ timeout: 15_000 });
  await firstReading(page);
  expect(await readingsSoFar(page)).toBe(1);
  await toReading(page);
  await expect(async () => {
    await page.getByRole("button", { name: "Undo" }).click();
    expect(await readingsSoFar(page)).toBe(0);
  }).toPass({ timeout: 15_000 });
});

test("the whole reading can be entered by the keypad alone", async ({ page }) => {
  const check = await toReading(page);
  for (const key of ["1", "2", "Decimal point", "5"]) await page.getByRole("button", { name: key, exact: true }).click();
  await expect(field(page)).toHaveValue("12.5");
  await page.getByRole("button", { name: "Back one" }).click();
  await page.getByRole("button", { name: "6", exact: true }).click();
  await expect(field(page)).toHaveValue("12.6");
  await enter(page).click();
  await expect(async () => expect(await readScreen(page)).not.toEqual({ type: "reading", check })).toPass({ timeout: 15_000 });
});
