import { beforeEach, describe, expect, it, vi } from "vitest";
import { z } from "zod";
import { action, route } from "@/lib/action";
import type { Person } from "@/lib/auth/permissions";
import { AppError } from "@/lib/errors";
import { parseInput } from "@/lib/parse";
import { eachTestOwnDatabase } from "../support/database";

const OWN = { host: "checks.example", origin: "http://checks.example" };
const request = vi.hoisted(() => ({ headers: new Headers(), person: null as Person | null }));

vi.mock("next/headers", () => ({ headers: async () => request.headers, cookies: async () => ({ get: () => undefined, set: () => undefined }) }));
vi.mock("@/lib/auth/cookies", () => ({ sessionCookie: async () => ({ sessionId: request.person ? "session" : undefined }) }));
vi.mock("@/lib/auth/session-rows", () => ({ personOfSession: async () => request.person }));

eachTestOwnDatabase();
beforeEach(() => {
  request.headers = new Headers(OWN);
  request.person = { id: "p", name: "P", email: "p@canal-workshop.example", roles: ["technician"] };
});

const echo = route("check:run", async ({ body }) => ({ got: parseInput(z.object({ n: z.number() }), body).n }));
const post = (body: BodyInit | null, given: Record<string, string> = {}) => echo(
  new Request("http://checks.example/api/echo", { method: "POST", body, headers: { ...OWN, "content-type": "application/json", ...given } }),
  { params: Promise.resolve({}) },
);
const answer = async (response: Response) => [response.status, ((await response.json()) as { error?: { code: string } }).error?.code];

describe("a route", () => {
  it("answers the verb's result as JSON that nobody keeps", async () => {
    const response = await post('{"n":4}');
    expect([response.status, await response.json(), response.headers.get("cache-control")]).toEqual([200, { got: 4 }, "no-store"]);
  });

  it.each([
    ["malformed JSON", "{", {}, [400, "malformed-json"]],
    ["bytes that are no UTF-8", new Uint8Array([0x22, 0xff, 0x22]), {}, [400, "malformed-json"]],
    ["another type of body", "n=4", { "content-type": "application/x-www-form-urlencoded" }, [415, "unsupported-media-type"]],
    ["no body", null, {}, [400, "invalid-input"]],
    ["a wrong type", '{"n":"4"}', {}, [400, "invalid-input"]],
    ["257 KB", `{"n":"${"x".repeat(257 * 1024)}"}`, {}, [413, "body-too-large"]],
    ["a foreign page", '{"n":4}', { origin: "http://elsewhere.example" }, [403, "foreign-origin"]],
  ] as const)("refuses %s", async (_what, body, given, expected) => {
    expect(await answer(await post(body, given))).toEqual(expected);
  });

  it("refuses the signed-out and those whose roles do not allow it", async () => {
    request.person = null;
    expect(await answer(await post('{"n":4}'))).toEqual([401, "not-signed-in"]);
    request.person = { id: "p", name: "P", email: "p@canal-workshop.example", roles: ["administrator"] };
    expect(await answer(await post('{"n":4}'))).toEqual([403, "not-allowed"]);
  });

  it("keeps a defect's words to itself", async () => {
    const broken = route("check:run", async () => { throw new Error("SELECT secret FROM people"); });
    const response = await broken(new Request("http://checks.example/api/x"), { params: Promise.resolve({}) });
    const text = await response.text();
    expect(response.status).toBe(500);
    expect(text).toContain("server-error");
    expect(text).not.toContain("secret");
  });
});

describe("an action", () => {
  it("returns the verb's result", async () => {
    expect(await action("check:run", async (person, input) => [person.id, input])(7)).toEqual({ ok: true, data: ["p", 7] });
  });

  it("returns coded errors with their fields and hides defects", async () => {
    const coded = await action("check:run", async () => { throw new AppError("too-wide", "Too wide.", 400, "width"); })(null);
    expect(coded).toEqual({ ok: false, error: { code: "too-wide", message: "Too wide.", fields: { width: "Too wide." } } });
    const defect = await action("check:run", async () => { throw new TypeError("undefined is not"); })(null);
    expect(defect).toMatchObject({ ok: false, error: { code: "server-error" } });
    expect(JSON.stringify(defect)).not.toContain("undefined is not");
  });

  it("runs nothing for a foreign page, the signed-out or the wrong role", async () => {
    const verb = vi.fn(async () => 1);
    request.headers = new Headers({ ...OWN, origin: "http://elsewhere.example" });
    expect(await action("check:run", verb)(null)).toMatchObject({ error: { code: "foreign-origin" } });
    request.headers = new Headers(OWN);
    expect(await action("people:manage", verb)(null)).toMatchObject({ error: { code: "not-allowed" } });
    request.person = null;
    expect(await action("check:run", verb)(null)).toMatchObject({ error: { code: "not-signed-in" } });
    expect(verb).not.toHaveBeenCalled();
  });
});
