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

/** Sessions of this worker, so that the tests do not run into the limit on sign-ins. */
const sessions = new Map<string, Cookies>();

/** Signs in by the form, as a person does, and ends on Today. */
export async function signInByForm(page: Page, who: keyof typeof PEOPLE): Promise<void> {
  await page.goto("/sign-in");
  await page.getByLabel("E-mail address").fill(PEOPLE[who]);
  await page.getByLabel("Password").fill(PASSWORD);
  await page.getByRole("button", { name: "Sign in" }).click();
  await expect(page.getByRole("heading", { level: 1, name: "Today" })).toBeVisible();
}

/** Signed in as one of the demo people; by the form the first time, with the same session after that. */
export async function signIn(page: Page, who: keyof typeof PEOPLE): Promise<void> {
  const kept = sessions.get(who);
  if (kept) return page.context().addCookies(kept);
  await signInByForm(page, who);
  sessions.set(who, await page.context().cookies());
}
