import { expect, test } from "@playwright/test";
import { PEOPLE, signInByForm } from "../support/people";

test("signing in works without a script, and its cookie is small and closed to scripts", async ({ browser, baseURL }) => {
  const context = await browser.newContext({ javaScriptEnabled: false });
  const page = await context.newPage();
  await page.goto("/sign-in");
  await page.getByLabel("E-mail address").fill("not an address");
  await page.getByLabel("Password").fill("lock-paddle-27");
  await page.getByRole("button", { name: "Sign in" }).click();
  await expect(page.getByText("Enter an e-mail address such as").first()).toBeVisible();
  await page.getByLabel("E-mail address").fill(PEOPLE.technician);
  await page.getByLabel("Password").fill("lock-paddle-27");
  await page.getByRole("button", { name: "Sign in" }).click();
  await expect(page.getByRole("heading", { level: 1, name: "Today" })).toBeVisible();
  const [cookie] = (await context.cookies(baseURL)).filter(({ name }) => name === "pinwright_session");
  expect(cookie).toMatchObject({ httpOnly: true, sameSite: "Lax", path: "/", secure: false });
  expect((cookie?.value.length ?? 0) + "pinwright_session".length).toBeLessThan(1024);
  await context.close();
});

test("over HTTPS the session is a __Host- cookie", async ({ request, baseURL }) => {
  const html = await (await request.get("/sign-in")).text();
  const hidden = [...html.matchAll(/<input type="hidden" name="([^"]+)"(?: value="([^"]*)")?/g)];
  expect(hidden.length).toBeGreaterThan(0);
  const fields = Object.fromEntries(hidden.map(([, name = "", value = ""]) => [name, value.replaceAll("&quot;", '"')]));
  const answer = await request.post("/sign-in", {
    headers: { origin: baseURL ?? "", "x-forwarded-proto": "https" }, maxRedirects: 0,
    multipart: { ...fields, email: PEOPLE.technician, password: "lock-paddle-27" },
  });
  const cookies = answer.headersArray().filter(({ name }) => name.toLowerCase() === "set-cookie").map(({ value }) => value);
  const session = cookies.find((cookie) => cookie.includes("pinwright_session=")) ?? "";
  expect(session).toMatch(/^__Host-pinwright_session=/);
  for (const part of ["Secure", "HttpOnly", "Path=/", "SameSite=lax"]) expect(session.toLowerCase()).toContain(part.toLowerCase());
  expect(session).not.toMatch(/domain=/i);
});

test("the form says what is wrong before it is sent", async ({ page }) => {
  await page.goto("/sign-in");
  await page.getByRole("button", { name: "Sign in" }).click();
  await expect(page.getByText("Enter your e-mail address.")).toBeVisible();
  await expect(page.getByText("Enter your password.")).toBeVisible();
  await expect(page.getByLabel("E-mail address")).toBeFocused();
});

test("another browser is signed out from the account page, at once", async ({ page, browser }) => {
  // A person whose session no other test uses: it ends them all.
  const who = "otherTechnician";
  const context = await browser.newContext();
  const other = await context.newPage();
  await signInByForm(other, who);
  await signInByForm(page, who);
  await page.goto("/account");
  await page.getByRole("button", { name: "Sign out everywhere else" }).click();
  // The button changes its words while it works; the other browsers leave the list once it is done.
  await expect(page.getByRole("region", { name: "Where you are signed in" }).getByRole("button")).toHaveCount(0);
  await other.goto("/today");
  await expect(other).toHaveURL(/sign-in/);
  await page.goto("/today");
  await expect(page.getByRole("heading", { level: 1, name: "Today" })).toBeVisible();
  await context.close();
});

test("what is behind sign-in sends a stranger to sign-in", async ({ page }) => {
  for (const path of ["/today", "/catalogue", "/checks", "/checks/new", "/machines", "/workshop", "/account"]) {
    await page.goto(path);
    await expect(page, path).toHaveURL(/sign-in/);
  }
});
