import { describe, expect, it } from "vitest";
import { assess, DEFAULT_METER, meterLimit, parseCheck, type MeterSpec, type ReadingValue, type Setup } from "@/lib/diagnosis";
import { resolutionAt } from "@/lib/diagnosis/meter";
import { benchCases, everyNth, sameFault, type BenchCase } from "../support/bench";
import { drawer } from "../support/draw";
import { followCheck } from "../support/run-check";
import { SLOW } from "../support/slow";

/**
 * Machines of the bench as other meters and unsteady supplies would show them. Source: what is done to each reading is said
 * beside it (limits of error as makers state them, JCGM 100:2008 4.3.7; the rest common practice); the truths are the bench's.
 */
type Change = (check: string, value: number, step: number, draw: () => number) => number;
const EVERY = 16, SURE = 0.95;

interface Outcome { readonly right: boolean; readonly sureWrong: boolean; readonly contradictory: boolean; readonly sure: number; readonly readings: number }

function follow(c: BenchCase, change: Change, meter?: MeterSpec): Outcome {
  const draw = drawer(Number(c.id.slice(2)) + 31), setup: Setup = { ...c.setup, ...(meter ? { meter } : {}) };
  let step = 0;
  const shown = (check: string): ReadingValue | undefined => {
    const value = c.readings[check];
    return typeof value === "number" ? change(check, value, step++, draw) : value;
  };
  const { last, readings } = followCheck((taken) => {
    const a = assess(setup, taken);
    if (a.state === "invalid-input") throw new Error(`${c.id}: ${a.message}`);
    return a;
  }, shown);
  const right = last.openFindings.some((f) => sameFault(f, c.truth.fault)), top = last.faults[0]!;
  return { right, sureWrong: top.p >= SURE && !sameFault(top, c.truth.fault), contradictory: last.state === "contradictory", sure: top.p, readings: readings.length };
}

const outcomes = (change: Change, meter?: MeterSpec) => everyNth(benchCases(), EVERY).map((c) => follow(c, change, meter));
const share = (list: readonly Outcome[], is: (o: Outcome) => boolean) => list.filter(is).length / list.length;
const mean = (list: readonly Outcome[], of: (o: Outcome) => number) => list.reduce((sum, o) => sum + of(o), 0) / list.length;

function expectFine(list: readonly Outcome[]): void {
  expect(share(list, (o) => o.right)).toBeGreaterThanOrEqual(0.95);
  expect(share(list, (o) => o.sureWrong)).toBe(0);
  expect(share(list, (o) => o.contradictory)).toBeLessThanOrEqual(0.04);
}

/** Four times the limits of the bench's meter. */
const COARSE: MeterSpec = {
  ...DEFAULT_METER, ohms: { ...DEFAULT_METER.ohms, percent: 3.6, counts: 8 }, volts: { ...DEFAULT_METER.volts, percent: 2, fixedVolts: 0.016 },
  hertz: { percent: 0.4 }, duty: { percent: 2, fixed: 0.008 },
};
const within = (check: string, value: number, meter: MeterSpec, draw: () => number) => value + (2 * draw() - 1) * meterLimit(parseCheck(check)!, value, meter);
const isVolts = (check: string) => parseCheck(check)!.unit === "volt";

describe("other meters and unsteady readings", SLOW, () => {
  it("a meter with four times the limits of error, told so, is less sure or asks for more, and is not wrong", () => {
    const fine = outcomes((_, value) => value), coarse = outcomes((check, value, _, draw) => Math.max(isVolts(check) ? -Infinity : 0, within(check, value, COARSE, draw)), COARSE);
    expectFine(coarse);
    // Per reading it knows less: more readings, or less sure after as many.
    expect(mean(coarse, (o) => o.readings) > mean(fine, (o) => o.readings) || mean(coarse, (o) => o.sure) < mean(fine, (o) => o.sure)).toBe(true);
  });

  it("a last digit that dithers by two counts is nothing", () => {
    expectFine(outcomes((check, value, _, draw) => value + Math.round(4 * draw() - 2) * (isVolts(check) ? 0.001 : parseCheck(check)!.unit === "ohm" ? resolutionAt(value, DEFAULT_METER.counts) : 0)));
  });

  it("a supply that sinks by a hundredth over the check is nothing", () => {
    expectFine(outcomes((check, value, step) => (isVolts(check) ? value * (1 - 0.01 * Math.min(1, step / 10)) : value)));
  });

  it("a second meter, 0.4 % high where the first is 0.4 % low, is nothing", () => {
    expectFine(outcomes((check, value, step) => (parseCheck(check)!.unit === "hertz" ? value : value * (step % 2 === 0 ? 1.004 : 0.996))));
  });
});
