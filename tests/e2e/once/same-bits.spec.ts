import { expect, test } from "@playwright/test";
import type { Run } from "@/lib/checks/run";
import { effectiveReadings, engineSetup } from "@/lib/checks/run-state";
import { assess, vocabulary } from "@/lib/diagnosis";
import { signIn } from "../support/people";
import { answerAll, machine, startUnknown } from "../support/run-check";

test.describe.configure({ timeout: 240_000 });

test("the phone and the server believe the same, to the last bit", async ({ page }) => {
  await signIn(page, "technician");
  await startUnknown(page);
  await answerAll(page, machine("sound PWM sensor"));
  const asked = page.waitForRequest((request) => request.url().endsWith("/finish") && request.method() === "POST");
  await page.getByRole("button", { name: "See the verdict" }).click();
  const { standing, experience } = (await asked).postDataJSON() as { standing: Record<string, unknown>; experience: unknown };
  await expect(page.getByRole("heading", { level: 1, name: "Verdict" })).toBeVisible({ timeout: 20_000 });

  const id = new URL(page.url()).pathname.split("/").at(-1) ?? "";
  const kept = (await (await page.request.get(`/api/checks/${id}`)).json()) as Pick<Run, "setup" | "steps">;
  // The demo workshop has confirmed checks: both counted the same ones in, or they would not have been compared.
  expect(kept.setup.experience).toBeDefined();
  expect(experience).toEqual(kept.setup.experience);
  const here = JSON.parse(JSON.stringify(assess(engineSetup(kept, vocabulary()), effectiveReadings(kept.steps)))) as Record<string, unknown>;
  expect(Object.keys(standing)).toEqual(expect.arrayContaining(["kinds", "pins", "faults"]));
  for (const [part, value] of Object.entries(standing)) expect(here[part], part).toEqual(value);
});
