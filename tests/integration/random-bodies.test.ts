import { readdirSync } from "node:fs";
import path from "node:path";
import { ulid } from "ulid";
import { beforeEach, describe, expect, it, vi } from "vitest";
import { AppError } from "@/lib/errors";
import type { Person } from "@/lib/auth/permissions";
import { abandonCheck } from "@/lib/checks/abandon-check";
import { appendSteps } from "@/lib/checks/append-steps";
import { attachMachine } from "@/lib/checks/attach-machine";
import { confirmCheck } from "@/lib/checks/confirm-check";
import { finishCheck } from "@/lib/checks/finish-check";
import { startCheck } from "@/lib/checks/start-check";
import { startRecheck } from "@/lib/checks/start-recheck";
import { switchExperience } from "@/lib/checks/switch-experience";
import { withdrawConfirmation } from "@/lib/checks/withdraw-confirmation";
import { eachTestOwnDatabase } from "../support/database";
import { drawer } from "../support/draw";
import { makePerson } from "../support/people";
import { pick, randomBody, randomJson, randomQuery, type Draw } from "../support/random-json";
import { tableDigest } from "../support/table-digest";
import { AT, makeMachine, makeRunning, readingStep } from "../support/workshop";

/** A thousand random bodies a route and a verb: every answer is coded, none is a defect, and no table changes. */
const BODIES = 1000;
const OWN = { host: "checks.example", origin: "http://checks.example", "content-type": "application/json" };
const request = vi.hoisted(() => ({ headers: new Headers(), person: null as Person | null }));

vi.mock("next/headers", () => ({ headers: async () => request.headers, cookies: async () => ({ get: () => undefined, set: () => undefined }) }));
vi.mock("@/lib/auth/cookies", () => ({ sessionCookie: async () => ({ sessionId: request.person ? "session" : undefined }) }));
vi.mock("@/lib/auth/session-rows", () => ({ personOfSession: async () => request.person }));

type Handler = (request: Request, context: { params: Promise<Record<string, string>> }) => Promise<Response>;
interface Endpoint { readonly name: string; readonly method: string; readonly file: string }

const API = path.resolve(import.meta.dirname, "../../app/api");
const METHODS = ["GET", "POST", "PUT", "PATCH", "DELETE"] as const;

const files = readdirSync(API, { recursive: true, encoding: "utf8" }).filter((file) => file.endsWith("route.ts"));
const modules = await Promise.all(files.map(async (file) => [file, (await import(path.join(API, file))) as Record<string, Handler>] as const));
const endpoints: Endpoint[] = modules.flatMap(([file, module]) => METHODS.filter((method) => module[method]).map((method) => ({ name: `${method} /api/${path.dirname(file)}`, method, file })));
const handlerOf = ({ file, method }: Endpoint): Handler => {
  const handler = modules.find(([name]) => name === file)?.[1][method];
  if (!handler) throw new Error(`no handler for ${method} ${file}`);
  return handler;
};

eachTestOwnDatabase();
let me: Person;
let foreignCheck: string;
let machineId: string;

beforeEach(async () => {
  request.headers = new Headers(OWN);
  me = await makePerson(["technician", "editor", "trainer", "administrator"]);
  request.person = me;
  machineId = await makeMachine();
  foreignCheck = await makeRunning(await makePerson(), [["volt:battery", 12.6]]);
});

/** Sound bodies of the routes, to be spoilt in one place: deeper parts of the schemas are reached that way. */
function soundBodies(): readonly unknown[] {
  return [
    { id: ulid(), setup: { cavityLabels: ["A", "B", "C"], batteryVolts: 24, wireColours: ["RD", "BK", null] }, startedAt: AT },
    { steps: [readingStep(["res:device:1-2@rest", 4700]), { id: ulid(), at: AT, type: "retract", step: ulid() }] },
    { standing: { state: "ranked", kinds: [{ kind: "pwm", p: 1 }], pins: [], faults: [{ code: "none", p: 1 }], openFindings: [], done: true, inseparable: false } },
    { machineId }, { id: ulid() }, { finding: "wire-open:2", kind: "pwm", proof: "New wire laid, fault gone." },
    { id: ulid(), setup: { cavityLabels: ["A", "B", "C"], experience: { kinds: { pwm: 1 }, findings: { "wire-open": 2 } } } },
    { id: "x", setup: { pins: ["1", "2", "3"] }, readings: [["res:device:1-2@rest", 4700], ["volt:battery", 12.6]] },
  ];
}

