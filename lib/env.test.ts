import { describe, expect, it } from "vitest";
import { parseEnv } from "./env";

const SECRET = "s".repeat(32);

describe("settings", () => {
  it.each([
    ["PINWRIGHT_ENV is production", { PINWRIGHT_ENV: "production" }],
    ["only NODE_ENV is production", { NODE_ENV: "production" }],
    ["the secret is empty", { NODE_ENV: "production", SESSION_SECRET: "" }],
  ])("refuse production without a secret of its own: %s", (_what, source) => {
    expect(() => parseEnv(source)).toThrow("SESSION_SECRET is not set");
  });

  it("refuse a short secret", () => {
    expect(() => parseEnv({ PINWRIGHT_ENV: "production", SESSION_SECRET: "short" })).toThrow("at least 32");
  });

  it("take production with its secret, and a built server told to be local", () => {
    expect(parseEnv({ NODE_ENV: "production", SESSION_SECRET: SECRET })).toMatchObject({ production: true, development: false, sessionSecret: SECRET });
    expect(parseEnv({ NODE_ENV: "production", PINWRIGHT_ENV: "local", SESSION_SECRET: SECRET })).toMatchObject({ production: false });
  });

  it("need nothing at all locally, and keep the secret they make", () => {
    const first = parseEnv({});
    expect(first).toMatchObject({ production: false, databaseUrl: "file:./data/pinwright.db", trustedProxyHops: 0, appOrigin: undefined });
    expect(first.sessionSecret.length).toBeGreaterThanOrEqual(32);
    expect(parseEnv({}).sessionSecret).toBe(first.sessionSecret);
  });

  it.each([
    [{ DATABASE_URL: "mysql://x" }, "DATABASE_URL"],
    [{ APP_ORIGIN: "not an address" }, "APP_ORIGIN"],
    [{ TRUSTED_PROXY_HOPS: "many" }, "TRUSTED_PROXY_HOPS"],
    [{ PINWRIGHT_ENV: "staging" }, "PINWRIGHT_ENV"],
    [{ FIRST_ADMIN_EMAIL: "x" }, "FIRST_ADMIN_EMAIL"],
  ])("name what is malformed: %j", (source, name) => {
    expect(() => parseEnv({ SESSION_SECRET: SECRET, ...source })).toThrow(name);
  });
});
