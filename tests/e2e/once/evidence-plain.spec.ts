import { expect, test } from "@playwright/test";
import { signIn } from "../support/people";
import { apart, evidence, openFinished } from "../support/verdict";

test("a verdict's evidence and what tells two apart need no script", async ({ browser, page }) => {
  await signIn(page, "everyRole");
  await openFinished(page, /wire to . open/i);
  const address = page.url(), plain = await browser.newContext({ javaScriptEnabled: false, storageState: await page.context().storageState() });
  const still = await plain.newPage();
  await still.goto(address);
  await evidence(still).getByRole("link", { name: /sound/i }).click();
  await expect(evidence(still)).toContainText("If the wiring and the device are sound");
  await apart(still).getByRole("button", { name: "Show" }).click();
  await expect(apart(still)).toContainText(/It would (settle it|help)|Nothing that a meter can do/);
  await plain.close();
});
