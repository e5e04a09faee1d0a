import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { assess, parseCheck, vocabulary, type Reading, type Setup } from "@/lib/diagnosis";
import { drawer } from "../support/draw";
import { drawMachine, drawSetup } from "../support/draw-machine";
import { nonsense, shuffled, someReadings } from "../support/random-readings";
import { effortOf, followCheck } from "../support/run-check";
import { SLOW } from "../support/slow";

/** What may be proposed next, and when to stop. Source: the rules of the check (README of the bench; safety: no ohms on a live circuit, common practice). */
const ask = (setup: Setup) => (readings: readonly Reading[]) => {
  const a = assess(setup, readings);
  if (a.state === "invalid-input") throw new Error(`${a.message} (${a.where})`);
  return a;
};
const holds = (law: (seed: number) => void, numRuns: number) => fc.assert(fc.property(fc.integer({ min: 0, max: 2 ** 31 }), law), { numRuns, seed: 77 });

describe("the next check", SLOW, () => {
  it("is open, not yet taken, not excluded, and there while not done", () => {
    holds((seed) => {
      const draw = drawer(seed), setup = drawSetup(draw, draw() < 0.5), machine = drawMachine(setup, draw);
      const excluded = shuffled(vocabulary().map((c) => c.code), draw).slice(0, Math.floor(draw() * 60));
      const readings = draw() < 0.2 ? nonsense(5, draw) : someReadings(machine, Math.floor(draw() * 12), draw);
      const a = ask({ ...setup, excluded })(readings), closed = new Set([...excluded, ...readings.map(([check]) => check)]);
      for (const { check } of a.next) expect(closed.has(check), check).toBe(false);
      expect(new Set(a.next.map(({ check }) => check)).size).toBe(a.next.length);
      if (!a.done) expect(a.next.length).toBeGreaterThan(0);
    }, 25);
  });

  it("counts its effort from the state the last reading left: a reading 1, the device's connector 2, the controller's 4, the power 1", () => {
    holds((seed) => {
      const draw = drawer(seed), setup = drawSetup(draw, draw() < 0.5), readings = someReadings(drawMachine(setup, draw), 1 + Math.floor(draw() * 6), draw);
      for (const { check, effort } of ask(setup)(readings).next) expect(effort, check).toBe(effortOf([...readings, [check, 0]]) - effortOf(readings));
    }, 15);
  });

  it("asks for ohms with the power off and the connector parted, for volts, hertz and duty with the power on", () => {
    for (const { code, meter, state } of vocabulary()) {
      if (meter === "ohms" || meter === "grip") expect(state, code).toMatchObject({ powerOn: false, deviceParted: true });
      else expect(state.powerOn, code).toBe(true);
      expect(parseCheck(code)?.state).toEqual(state);
    }
  });
});

describe("a check's name", () => {
  // Source: README of the bench: the red lead on A, the black one on B or on battery negative; actuator at P.
  it("says where each lead goes, and where the actuator stands", () => {
    for (const { code, red, black, position } of vocabulary().filter(({ meter }) => meter === "ohms" || meter === "dc-volts")) {
      const [leads = "", at = null] = code.split(":").at(-1)!.split("@"), [a, b] = leads.split("-");
      expect(code === "volt:battery" ? [red, black] : [String(red), String(black), position], code).toEqual(code === "volt:battery" ? ["battery", "gnd"] : [a, b ?? a, at]);
    }
  });
});

describe("a check followed to its end", SLOW, () => {
  it("ends done, with 95 % of the chances in the open findings, and says when nothing more can be told apart", () => {
    holds((seed) => {
      const draw = drawer(seed), machine = drawMachine(drawSetup(draw, draw() < 0.5), draw);
      const { last, invalid } = followCheck(ask(machine.setup), (check) => machine.readings[check]);
      expect(invalid).toBeNull();
      expect(last.done).toBe(true);
      expect(last.openFindings.reduce((sum, { p }) => sum + p, 0)).toBeGreaterThanOrEqual(0.95 - 1e-12);
      if (last.inseparable) expect(last.openFindings.length).toBeGreaterThan(1);
    }, 12);
  });

  it("is not done before the first reading, and needs one", () => {
    for (const withEntry of [false, true]) {
      const a = ask(drawSetup(drawer(3), withEntry))([]);
      expect(a).toMatchObject({ state: "needs-reading", done: false });
    }
  });
});
