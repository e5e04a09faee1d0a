import { expect, test } from "@playwright/test";
import { expectAccessible, expectNoSidewaysScroll } from "./support/accessible";
import { signIn } from "./support/people";
import { answerAll, enter, field, machine, startUnknown } from "./support/run-check";

test.describe.configure({ timeout: 240_000 });

const CASES = [
  { name: "potentiometer with an open wire", kind: /potentiometer/i, finding: /wire.*(open|broken)|open.*wire/i },
  { name: "sound PWM sensor", kind: /PWM/i, finding: /sound|no fault|nothing wrong/i },
  { name: "voltage sensor with a bad joint", kind: /voltage/i, finding: /joint|resist/i },
] as const;

for (const { name, kind, finding } of CASES) {
  test(`an unknown device is led to its verdict: ${name}`, async ({ page }) => {
    await signIn(page, "technician");
    await startUnknown(page);
    const bench = machine(name);
    const readings = await answerAll(page, bench);
    expect(readings).toBeGreaterThan(3);
    expect(readings).toBeLessThan(25);

    await page.getByRole("button", { name: "See the verdict" }).click();
    await expect(page.getByRole("heading", { level: 1, name: "Verdict" })).toBeVisible({ timeout: 20_000 });
    const sentence = page.getByRole("main").getByText(/^(It is|Most likely it is) an? /).first();
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

test("every kind of screen of a running check is accessible, and fits", async ({ page }) => {
  await signIn(page, "technician");
  await page.goto("/checks/new");
  await expectAccessible(page, "what do you have");
  await expectNoSidewaysScroll(page);
  await startUnknown(page);
  const seen = new Set<string>();
  await answerAll(page, machine("voltage sensor with a bad joint"), async (screen) => {
    const sort = screen.type === "reading" ? screen.check.split(":").slice(0, 2).join(":") : screen.type;
    if (seen.has(sort)) return;
    seen.add(sort);
    await expectAccessible(page, sort);
    await expectNoSidewaysScroll(page);
  });
  expect(seen.size).toBeGreaterThan(3);
});

test("keys and buttons of a check are 96 pixels high or more", async ({ page }) => {
  await signIn(page, "technician");
  await startUnknown(page);
  const low = async () => (await page.getByRole("main").getByRole("button").filter({ visible: true }).evaluateAll((buttons) => buttons
    .map((button) => ({ name: button.getAttribute("aria-label") ?? button.textContent, height: button.getBoundingClientRect().height }))
    .filter(({ height }) => height < 95.5)));
  expect(await low()).toEqual([]);
  if (await page.getByRole("button", { name: /^Done/ }).isVisible()) await page.getByRole("button", { name: /^Done/ }).click();
  await expect(page.getByRole("group", { name: "Keypad" })).toBeVisible();
  expect(await low()).toEqual([]);
});

test("on a phone lead card, field and the whole keypad stand on one screen, and an error stays in sight", async ({ page }, { project }) => {
  await signIn(page, "technician");
  await startUnknown(page);
  if (await page.getByRole("button", { name: /^Done/ }).isVisible()) await page.getByRole("button", { name: /^Done/ }).click();
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
