import { expect, test } from "@playwright/test";
import { signIn } from "../support/people";

test("a technician is refused the workshop's people, in words, and nothing of them is sent", async ({ page }) => {
  await signIn(page, "technician");
  await page.goto("/workshop");
  await expect(page.getByRole("heading", { level: 1 })).toHaveText(/do not allow/);
  await expect(page.getByText("joram@canal-workshop.example")).toHaveCount(0);
});

test("an administrator without a technician's role cannot start a check, by page or by request", async ({ page }) => {
  await signIn(page, "administrator");
  await page.goto("/checks/new");
  await expect(page.getByRole("heading", { level: 1 })).toHaveText(/do not allow/);
  const origin = new URL(page.url()).origin;
  const answer = await page.request.post("/api/checks", {
    headers: { origin }, data: { id: "01K5ZZZZZZZZZZZZZZZZZZZZZZ", setup: { cavityLabels: ["1", "2", "3"] }, startedAt: "2026-11-02T09:00:00.000Z" },
  });
  expect(answer.status()).toBe(403);
  expect(await answer.json()).toMatchObject({ error: { code: "not-allowed" } });
});

test("a request of a stranger, or from another place, is refused with a code", async ({ page, playwright }) => {
  await page.goto("/sign-in");
  const origin = new URL(page.url()).origin;
  const stranger = await playwright.request.newContext();
  const unsigned = await stranger.post(`${origin}/api/assess`, { headers: { origin }, data: { setup: { pins: ["1", "2", "3"] }, readings: [] } });
  expect(unsigned.status()).toBe(401);
  const foreign = await stranger.post(`${origin}/api/assess`, { headers: { origin: "https://elsewhere.example" }, data: {} });
  expect(foreign.status()).toBe(403);
  await stranger.dispose();
});
