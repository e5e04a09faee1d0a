import { assess, meterLimit, parseCheck, type Assessment, type Reading, type ReadingValue, type Setup } from "@/lib/diagnosis";
import { sameFault, type BenchCase } from "../support/bench";
import { followCheck } from "../support/run-check";

/** Slips people make with a meter and a keypad (common practice): a wrong range or prefix, the leads exchanged, the pin beside it. */
export const SLIP_KINDS = ["times-10", "times-1000", "by-10", "leads-exchanged", "sign-lost", "pin-beside"] as const;
export type SlipKind = (typeof SLIP_KINDS)[number];

export interface SlipRun {
  readonly id: string;
  readonly kind: SlipKind;
  readonly check: string;
  readonly right: ReadingValue;
  readonly wrong: ReadingValue;
  /** Refused when entered: no meter shows such a value. */
  readonly refused: boolean;
  /** Named as one to take again, at some point while it stood among the readings. */
  readonly named: boolean;
  /** Some reading was named, but never this one. */
  readonly otherNamed: boolean;
  /** Ends at 0.95 or more with a finding that is not the machine's: with the slip left standing to the end. */
  readonly sureWrong: boolean;
  /** The same, and given out as a verdict: readings that contradict each other, or are above the limits, get none. */
  readonly wrongVerdict: boolean;
  /** The same, where whatever was named is taken again at once. */
  readonly sureWrongHeeded: boolean;
  /** Ends with the machine's own finding first all the same. */
  readonly held: boolean;
  readonly readings: number;
  readonly said: string;
  readonly truth: string;
}

type Standing = Exclude<Assessment, { state: "invalid-input" }>;

const SURE = 0.95;
/** The check with the red lead on another pin. */
const redOn = (code: string, pin: number) => code.replace(/(?<=:)[123](?=[-@]|$)/, String(pin));

/** Value that a slip puts in place of the right one; null where this slip cannot be made at this check. */
export function slipped(kind: SlipKind, check: string, readings: BenchCase["readings"], draw: () => number): ReadingValue | null {
  const right = readings[check]!, spec = parseCheck(check)!;
  if (kind === "pin-beside") {
    if (typeof spec.red !== "number") return null;
    const beside = [1, 2, 3].filter((pin) => pin !== spec.red && pin !== spec.black).map((pin) => redOn(check, pin)).filter((c) => readings[c] !== undefined);
    return beside.length === 0 ? null : readings[beside[Math.floor(draw() * beside.length)]!]!;
  }
  if (kind === "leads-exchanged") {
    if (spec.place === "device") return readings[check.replace(/(\d)-(\d)/, "$2-$1")] ?? null;
    return spec.place === "harness" && spec.meter === "dc-volts" && spec.black !== "gnd" && typeof right === "number" ? -right : null;
  }
  if (typeof right !== "number") return null;
  if (kind === "sign-lost") return spec.unit === "volt" && spec.black === "gnd" ? -right : null;
  return Number((right * { "times-10": 10, "times-1000": 1000, "by-10": 0.1 }[kind]).toPrecision(6));
}

/** Whether two values cannot both be readings of one truth: they differ by more than the meter's limits. */
export function differs(check: string, a: ReadingValue, b: ReadingValue): boolean {
  if (typeof a === "string" || typeof b === "string") return a !== b;
  const spec = parseCheck(check)!;
  return Math.abs(a - b) > meterLimit(spec, a) + meterLimit(spec, b);
}

function standing(setup: Setup, readings: readonly Reading[]): Standing {
  const a = assess(setup, readings);
  if (a.state === "invalid-input") throw new Error(a.message);
  return a;
}

const namedIn = (a: Standing) => (a.state === "contradictory" ? a.suspects.map((s) => s.check) : []);
const text = (f: { code: string; pins?: readonly number[] } | undefined) => (f ? `${f.code}${f.pins ? `:${f.pins}` : ""}` : "");

/** An undisturbed run, to slip in: its readings, and what was named in it though nothing was wrong. */
export function cleanRun(c: BenchCase): { readonly readings: readonly Reading[]; readonly named: readonly string[] } {
  const run = followCheck((readings) => standing(c.setup, readings), (check) => c.readings[check]);
  return { readings: run.readings, named: [...new Set(run.answers.flatMap(namedIn))] };
}

/** One run with one slip of this kind at a drawn step; null where no reading of the run allows it. */
export function slipRun(c: BenchCase, clean: readonly Reading[], kind: SlipKind, draw: () => number): SlipRun | null {
  const places = clean.flatMap(([check, right], step) => {
    const wrong = slipped(kind, check, c.readings, draw);
    return wrong !== null && differs(check, right, wrong) ? [{ step, check, right, wrong }] : [];
  });
  if (places.length === 0) return null;
  const place = places[Math.floor(draw() * places.length)]!;
  const taken: Reading[] = [...clean.slice(0, place.step), [place.check, place.wrong]];
  const about = { id: c.id, kind, check: place.check, right: place.right, wrong: place.wrong, truth: text(c.truth.fault) };
  if (assess(c.setup, taken).state === "invalid-input") return { ...about, refused: true, named: true, otherNamed: false, sureWrong: false, wrongVerdict: false, sureWrongHeeded: false, held: true, readings: taken.length, said: "refused" };
  return { ...about, refused: false, ...outcome(c, taken, place.check, place.right) };
}

function outcome(c: BenchCase, taken: readonly Reading[], check: string, right: ReadingValue) {
  const run = followCheck((readings) => standing(c.setup, readings), (k) => c.readings[k], taken);
  const names = run.answers.map(namedIn), at = names.findIndex((list) => list.includes(check));
  const wrong = (a: Standing) => a.faults[0]!.p >= SURE && !sameFault(a.faults[0], c.truth.fault);
  const sureWrong = wrong(run.last);
  // Once named and taken again, the run goes on as if nothing had happened.
  const mended = at < 0 || !sureWrong ? null : run.readings.slice(0, taken.length + at).map(([k, v]): Reading => [k, k === check ? right : v]);
  const heeded = mended ? followCheck((readings) => standing(c.setup, readings), (k) => c.readings[k], mended).last : run.last;
  return { named: at >= 0, otherNamed: at < 0 && names.some((list) => list.length > 0), sureWrong, wrongVerdict: sureWrong && run.last.state !== "contradictory" && run.last.overLimit === null, sureWrongHeeded: wrong(heeded), held: sameFault(run.last.faults[0], c.truth.fault), readings: run.readings.length, said: `${text(run.last.faults[0])} ${run.last.faults[0]!.p.toFixed(3)} ${run.last.state}` };
}
