import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { assess, type Fault, type Reading, type Setup } from "@/lib/diagnosis";
import { drawer } from "../support/draw";
import { drawMachine, drawSetup } from "../support/draw-machine";
import { nonsense, shuffled, someReadings } from "../support/random-readings";
import { renameFault, renamePins, renameReading, RENAMINGS, renameSetup } from "../support/rename-pins";
import { SLOW } from "../support/slow";

/** Laws that hold whatever the machine. Source: probability theory and the engine's own promises; machines are drawn from its model. */
const standing = (setup: Setup, readings: readonly Reading[]) => {
  const a = assess(setup, readings);
  if (a.state === "invalid-input") throw new Error(`${a.message} (${a.where})`);
  return a;
};
/** What is believed, without what depends on the state that the last reading left the machine in. */
const belief = (a: ReturnType<typeof standing>) => ({
  kinds: a.kinds, pins: a.pins, faults: a.faults, hypotheses: a.hypotheses, openFindings: a.openFindings, suspects: a.state === "contradictory" ? a.suspects : [],
});
const faultKey = ({ code, pins }: Fault) => `${code}:${pins ?? ""}`;
const sum = (list: readonly { readonly p: number }[]) => list.reduce((total, { p }) => total + p, 0);

/** A machine and some of its readings, all from one number, so that a failure names it. */
function drawn(seed: number, most = 9) {
  const draw = drawer(seed), machine = drawMachine(drawSetup(draw, draw() < 0.5), draw);
  return { draw, setup: machine.setup, readings: someReadings(machine, 1 + Math.floor(draw() * most), draw) };
}
/** Sums in another order differ in their last digits. */
const LAST_DIGITS = 1e-9;
const seeds = fc.integer({ min: 0, max: 2 ** 31 });
const holds = (law: (seed: number) => void, numRuns: number) => fc.assert(fc.property(seeds, law), { numRuns, seed: 2_024 });

function expectSound(a: ReturnType<typeof standing>): void {
  for (const list of [[...a.kinds, ...a.others].sort((x, y) => y.p - x.p), a.pins, a.faults, a.hypotheses]) {
    expect(Math.abs(sum(list) - 1)).toBeLessThan(1e-9);
    for (const { p } of list) expect(p >= 0 && p <= 1).toBe(true);
    list.slice(1).forEach(({ p }, i) => expect(p).toBeLessThanOrEqual(list[i]!.p));
  }
  expect(sum(a.openFindings)).toBeGreaterThanOrEqual(0.95 - 1e-12);
  for (const n of a.next) expect(Number.isFinite(n.gainBits) && n.gainBits >= 0 && n.effort >= 1).toBe(true);
}

describe("laws of the standing", SLOW, () => {
  it("does not hang on the order of the readings, to the last bit", () => {
    holds((seed) => {
      const { draw, setup, readings } = drawn(seed);
      expect(belief(standing(setup, shuffled(readings, draw)))).toStrictEqual(belief(standing(setup, readings)));
    }, 15);
  });

  it("with the machine's state told, proposes the same in any order too", () => {
    holds((seed) => {
      const { draw, setup, readings } = drawn(seed), told: Setup = { ...setup, state: { deviceParted: true, controllerParted: false, powerOn: draw() < 0.5 } };
      expect(standing(told, shuffled(readings, draw))).toStrictEqual(standing(told, readings));
    }, 8);
  });

  it("says the same again to the last bit, whatever was asked in between", () => {
    holds((seed) => {
      const one = drawn(seed), between = drawn(seed + 1), first = standing(one.setup, one.readings);
      standing(between.setup, between.readings);
      expect(standing(one.setup, one.readings)).toStrictEqual(first);
    }, 15);
  });

  it("has chances from 0 to 1 that sum to 1, likeliest first, and open findings of 95 % or more", () => {
    holds((seed) => { const { setup, readings } = drawn(seed, 20); expectSound(standing(setup, readings)); }, 15);
  });

  it("holds for readings that mean nothing: nothing thrown, nothing infinite", () => {
    holds((seed) => {
      const draw = drawer(seed), setup = drawSetup(draw, draw() < 0.5);
      expectSound(standing(setup, nonsense(1 + Math.floor(draw() * 12), draw)));
    }, 20);
  });

  it("gives the same answer under other pin numbers when the pins are numbered anew", () => {
    holds((seed) => {
      const { draw, setup, readings } = drawn(seed), renaming = RENAMINGS[Math.floor(draw() * RENAMINGS.length)]!;
      const a = standing(setup, readings), b = standing(renameSetup(setup, renaming), readings.map((r) => renameReading(r, renaming)));
      const faults = new Map(b.faults.map((f) => [faultKey(f), f.p])), pins = new Map(b.pins.map((p) => [`${p.supply}${p.ground}${p.signal}`, p.p]));
      for (const f of a.faults) expect(Math.abs(f.p - (faults.get(faultKey(renameFault(f, renaming))) ?? 0)), JSON.stringify(f)).toBeLessThan(LAST_DIGITS);
      for (const p of a.pins) { const { supply, ground, signal } = renamePins(p, renaming); expect(Math.abs(p.p - (pins.get(`${supply}${ground}${signal}`) ?? 0))).toBeLessThan(LAST_DIGITS); }
      for (const k of a.kinds) expect(Math.abs(k.p - b.kinds.find((other) => other.kind === k.kind)!.p)).toBeLessThan(LAST_DIGITS);
    }, 30);
  });
});
