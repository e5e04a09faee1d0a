import { expect, test } from "@playwright/test";
import { expectAccessible, expectNoSidewaysScroll } from "./support/accessible";
import { signIn } from "./support/people";
import { machine, startUnknown, takeReadings } from "./support/run-check";
import { apart, evidence, openFinished } from "./support/verdict";

test.describe.configure({ timeout: 240_000 });

test("a verdict shows what carries it, the evidence for any finding, and what tells two apart", async ({ page }) => {
  await signIn(page, "everyRole");
  await openFinished(page, /wire to . open/i);
  await expect(evidence(page)).toContainText(/readings alone carr|needs every one of its|rests on this one reading/);
  await expect(evidence(page)).toContainText(/it would read .+/i);
  await expect(evidence(page)).toContainText(/That made this (about|more than) \d+.* times more likely/);

  await evidence(page).getByRole("link", { name: /sound/i }).click();
  await expect(page).toHaveURL(/finding=none/);
  await expect(evidence(page)).toContainText("If the wiring and the device are sound");
  await expect(evidence(page)).toContainText(/That rules this out, unless the reading is wrong\.|The other readings speak against this too/);
  await expect(evidence(page)).toContainText(/times the meter's limit of error/);
  await expectAccessible(page, "evidence against sound");
  await expectNoSidewaysScroll(page);

  await apart(page).getByLabel("This", { exact: true }).selectOption({ index: 0 });
  await apart(page).getByLabel("or this").selectOption({ index: 1 });
  await apart(page).getByRole("button", { name: "Show" }).click();
  await expect(page).toHaveURL(/one=.+&other=.+#apart/);
  await expect(apart(page)).toContainText(/It would (settle it|help)|Nothing that a meter can do will tell these apart/);
  await expectAccessible(page, "two told apart");
  await expectNoSidewaysScroll(page);

  await page.getByRole("link", { name: "Report" }).click();
  await page.emulateMedia({ media: "print" });
  await expect(page.getByRole("main")).toContainText(/readings alone carr|needs every one of its|rests on this one reading/);
});

test("a running check gives its reasons on demand, without a server", async ({ page, context }) => {
  await signIn(page, "technician");
  await startUnknown(page);
  await takeReadings(page, machine("potentiometer with an open wire"), 3);
  await context.setOffline(true);
  await page.getByRole("button", { expanded: false, name: /All$/ }).click();
  const details = page.locator("#standing-details");
  await details.getByRole("button", { name: "Device and wiring sound" }).click();
  await expect(details).toContainText("If the wiring and the device are sound", { timeout: 30_000 });
  await expect(details).toContainText(/It would read|The answer would be/);
  await details.getByRole("button", { name: "Find the fewest that are enough" }).click();
  await expect(details).toContainText(/carr(y|ies) the verdict|needs every one|Nothing is settled yet|rests on this one/, { timeout: 60_000 });
  await details.getByLabel("This", { exact: true }).selectOption({ index: 1 });
  await details.getByLabel("or this").selectOption({ index: 2 });
  await expect(details).toContainText(/It would (settle it|help)|Nothing that a meter can do/, { timeout: 30_000 });
  await expectAccessible(page, "reasons of a running check");
  await expectNoSidewaysScroll(page);
  const low = await details.getByRole("button").or(details.getByRole("combobox")).evaluateAll((all) => all.map((one) => one.getBoundingClientRect().height).filter((height) => height < 95.5));
  expect(low).toEqual([]);
  await context.setOffline(false);
});
