import { expect, test, type Page } from "@playwright/test";
import { expectAccessible, expectNoSidewaysScroll } from "./support/accessible";
import { signIn } from "./support/people";
import { enter, field, startUnknown } from "./support/run-check";

test.describe.configure({ timeout: 240_000 });

/** Takes a reading that was not proposed: by its title in the list of all readings. A word is a key, a number is typed. */
async function takeOutOfTurn(page: Page, group: RegExp, title: string, value: string | RegExp): Promise<void> {
  await page.getByRole("button", { name: "Another reading" }).click();
  const dialog = page.getByRole("dialog");
  const all = dialog.locator("details").filter({ has: page.locator("summary", { hasText: group }) });
  if ((await all.getAttribute("open")) === null) await all.locator("summary").click();
  await all.getByRole("button", { name: title, exact: true }).click();
  const done = page.getByRole("button", { name: /^Done/ }), answer = typeof value === "string" ? field(page) : page.getByRole("button", { name: value });
  await expect(done.or(answer).first()).toBeVisible();
  if (await done.isVisible()) await done.click();
  if (typeof value !== "string") return answer.click();
  await answer.fill(value);
  await enter(page).click();
}

const LIVE_PARTED = /power on.*connector parted.*mated/i, LIVE_MATED = /power on.*device connector mated/i, COLD_PARTED = /power off.*device connector parted.*controller connector mated/i;

test("a current loop is refused, with what to do, on every page that shows the check", async ({ page }) => {
  await signIn(page, "technician");
  await startUnknown(page);
  // NAMUR NE43: 4 and 20 mA across 250 ohm are 1 and 5 V (Ohm's law).
  await takeOutOfTurn(page, LIVE_PARTED, "Voltage, harness cavity 1 to battery negative", "24.1");
  await takeOutOfTurn(page, LIVE_PARTED, "Voltage, harness cavity 2 to battery negative", "0");
  await takeOutOfTurn(page, COLD_PARTED, "Resistance, harness cavity 2 to battery negative", "250.4");
  await takeOutOfTurn(page, LIVE_MATED, "Voltage, cavity 2, back-probed, connector mated, actuator at rest", "1");
  await takeOutOfTurn(page, LIVE_MATED, "Voltage, cavity 2, back-probed, connector mated, actuator at full travel", "5");
  await expect(page.getByRole("heading", { level: 1, name: "Enough is known" })).toBeVisible({ timeout: 20_000 });
  await expect(page.locator("[data-standing-strip]")).toContainText("Not one of the three: two-wire current loop");
  await expectAccessible(page, "closing screen of a refusal");
  await page.getByRole("button", { name: "See the verdict" }).click();
  await expect(page.getByRole("heading", { level: 1, name: "Verdict" })).toBeVisible({ timeout: 20_000 });
  await expect(page.getByRole("main")).toContainText("Not one of the three kinds: it reads like a two-wire current loop of 4 to 20 mA.");
  await expect(page.getByRole("main")).toContainText("Sound is 3.8 to 20.5 mA");
  await expect(page.getByRole("main")).not.toContainText("Pins of the device");
  await expectAccessible(page, "verdict of a refusal");
  await expectNoSidewaysScroll(page);
  const path = new URL(page.url()).pathname;
  await page.goto(`${path}/report`);
  await expect(page.getByRole("main")).toContainText("loop calibrator");
  await expectAccessible(page, "report of a refusal");
  await page.goto("/checks");
  await expect(page.getByRole("main").getByText("Not one of the three: two-wire current loop.").first()).toBeVisible();
});

test("a colour, a message, a reading half way and AC volts go in out of turn, and too many AC volts stop the check", async ({ page }) => {
  await signIn(page, "technician");
  await startUnknown(page);
  await takeOutOfTurn(page, /nothing measured/i, "Seen, colour of the wire at 1", /^RD/);
  await takeOutOfTurn(page, /nothing measured/i, "Seen, fault message on the controller's display", /^3$/);
  await takeOutOfTurn(page, LIVE_MATED, "Voltage, cavity 1, back-probed, connector mated, actuator half way", "0.02");
  await takeOutOfTurn(page, LIVE_MATED, "AC voltage, cavity 1, back-probed, connector mated, actuator at rest", "231");
  await expect(page.getByRole("heading", { level: 1, name: "Stop" })).toBeVisible({ timeout: 20_000 });
  await expectAccessible(page, "stop");
  await page.getByRole("button", { name: "See the verdict" }).click();
  await expect(page.getByRole("main")).toContainText("Above 30 V a.c. or 60 V d.c. this tool ends.", { timeout: 20_000 });
  await expect(page.getByRole("main")).toContainText("licensed person");
  await expectAccessible(page, "verdict of a stop");
});
