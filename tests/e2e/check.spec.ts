import { expect, test } from "@playwright/test";
import { expectAccessible, expectNoSidewaysScroll } from "./support/accessible";
import { signIn } from "./support/people";
import { answerAll, machine, startUnknown } from "./support/run-check";

test.describe.configure({ timeout: 240_000 });

const CASES = [
  { name: "potentiometer with an open wire", kind: /potentiometer/i, finding: /wire.*(open|broken)|open.*wire/i },
  { name: "sound PWM sensor", kind: /PWM/i, finding: /sound|no fault|nothing wrong/i },
  { name: "voltage sensor with a short to ground", kind: /voltage/i, finding: /short/i },
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
  await answerAll(page, machine("voltage sensor with a short to ground"), async (screen) => {
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
