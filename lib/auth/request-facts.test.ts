import { afterEach, beforeEach, describe, expect, it } from "vitest";
import { forgetEnv } from "@/lib/env";
import { isOwnRequest } from "./own-origin";
import { clientAddress, isHttps, PEER_HEADER } from "./request-facts";

const headers = (given: Record<string, string>) => new Headers(given);

beforeEach(() => {
  process.env.SESSION_SECRET = "s".repeat(32);
  forgetEnv();
});
afterEach(() => {
  delete process.env.TRUSTED_PROXY_HOPS;
  delete process.env.APP_ORIGIN;
  forgetEnv();
});

describe("the address limits count by", () => {
  it("is the peer; what the sender claims is not believed", () => {
    const given = headers({ [PEER_HEADER]: "203.0.113.5", "x-forwarded-for": "198.51.100.1, 198.51.100.2" });
    expect(clientAddress(given)).toBe("203.0.113.5");
  });

  it("is the entry our own proxies wrote, counted from the right", () => {
    process.env.TRUSTED_PROXY_HOPS = "1";
    forgetEnv();
    expect(clientAddress(headers({ [PEER_HEADER]: "10.0.0.1", "x-forwarded-for": "invented, 198.51.100.2" }))).toBe("198.51.100.2");
    process.env.TRUSTED_PROXY_HOPS = "2";
    forgetEnv();
    expect(clientAddress(headers({ [PEER_HEADER]: "10.0.0.1", "x-forwarded-for": "invented, 198.51.100.2, 10.0.0.2" }))).toBe("198.51.100.2");
    expect(clientAddress(headers({ [PEER_HEADER]: "10.0.0.1" }))).toBe("10.0.0.1");
  });

  it("is the /64 of an IPv6 address, and an embedded IPv4 address is itself", () => {
    const of = (peer: string) => clientAddress(headers({ [PEER_HEADER]: peer }));
    expect(of("2001:db8:1:2:3:4:5:6")).toBe(of("2001:0DB8:1:2::9"));
    expect(of("2001:db8:1:2::1")).not.toBe(of("2001:db8:1:3::1"));
    expect(of("::ffff:192.0.2.7")).toBe("192.0.2.7");
  });
});

describe("what may change anything", () => {
  it.each([
    ["own origin", { host: "checks.example", origin: "http://checks.example" }, true],
    ["own origin with a port", { host: "checks.example:3000", origin: "http://checks.example:3000" }, true],
    ["no origin, fetched from the same origin", { host: "checks.example", "sec-fetch-site": "same-origin" }, true],
    ["another origin", { host: "checks.example", origin: "https://elsewhere.example" }, false],
    ["another port", { host: "checks.example:3000", origin: "http://checks.example:3001" }, false],
    ["another origin that says it is the same", { host: "checks.example", origin: "https://elsewhere.example", "sec-fetch-site": "same-origin" }, false],
    ["an opaque origin", { host: "checks.example", origin: "null" }, false],
    ["same site only", { host: "checks.example", "sec-fetch-site": "same-site" }, false],
    ["typed into the address bar", { host: "checks.example", "sec-fetch-site": "none" }, false],
    ["neither", { host: "checks.example" }, false],
  ])("%s: %j", (_what, given, allowed) => {
    expect(isOwnRequest("POST", headers(given as Record<string, string>))).toBe(allowed);
    expect(isOwnRequest("DELETE", headers(given as Record<string, string>))).toBe(allowed);
    expect(isOwnRequest("GET", headers(given as Record<string, string>))).toBe(true);
  });

  it("is bound to the configured address when there is one, whatever the Host header says", () => {
    process.env.APP_ORIGIN = "https://checks.example/";
    forgetEnv();
    expect(isOwnRequest("POST", headers({ host: "checks.example", origin: "https://checks.example" }))).toBe(true);
    expect(isOwnRequest("POST", headers({ host: "elsewhere.example", origin: "https://elsewhere.example" }))).toBe(false);
    expect(isHttps(headers({}))).toBe(true);
  });

  it("HTTPS is what the nearest proxy says, or what the configured address says", () => {
    expect(isHttps(headers({ "x-forwarded-proto": "https" }))).toBe(true);
    expect(isHttps(headers({ "x-forwarded-proto": "http" }))).toBe(false);
    expect(isHttps(headers({}))).toBe(false);
  });
});
