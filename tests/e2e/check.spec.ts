import { expect, test, type Page } from "@playwright/test";
import { expectAccessible, expectNoSidewaysScroll } from "./support/accessible";
import type { Screen } from "./support/lead-card";
import { signIn } from "./support/people";
import { answerAll, enter, field, giveReading, machine, startUnknown, takeReadings, toReading } from "./support/run-check";

test.describe.configure({ timeout: 240_000 });

const NAMED = /^(It is|Most likely it is) an? /;
const CASES = [
  { name: "potentiometer with an open wire", says: NAMED, kind: /potentiometer/i, finding: /wire.*(open|broken)|open.*wire/i },
  { name: "sound PWM sensor", says: NAMED, kind: /PWM/i, finding: /sound|no fault|nothing wrong/i },
  { name: "voltage sensor with a bad joint", says: NAMED, kind: /voltage/i, finding: /joint|resist/i },
  // With its signal on ground a device shows hardly any output to tell its kind by: the finding is sure, the kind is not.
  { name: "voltage sensor with a short to ground", says: /^Most likely it is /, kind: /voltage/i, finding: /shorted to ground/i },
] as const;

/** A screen's sort: what is measured where, without pins and position. */
const sortOf = (screen: Screen): string => (screen.type === "reading" ? screen.check.split(":").slice(0, 2).join(":") : screen.type);

/** Sorts of screens looked at so far at this size: every size has workers of its own. */
const seen = new Set<string>();

/** Every sort of screen of a running check is accessible, and fits; each is looked at once. */
async function look(page: Page, screen: Screen): Promise<void> {
  if (seen.has(sortOf(screen))) return;
  seen.add(sortOf(screen));
  await expectAccessible(page, sortOf(screen));
  await expectNoSidewaysScroll(page);
}

for (const { name, says, kind, finding } of CASES) {
  test(`an unknown device is led to its verdict: ${name}`, async ({ page }) => {
    await signIn(page, "technician");
    await startUnknown(page);
    const bench = machine(name);
    const readings = await answerAll(page, bench, (screen) => look(page, screen));
    expect(seen.size).toBeGreaterThan(3);
    expect(readings).toBeGreaterThan(3);
    expect(readings).toBeLessThan(25);

    await page.getByRole("button", { name: "See the verdict" }).click();
    await expect(page.getByRole("heading", { level: 1, name: "Verdict" })).toBeVisible({ timeout: 20_000 });
    const sentence = page.getByRole("main").getByText(says).first();
    await expect(sentence).toHaveText(kind);
    await expect(sentence).toHaveText(finding);
    for (const [role, pin] of Object.entries(bench.truth.pins)) {
      const row = page.getByRole("row").filter({ hasText: new RegExp(role, "i") }).first();
      await expect(row, role).toContainText(String(pin));
      await expect(sentence).toContainText(`${role} on ${pin}`);
    }
    await expectAccessible(page, `verdict of ${name}`);
    await expectNoSidewaysScroll(page);
  });
}

test("keys and buttons of a check are 96 pixels high or more; on a phone card, field and keypad stand on one screen, and an error stays in sight", async ({ page }, { project }) => {
  await signIn(page, "technician");
  await startUnknown(page);
  const low = async () => (await page.getByRole("main").getByRole("button").filter({ visible: true }).evaluateAll((buttons) => buttons
    .map((button) => ({ name: button.getAttribute("aria-label") ?? button.textContent, height: button.getBoundingClientRect().height }))
    .filter(({ height }) => height < 95.5)));
  expect(await low()).toEqual([]);
  if (await page.getByRole("button", { name: /^Done/ }).isVisible()) await page.getByRole("button", { name: /^Done/ }).click();
  await expect(page.getByRole("group", { name: "Keypad" })).toBeVisible();
  expect(await low()).toEqual([]);

  await expect(enter(page)).toBeVisible();
  if (project.name === "phone") {
    await expect(page.getByRole("heading", { level: 1 })).toBeInViewport({ ratio: 1 });
    await expect(enter(page)).toBeInViewport({ ratio: 1 });
  }
  await field(page).fill("12 bananas");
  await enter(page).click();
  await expect(page.getByRole("alert").filter({ hasText: "bananas" })).toBeInViewport({ ratio: 1 });
  await expect(field(page)).toBeInViewport({ ratio: 1 });
});

test("a mistyped reading is named as soon as others contradict it; taken again, the contradiction is gone", async ({ page }) => {
  await signIn(page, "technician");
  await startUnknown(page);
  const bench = machine("potentiometer with an open wire"), asked = await toReading(page), right = bench.readings[asked];
  if (typeof right !== "number") throw new Error(`${asked} reads no number`);
  // The kilo twice: "7.14k" on a meter that already shows kilohms, entered as 7140k.
  await giveReading(page, { ...bench, readings: { ...bench.readings, [asked]: right * 1000 } }, asked);
  const banner = page.getByRole("status").filter({ hasText: "These readings contradict each other" });
  for (let taken = 0; taken < 6 && !(await banner.isVisible()); taken += 1) await takeReadings(page, bench, 1);
  await expect(banner).toContainText(/Take this one again: Resistance, device pin \d to pin \d, actuator at full travel\./);
  await expect(page.locator("[data-standing-strip]")).toContainText("The readings contradict each other");
  await expectAccessible(page, "contradiction");
  await expectNoSidewaysScroll(page);
  await banner.getByRole("button", { name: "Take it again" }).click();
  expect(await toReading(page)).toBe(asked);
  await giveReading(page, bench, asked);
  await expect(banner).toHaveCount(0);
  await expect(page.locator("[data-standing-strip]")).not.toContainText("contradict");
});

test("the drawing of the wiring is whole each time it is opened", async ({ page }, { project }) => {
  await signIn(page, "technician");
  await startUnknown(page);
  const narrow = project.name === "phone";
  for (let time = 0; time < 3; time += 1) {
    if (narrow) await page.getByRole("button", { name: "Show drawing" }).click();
    const drawing = page.getByRole("img", { name: /^Controller, three wires/ });
    const frame = await drawing.boundingBox();
    for (const part of ["Controller", "Device"]) {
      const box = drawing.getByText(part, { exact: true });
      await expect(box).toBeVisible();
      await expect(async () => {
        const place = await box.boundingBox();
        expect(place && frame && place.x >= frame.x && place.y + place.height <= frame.y + frame.height).toBe(true);
        expect(place?.height).toBeGreaterThan(15);
      }).toPass({ timeout: 5_000 });
    }
    if (narrow) await page.getByRole("dialog").getByRole("button", { name: "Close" }).click();
  }
});
