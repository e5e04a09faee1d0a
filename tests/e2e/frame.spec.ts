import { expect, test, type Page } from "@playwright/test";
import { expectAccessible, expectNoSidewaysScroll } from "./support/accessible";
import { PEOPLE, signIn, signInByForm } from "./support/people";

/** What the browser complains of: scripts and styles stopped by the content security policy, errors of our own. */
function complaints(page: Page): string[] {
  const heard: string[] = [];
  page.on("console", (message) => { if (message.type() === "error") heard.push(message.text()); });
  page.on("pageerror", (error) => heard.push(error.message));
  return heard;
}

test("every page runs under the content security policy without a complaint", async ({ page }) => {
  const heard = complaints(page);
  await page.goto("/");
  await signInByForm(page, "everyRole");
  for (const path of ["/today", "/account", "/workshop"]) {
    await page.goto(path, { waitUntil: "networkidle" });
    await expectAccessible(page, path);
    await expectNoSidewaysScroll(page);
  }
  expect(heard).toEqual([]);
});

test("headers: a nonce of its own each time, no frames, no sniffing; HSTS and the __Host- cookie over HTTPS only", async ({ request }) => {
  const [first, second] = [await request.get("/sign-in"), await request.get("/sign-in")];
  const policies = [first, second].map((response) => response.headers()["content-security-policy"] ?? "");
  expect(policies[0]).toMatch(/script-src 'self' 'nonce-[\w+/=]{20,}' 'strict-dynamic';/);
  expect(policies[0]).not.toBe(policies[1]);
  expect(policies[0]).toContain("frame-ancestors 'none'");
  expect(first.headers()).toMatchObject({ "x-content-type-options": "nosniff", "referrer-policy": "same-origin", "x-frame-options": "DENY" });
  expect(first.headers()["permissions-policy"]).toContain("geolocation=()");
  expect(first.headers()["strict-transport-security"]).toBeUndefined();
  const secure = await request.get("/sign-in", { headers: { "x-forwarded-proto": "https" } });
  expect(secure.headers()["strict-transport-security"]).toContain("max-age=");
});

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

test("night colours are kept in this browser and keep their contrast", async ({ page }) => {
  await signIn(page, "everyRole");
  await page.goto("/account");
  await page.getByRole("button", { name: /^Night/ }).click();
  await expect(page.locator("html")).toHaveAttribute("data-theme", "night");
  for (const path of ["/account", "/today", "/checks/chances", "/workshop", "/sign-in"]) {
    await page.goto(path);
    await expect(page.locator("html")).toHaveAttribute("data-theme", "night");
    await expectAccessible(page, `${path} at night`);
  }
});

test("another browser is signed out from the account page, at once", async ({ page, browser }, { project }) => {
  // A person of its own for each screen size: both run at the same time, and each would end the other's session.
  const who = project.name === "phone" ? "otherTechnician" : "trainer";
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

test("the keyboard reaches the content first, and every focused thing is seen", async ({ page }) => {
  await signIn(page, "technician");
  await page.goto("/today");
  await page.keyboard.press("Tab");
  const skip = page.getByRole("link", { name: "Skip to content" });
  await expect(skip).toBeFocused();
  await page.keyboard.press("Enter");
  await page.keyboard.press("Tab");
  await expect(page.getByRole("link", { name: "Start a check" })).toBeFocused();
  await expect(page.getByRole("link", { name: "Start a check" })).toHaveCSS("outline-style", "solid");
  await expect(page.getByRole("navigation", { name: "Places" }).locator("[aria-current=page]").filter({ visible: true })).toHaveText("Today");
});

test("pages refuse what is no form of theirs with a code", async ({ request, baseURL }) => {
  const own = { origin: baseURL ?? "" };
  const refused: readonly [number, string, Parameters<typeof request.post>[1]][] = [
    [403, "foreign-origin", { multipart: { a: "b" } }],
    [403, "foreign-origin", { headers: { origin: "https://elsewhere.example" }, multipart: { a: "b" } }],
    [405, "method-not-allowed", { headers: own, data: { a: 1 } }],
    [400, "malformed-form", { headers: { ...own, "next-action": "60".padEnd(42, "a") }, multipart: { "0": "[" } }],
    [413, "body-too-large", { headers: own, multipart: { a: "x".repeat(300_000) } }],
  ];
  for (const [status, code, options] of refused) {
    const response = await request.post("/sign-in", options);
    expect([response.status(), ((await response.json()) as { error: { code: string } }).error.code]).toEqual([status, code]);
  }
});
