import { assess } from "./assess";
import type { Expect, Kind, Reading, Setup } from "./types";
import { KINDS, ROLES } from "./types";

/** One answer of the engine in the plain form that other programs exchange, a JSON value a line. */
export interface Answer {
  readonly id?: string;
  readonly kinds: Readonly<Record<Kind, number>>;
  readonly pins: readonly { readonly supply: number; readonly ground: number; readonly signal: number; readonly p: number }[];
  readonly faults: readonly { readonly code: string; readonly pins?: readonly number[]; readonly p: number }[];
  /** Devices that are none of the three kinds, from a chance of 0.01 on. */
  readonly others?: readonly { readonly device: string; readonly p: number }[];
  /** Readings that contradict the others, worst first: to be taken again. Left out where there are none. */
  readonly again?: readonly { readonly check: string; readonly why: string }[];
  readonly done: boolean;
  readonly next: readonly { readonly check: string; readonly why: string }[];
}
export interface Refusal { readonly id?: string; readonly error: { readonly code: string; readonly message: string; readonly where: string } }

const MOST_READINGS = 400;
const SHOWN_FROM = 0.01;
const isObject = (v: unknown): v is Record<string, unknown> => typeof v === "object" && v !== null && !Array.isArray(v);
const share = (v: unknown): v is number => typeof v === "number" && v >= 0 && v <= 1;
const positive = (v: unknown): v is number => typeof v === "number" && Number.isFinite(v) && v > 0;

class Malformed extends Error {
  constructor(readonly code: string, message: string, readonly where: string) { super(message); }
}
const need = (ok: boolean, code: string, message: string, where: string): void => { if (!ok) throw new Malformed(code, message, where); };

/** Reads one request of unknown form, assesses it, and answers; anything malformed gets a named refusal and never throws. */
export function answerRequest(request: unknown): Answer | Refusal {
  const id = isObject(request) && typeof request.id === "string" && request.id.length <= 200 ? { id: request.id } : {};
  try {
    const { setup, readings } = parse(request);
    const a = assess(setup, readings);
    if (a.state === "invalid-input") return { ...id, error: { code: a.code, message: a.message, where: a.where } };
    const kinds = Object.fromEntries(a.kinds.map((k) => [k.kind, k.p])) as Record<Kind, number>;
    const others = a.others.filter(({ p }) => p >= SHOWN_FROM);
    return { ...id, kinds, pins: a.pins, faults: a.faults, ...(others.length > 0 ? { others } : {}), ...(a.state === "contradictory" ? { again: a.suspects } : {}), done: a.done, next: a.next.map(({ check, why }) => ({ check, why })) };
  } catch (error) {
    if (error instanceof Malformed) return { ...id, error: { code: error.code, message: error.message, where: error.where } };
    throw error;
  }
}

function parse(request: unknown): { setup: Setup; readings: Reading[] } {
  need(isObject(request), "request-not-an-object", "Send one JSON object.", "");
  const { setup, readings } = request as Record<string, unknown>;
  need(isObject(setup), "setup-missing", 'Send "setup" with three pin labels.', "setup");
  const pins = (setup as Record<string, unknown>).pins, expect = (setup as Record<string, unknown>).expect;
  need(Array.isArray(pins) && pins.length === 3 && pins.every((p) => typeof p === "string" && p.length > 0 && p.length <= 20), "three-pins-needed", '"setup.pins" takes three labels.', "setup.pins");
  need(Array.isArray(readings) && readings.length <= MOST_READINGS, "readings-missing", `"readings" takes a list of at most ${MOST_READINGS}.`, "readings");
  (readings as unknown[]).forEach((r, i) => need(Array.isArray(r) && r.length === 2 && typeof r[0] === "string" && (typeof r[1] === "number" || typeof r[1] === "string"), "reading-malformed", "A reading is a pair: check, value.", `readings.${i}`));
  return { setup: { pins: pins as [string, string, string], ...(expect === undefined ? {} : { expect: parseExpect(expect) }) }, readings: readings as Reading[] };
}

function parseExpect(value: unknown): Expect {
  const where = "setup.expect";
  need(isObject(value), "entry-malformed", '"expect" takes an object.', where);
  const e = value as Record<string, unknown>;
  need(KINDS.includes(e.kind as Kind), "entry-kind-unknown", `"kind" is one of ${KINDS.join(", ")}.`, `${where}.kind`);
  need(isObject(e.pins) && ROLES.every((r) => [1, 2, 3].includes((e.pins as Record<string, unknown>)[r] as number)), "entry-pins-malformed", '"pins" names a pin from 1 to 3 for supply, ground and signal.', `${where}.pins`);
  need(e.supplyVolts === "battery" || positive(e.supplyVolts), "entry-supply-malformed", '"supplyVolts" is a number of volts or "battery".', `${where}.supplyVolts`);
  for (const key of ["totalOhms", "tolerancePercent", "wiperSeriesOhms", "endOhms", "frequencyHz"] as const) need(e[key] === undefined || positive(e[key]) || ((key === "wiperSeriesOhms" || key === "endOhms") && e[key] === 0), "entry-number-malformed", `"${key}" is a number above zero.`, `${where}.${key}`);
  need(e.output === undefined || e.output === "open-collector" || e.output === "push-pull", "entry-output-unknown", '"output" is "open-collector" or "push-pull".', `${where}.output`);
  for (const key of ["signalRatio", "duty"] as const) need(e[key] === undefined || isSpan(e[key], share), "entry-span-malformed", `"${key}" takes rest and full from 0 to 1.`, `${where}.${key}`);
  need(e.signalVolts === undefined || isSpan(e.signalVolts, (v): v is number => typeof v === "number" && Number.isFinite(v) && Math.abs(v) <= 100), "entry-span-malformed", '"signalVolts" takes rest and full in volts.', `${where}.signalVolts`);
  return e as unknown as Expect;
}

const isSpan = (v: unknown, ok: (n: unknown) => n is number) => isObject(v) && ok(v.rest) && ok(v.full);
