import { expect, test } from "@playwright/test";
import { expectAccessible, expectNoSidewaysScroll } from "../support/accessible";
import { signIn } from "../support/people";
import { enter, field, startUnknown, toReading } from "../support/run-check";

test("where the browser's bars leave a phone 664 pixels of height, card, field, Enter and the first keys are in sight, and no key is lower", async ({ page }) => {
  await page.setViewportSize({ width: 390, height: 664 });
  await signIn(page, "technician");
  await startUnknown(page);
  await toReading(page);
  await expect(page.getByRole("heading", { level: 1 })).toBeInViewport({ ratio: 1 });
  for (const seen of [field(page), enter(page), ...["4", "5", "6", "7", "8", "9", "Decimal point"].map((name) => page.getByRole("button", { name, exact: true }))]) await expect(seen).toBeInViewport({ ratio: 1 });
  for (const name of ["0", "1", "2", "3"]) await expect(page.getByRole("button", { name, exact: true })).toBeInViewport({ ratio: 0.4 });
  const heights = await page.getByRole("group", { name: "Keypad" }).getByRole("button").evaluateAll((keys) => keys.map((key) => key.getBoundingClientRect().height));
  expect(heights).toHaveLength(18);
  expect(Math.min(...heights)).toBeGreaterThanOrEqual(95.5);
  await field(page).fill("12 bananas");
  await enter(page).click();
  await expect(page.getByRole("alert").filter({ hasText: "bananas" })).toBeInViewport({ ratio: 1 });
  await expect(enter(page)).toBeInViewport({ ratio: 1 });
  await expectAccessible(page, "reading on a short screen");
  await expectNoSidewaysScroll(page);
});
