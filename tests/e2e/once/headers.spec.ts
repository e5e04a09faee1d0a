import { expect, test } from "@playwright/test";

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
