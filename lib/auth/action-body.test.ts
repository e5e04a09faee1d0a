import { describe, expect, it } from "vitest";
import { ACTION_LIMIT, assertActionBody } from "./action-body";

const ID = "60".padEnd(42, "a");

async function codeOf(fields: Readonly<Record<string, string>>, given: Readonly<Record<string, string>> = {}, method = "POST"): Promise<string> {
  const form = new FormData();
  for (const [name, value] of Object.entries(fields)) form.append(name, value);
  const encoded = new Response(form);
  const body = new Uint8Array(await encoded.arrayBuffer());
  const headers = { "content-type": encoded.headers.get("content-type") ?? "", "content-length": String(body.byteLength), ...given };
  const request = new Request("http://checks.example/sign-in", { method, headers, ...(method === "POST" ? { body } : {}) });
  return assertActionBody(request).then(() => "passes", (error: { code?: string }) => error.code ?? String(error));
}

async function codeOfText(body: string, given: Readonly<Record<string, string>> = {}): Promise<string> {
  const headers = { "content-type": "text/plain;charset=UTF-8", "content-length": String(body.length), ...given };
  return assertActionBody(new Request("http://checks.example/today", { method: "POST", headers, body })).then(() => "passes", (error: { code?: string }) => error.code ?? String(error));
}

const scripted = (args: string, fields: Readonly<Record<string, string>> = {}) => codeOf({ "0": args, ...fields }, { "next-action": ID });
const plain = (reference: string, bound: Readonly<Record<string, string>> = {}) => codeOf({ "$ACTION_REF_1": "", "$ACTION_1:0": reference, ...bound });

describe("the body of an action sent by a page's script", () => {
  it("passes as our own pages send it", async () => {
    expect(await scripted('[{"email":"","note":"$$ 5"},"$K1"]', { "_1_email": "x", "_1_password": "$F9 as typed", "_1_$ACTION_1:0": "" })).toBe("passes");
    expect(await scripted("[]")).toBe("passes");
    expect(await scripted('["$undefined",null,7,true,"$NaN","$D2026-12-01T00:00:00.000Z"]')).toBe("passes");
  });

  it.each(["", "garbage", "{}", '"text"', '["$F1"]', '["$Kz"]', '[{"deep":[["$@1"]]}]', '["$Q2","$W3","$B4","$1"]'])("is refused as malformed: %s", async (args) => {
    expect(await scripted(args)).toBe("malformed-form");
  });

  it("is refused when the action's name is none", async () => {
    expect(await codeOf({ "0": "[]" }, { "next-action": "../../etc" })).toBe("malformed-form");
  });
});

describe("an action's arguments sent as text, when there is no form among them", () => {
  it.each(["[]", '["night"]', '["01K4",["editor"],true]'])("passes as our own pages send it: %s", async (args) => {
    expect(await codeOfText(args, { "next-action": ID })).toBe("passes");
  });

  it.each(["", "garbage", "{}", '["$F1"]', '[{"deep":"$@1"}]'])("is refused as malformed: %s", async (args) => {
    expect(await codeOfText(args, { "next-action": ID })).toBe("malformed-form");
  });

  it("is refused without the action's name, with a wrong one, and when too long", async () => {
    expect(await codeOfText("[]")).toBe("method-not-allowed");
    expect(await codeOfText("[]", { "next-action": "x" })).toBe("malformed-form");
    expect(await codeOfText("[]", { "next-action": ID, "content-length": String(ACTION_LIMIT + 1) })).toBe("body-too-large");
  });
});

describe("the body of a form sent without a script", () => {
  it("passes as our own pages send it", async () => {
    expect(await plain(`{"id":"${ID}","bound":"$@1"}`, { "$ACTION_1:1": '[{"email":""}]', email: "x" })).toBe("passes");
    expect(await plain(`{"id":"${ID}","bound":null}`)).toBe("passes");
  });

  it.each(["", "[", "7", "{}", `{"id":"${ID}"}`, `{"id":"${ID}","bound":"$F7"}`, `{"id":"${ID}","bound":"$@2"}`, '{"id":"x","bound":null}'])("is refused as malformed: %s", async (reference) => {
    expect(await plain(reference)).toBe("malformed-form");
  });
});

describe("any other body", () => {
  it.each([
    ["another type", { "content-type": "application/json" }, "method-not-allowed"],
    ["no boundary", { "content-type": "multipart/form-data" }, "malformed-form"],
    ["a boundary that is not there", { "content-type": "multipart/form-data; boundary=x" }, "malformed-form"],
    ["too long", { "content-length": String(ACTION_LIMIT + 1) }, "body-too-large"],
  ] as const)("is refused: %s", async (_what, given, code) => {
    expect(await codeOf({ a: "b" }, given)).toBe(code);
  });

  it("is refused for other methods", async () => {
    expect(await codeOf({}, {}, "PUT")).toBe("method-not-allowed");
  });
});