const foreignId = (draw: Draw): string => pick(draw, [foreignCheck, ulid(), "__proto__", "..", "\u0000", "'", "x".repeat(500), "constructor"]);

async function ask(endpoint: Endpoint, draw: Draw): Promise<{ status: number; text: string }> {
  const { method } = endpoint;
  const id = foreignId(draw);
  const address = `http://checks.example/api/${path.dirname(endpoint.file)}?${randomQuery(draw)}`;
  const body = method === "GET" ? undefined : Buffer.from(randomBody(draw, soundBodies()));
  const type = draw() < 0.95 ? OWN["content-type"] : pick(draw, ["text/plain", "", "application/x-www-form-urlencoded", "multipart/form-data"]);
  const response = await handlerOf(endpoint)(new Request(address, { method, body, headers: { ...OWN, "content-type": type } }), { params: Promise.resolve({ id, slug: id }) });
  return { status: response.status, text: await response.text() };
}

describe("random bodies", () => {
  it("reach every route of the application", () => {
    expect(endpoints.map(({ name }) => name)).toEqual(expect.arrayContaining(["POST /api/checks", "GET /api/checks", "PUT /api/checks/[id]/steps", "POST /api/checks/[id]/finish", "POST /api/checks/[id]/confirm", "POST /api/confirmations/[id]/withdraw", "POST /api/assess"]));
  });

  it.each(endpoints)("$name answers a thousand with no defect and changes nothing", { timeout: 120_000 }, async (endpoint) => {
    const before = await tableDigest();
    const draw = drawer([...endpoint.name].reduce((sum, letter) => (sum * 31 + letter.charCodeAt(0)) >>> 0, 7));
    const wrong: string[] = [];
    for (let count = 0; count < BODIES; count += 1) {
      const { status, text } = await ask(endpoint, draw);
      const fine = status < 400 || (status < 500 && /^\{("id":.*,)?"error":\{"code":"[a-z-]+","message":".+/s.test(text));
      if (!fine) wrong.push(`${status} ${text.slice(0, 200)}`);
    }
    expect(wrong).toEqual([]);
    expect(await tableDigest()).toEqual(before);
  });
});

type Verb = readonly [name: string, run: (input: unknown, id: string) => Promise<unknown>];
const VERBS: readonly Verb[] = [
  ["startCheck", (input) => startCheck(me, input)],
  ["appendSteps", (input, id) => appendSteps(me, id, input)],
  ["finishCheck", (input, id) => finishCheck(me, id, input)],
  ["abandonCheck", (_input, id) => abandonCheck(me, id)],
  ["attachMachine", (input, id) => attachMachine(me, id, input)],
  ["startRecheck", (input, id) => startRecheck(me, id, input)],
  ["confirmCheck", (input, id) => confirmCheck(me, id, input)],
  ["withdrawConfirmation", (input) => withdrawConfirmation(me, input)],
  ["switchExperience", (input) => switchExperience(me, input)],
];

describe("random input to the verbs themselves", () => {
  it.each(VERBS)("%s refuses a thousand with coded errors and changes nothing", { timeout: 120_000 }, async (_name, run) => {
    const before = await tableDigest();
    const draw = drawer(20_260_301);
    const wrong: unknown[] = [];
    for (let count = 0; count < BODIES; count += 1) {
      const refused = await run(randomJson(draw), foreignId(draw)).then((answer) => ({ answer }), (error: unknown) => error);
      if (!(refused instanceof AppError) || refused.status < 400 || refused.status >= 500) wrong.push(refused);
    }
    expect(wrong).toEqual([]);
    expect(await tableDigest()).toEqual(before);
  });
});
