import { existsSync, readFileSync, renameSync, writeFileSync } from "node:fs";
import path from "node:path";
import { expect, type BrowserContext, type Page } from "@playwright/test";

/** The demo workshop's people that the browser tests act as; README lists them with their password. */
export const PEOPLE = {
  technician: "tilda@canal-workshop.example",
  otherTechnician: "joram@canal-workshop.example",
  trainer: "tomas@canal-workshop.example",
  administrator: "ana@canal-workshop.example",
  everyRole: "wim@canal-workshop.example",
} as const;

const PASSWORD = "lock-paddle-27";

type Cookies = Awaited<ReturnType<BrowserContext["cookies"]>>;

/** Where a person's session is kept for all workers of this run, so that nobody runs into the limit on sign-ins. */
function sessionFile(who: keyof typeof PEOPLE): string {
  if (!process.env.E2E_FOLDER) throw new Error("E2E_FOLDER is set by playwright.config.ts");
  return path.join(process.env.E2E_FOLDER, `session-${who}.json`);
}

/** Signs in by the form, as a person does, and ends on Today. */
export async function signInByForm(page: Page, who: keyof typeof PEOPLE): Promise<void> {
  await page.goto("/sign-in");
  await page.getByLabel("E-mail address").fill(PEOPLE[who]);
  await page.getByLabel("Password").fill(PASSWORD);
  await page.getByRole("button", { name: "Sign in" }).click();
  await expect(page.getByRole("heading", { level: 1, name: "Today" })).toBeVisible();
}

/** Signed in as one of the demo people; by the form the first time in this run, with the same session after that. */
export async function signIn(page: Page, who: keyof typeof PEOPLE): Promise<void> {
  const file = sessionFile(who);
  if (existsSync(file)) return page.context().addCookies(JSON.parse(readFileSync(file, "utf8")) as Cookies);
  await signInByForm(page, who);
  // Renamed into place: the other worker never reads half a file.
  writeFileSync(`${file}.${process.pid}`, JSON.stringify(await page.context().cookies()));
  renameSync(`${file}.${process.pid}`, file);
}
