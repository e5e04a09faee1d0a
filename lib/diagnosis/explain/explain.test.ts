import { describe, expect, it } from "vitest";
import { assess, beliefs } from "../assess";
import { faultId } from "../circuit/candidate";
import { marginals } from "../inference/standing";
import type { Expect, Fault, Reading, Setup } from "../types";
import { carrying, effects, evidence, predict, tellApart } from ".";
import { countUpTo, setsOfSize } from "./sets";

const POT: Expect = { kind: "potentiometer", pins: { supply: 1, ground: 3, signal: 2 }, supplyVolts: 5, totalOhms: 5000, tolerancePercent: 10, signalRatio: { rest: 0.1, full: 0.9 }, wiperSeriesOhms: 0 };
const PINS = ["A", "B", "C"] as const;
const KNOWN: Setup = { pins: PINS, expect: POT };
const UNKNOWN: Setup = { pins: PINS };
const NONE: Fault = { code: "none" }, OPEN_1: Fault = { code: "wire-open", pins: [1] }, OPEN_2: Fault = { code: "wire-open", pins: [2] };

/** Divider of 5 kΩ at 0.1 and 0.9 of 5 V, and a harness whose wire B is open. [divider rule; harness values common practice] */
const OPEN_B: readonly Reading[] = [["res:device:1-3@rest", 5010], ["res:device:1-2@rest", 4560], ["volt:harness:1-3", 5], ["volt:harness:1-2", 0], ["res:wire:2", "OL"], ["res:wire:1", 0.2], ["res:wire:3", 0.2]];
/** An unknown potentiometer with a broken signal wire, as a bench would have it. [divider rule] */
const BENCH: readonly Reading[] = [
  ["res:device:1-3@rest", 5010], ["res:device:1-2@rest", 4560], ["res:device:2-3@rest", 550], ["res:device:1-3@full", 5010], ["res:device:1-2@full", 553],
  ["volt:harness:1-gnd", 5.01], ["volt:harness:3-gnd", 0], ["res:harness:3-gnd", 0.3], ["res:wire:2", "OL"], ["res:wire:1", 0.2], ["fit:contact:2", "grips"],
];
const rowOf = (setup: Setup, readings: readonly Reading[], fault: Fault, check: string) => evidence(setup, readings, fault).find((row) => row.check === check);

describe("how far a reading is off", () => {
  // Default meter: 0.5 % of 4.98 V and 4 mV make ±28.9 mV. With the supply's wire open nothing drives the cavity: 0 V; 4.98 / 0.0289 = 172.
  it("is told in limits of error from the middle expected: an open supply wire against 4.98 V", () => {
    const row = rowOf(KNOWN, [["volt:harness:1-gnd", 4.98]], OPEN_1, "volt:harness:1-gnd");
    expect(row?.limit).toBeCloseTo(0.0289, 6);
    expect(row?.ifFinding.number?.middle).toBeCloseTo(0, 2);
    expect(row?.offLimits).toBeGreaterThan(170);
    expect(row?.offLimits).toBeLessThan(175);
    expect(Math.abs(row?.offIfSound ?? 99)).toBeLessThan(1.5);
  });

  // Ohm's law: 0.9 of 5000 Ω and some 50 Ω at the wiper are 4550 Ω. 0.9 % of 4560, two counts of 1 Ω and 0.25 Ω of leads: ±43.3 Ω.
  it("is small where the reading is as the divider has it", () => {
    const row = rowOf(KNOWN, [["res:device:1-2@rest", 4560]], NONE, "res:device:1-2@rest");
    expect(row?.limit).toBeCloseTo(4560 * 0.009 + 2 + 0.25, 6);
    expect(row?.offLimits).toBe(row?.offIfSound);
    expect(Math.abs(row?.offLimits ?? 99)).toBeLessThan(2.5);
  });

  it("has a sign: below what was expected it is negative", () => {
    expect(rowOf(KNOWN, [["volt:harness:1-gnd", 4.2]], NONE, "volt:harness:1-gnd")?.offLimits).toBeLessThan(-10);
  });

  it("does not exist for words, nor where a word is expected", () => {
    expect(rowOf(KNOWN, OPEN_B, OPEN_2, "res:wire:2")).toMatchObject({ limit: null, offLimits: null, offIfSound: null });
    expect(rowOf(KNOWN, [...OPEN_B.slice(0, 4), ["res:wire:2", 0.2]], OPEN_2, "res:wire:2")).toMatchObject({ offLimits: null, ifFinding: { number: null } });
  });

  it("is never infinite: a meter that shows 0 Hz has no limit of error there", () => {
    expect(rowOf(UNKNOWN, [["freq:mated:1@rest", 0]], NONE, "freq:mated:1@rest")).toMatchObject({ limit: 0, offLimits: null });
  });

  it("goes with what the same finding predicts without that reading", () => {
    const row = rowOf(KNOWN, OPEN_B, OPEN_2, "volt:harness:1-2");
    expect(row?.ifFinding).toEqual(predict(KNOWN, OPEN_B, OPEN_2, "volt:harness:1-2"));
  });
});

describe("how a reading moved a chance", () => {
  it.each([["known", KNOWN, OPEN_B], ["unknown", UNKNOWN, BENCH.slice(0, 7)]] as const)("takes the chance without it to the chance with it: %s", (_, setup, readings) => {
    // Factors take every reading as right; the standing before a verdict also weighs that one of them is wrong.
    const { faults } = marginals(beliefs(setup, readings));
    for (const finding of [NONE, OPEN_2, OPEN_1]) {
      const chance = faults.find((f) => faultId(f) === faultId(finding))?.p ?? 0;
      for (const row of evidence(setup, readings, finding)) {
        expect(Math.max(1e-6, row.without ?? 0) * (row.factor ?? 0)).toBeCloseTo(Math.max(1e-6, chance), 12);
      }
    }
  });

  it("is the same as in the effects of all readings", () => {
    const rows = evidence(KNOWN, OPEN_B, OPEN_2);
    for (const [i, effect] of effects(KNOWN, OPEN_B).entries()) {
      const named = effect.faults.find(({ fault }) => faultId(fault) === faultId(OPEN_2));
      expect(named?.factor).toBe(rows[i]?.factor);
    }
  });

  it("from one reading to the next multiplies up to the whole change", () => {
    const readings: readonly Reading[] = OPEN_B.slice(0, 5);
    const product = readings.reduce((all, [check], i) => all * (rowOf(KNOWN, readings.slice(0, i + 1), OPEN_2, check)?.factor ?? NaN), 1);
    const chance = (upTo: number) => marginals(beliefs(KNOWN, readings.slice(0, upTo))).faults.find((f) => faultId(f) === "wire-open:2")?.p ?? NaN;
    expect(product).toBeCloseTo(chance(readings.length) / chance(0), 6);
  });

  it("is large for the reading that finds the break, and 1 for one that every possibility predicts alike", () => {
    const readings: readonly Reading[] = [["res:device:1-3@rest", 5000], ["res:wire:2", "OL"]];
    expect(rowOf(KNOWN, readings, OPEN_2, "res:wire:2")?.factor).toBeGreaterThan(5);
    expect(rowOf(KNOWN, readings, NONE, "res:wire:2")?.factor).toBeLessThan(1e-3);
    expect(rowOf(KNOWN, [["volt:battery", 24.6], ["res:wire:2", "OL"]], OPEN_2, "volt:battery")?.factor).toBeCloseTo(1, 1);
  });
});

/** Does a set of readings make the verdict that these have? */
function verdictOf(setup: Setup, readings: readonly Reading[]): string {
  const s = assess(setup, readings);
  if (s.state === "invalid-input") throw new Error(s.message);
  return [s.openFindings.map(faultId).sort().join(" "), s.kinds[0]!.kind, `${s.pins[0]!.supply}${s.pins[0]!.ground}${s.pins[0]!.signal}`, s.kinds[0]!.p >= 0.95, s.pins[0]!.p >= 0.95].join("|");
}

describe("the readings that carry a verdict", () => {
  const cases = [["known, open wire", KNOWN, OPEN_B], ["unknown, open wire", UNKNOWN, BENCH], ["known, sound", KNOWN, [["volt:mated:2-gnd@full", 4.5], ["volt:mated:3-gnd@rest", 0], ["sweep:mated:2", "smooth"], ["volt:harness:1-2", 4.97], ["res:wire:2", 0.2]]]] as const satisfies readonly (readonly [string, Setup, readonly Reading[]])[];

  it.each(cases)("really carry it, and not one of them can be left out: %s", (_, setup, readings) => {
    const carried = carrying(setup, readings), whole = verdictOf(setup, readings);
    const set = readings.filter(([check]) => carried?.checks.includes(check));
    expect(set.length).toBe(carried?.checks.length);
    expect(verdictOf(setup, set)).toBe(whole);
    for (const left of set) if (set.length > 1) expect(verdictOf(setup, set.filter((r) => r !== left)), left[0]).not.toBe(whole);
  });

  it("are the fewest that do, where it says so", () => {
    const carried = carrying(KNOWN, OPEN_B), whole = verdictOf(KNOWN, OPEN_B);
    expect(carried?.smallest).toBe(true);
    for (let size = 1; size < (carried?.checks.length ?? 0); size++) {
      for (const set of setsOfSize(OPEN_B.length, size)) expect(verdictOf(KNOWN, OPEN_B.filter((_, i) => set.includes(i)))).not.toBe(whole);
    }
  });

  // A wire with both ends parted that shows next to nothing to battery negative can only be shorted to it. [Ohm's law]
  it("are one alone where one says it all", () => {
    expect(carrying(KNOWN, [["volt:battery", 24.6], ["res:loose:2-gnd", 0.6]])).toEqual({ checks: ["res:loose:2-gnd"], smallest: true });
  });

  // A wire exchanged with another shows OL end to end just as a broken one does, so OL alone is not enough.
  it("include what rules out the next best explanation", () => {
    expect(carrying(KNOWN, OPEN_B)?.checks).toEqual(["volt:harness:1-2", "res:wire:2"]);
  });

  it("do not depend on the order in which they were taken", () => {
    expect(carrying(KNOWN, [...OPEN_B].reverse())).toEqual(carrying(KNOWN, OPEN_B));
    expect(carrying(UNKNOWN, [...BENCH].reverse())).toEqual(carrying(UNKNOWN, BENCH));
  });

  it("do not exist without a verdict: no reading, too much open, or a contradiction", () => {
    expect(carrying(KNOWN, [])).toBeNull();
    expect(carrying(UNKNOWN, [["volt:battery", 24.6]])).toBeNull();
    const slipped = OPEN_B.map(([check, value]): Reading => (check === "res:device:1-2@rest" ? [check, 45_600] : [check, value]));
    expect(carrying(KNOWN, [...slipped, ["res:device:2-1@rest", 4561], ["res:device:3-1@rest", 5008], ["res:device:2-3@rest", 560]])).toBeNull();
  });
});

describe("what would tell two possibilities apart", () => {
  const half: readonly Reading[] = [["volt:mated:2-gnd@full", 0], ["volt:mated:1-gnd@rest", 5]];

  it("is named with what each would read: a broken wire shows OL end to end, a contact that does not touch leaves it whole", () => {
    const tells = tellApart(KNOWN, half, [OPEN_2, { code: "contact-open", pins: [2] }]);
    const wire = tells.find(({ check }) => check === "res:wire:2");
    expect(wire?.reads[0]).toMatchObject({ number: null, words: [{ word: "OL" }] });
    expect(wire?.reads[1]?.number?.high).toBeLessThan(5);
    expect(wire?.gainBits).toBeGreaterThan(0.8);
    expect(tells.map(({ check }) => check)).toContain("fit:contact:2");
  });

  // Common practice: DC volts cannot tell where a signal line is dead when the device gives no output and nothing else is read.
  it("is nothing for two possibilities that read alike everywhere", () => {
    expect(tellApart(KNOWN, half, [OPEN_2, OPEN_2])).toEqual([]);
  });

  it("still is named when one of them is ruled out, and never one that is taken or cannot be done", () => {
    const tells = tellApart({ ...KNOWN, excluded: ["res:loose:1-gnd"] }, [...half, ["res:wire:2", "OL"]], [OPEN_1, OPEN_2]);
    expect(tells.length).toBeGreaterThan(0);
    expect(tells.map(({ check }) => check)).not.toContain("res:wire:2");
    expect(tells.map(({ check }) => check)).not.toContain("res:loose:1-gnd");
  });

  // A pulse train has a frequency, a potentiometer's volts have none.
  it("works for kinds as for findings", () => {
    const tells = tellApart(UNKNOWN, [["volt:battery", 24.6]], [{ kind: "pwm", fault: NONE }, { kind: "potentiometer", fault: NONE }]);
    const pulses = tells.find(({ check }) => check.startsWith("freq:mated:"));
    expect(pulses?.reads[1]?.words).toEqual([{ word: "none", p: 1 }]);
  });

  // A contact of the connector plays no part in what is read on the parted device, whatever its kind.
  it("leaves out what would only tell the kind", () => {
    const tells = tellApart(UNKNOWN, [["volt:harness:1-gnd", 5], ["volt:harness:3-gnd", 0]], [NONE, { code: "contact-open", pins: [2] }]);
    expect(tells.length).toBeGreaterThan(0);
    expect(tells.filter(({ check }) => check.startsWith("res:device:"))).toEqual([]);
  });

  it("is empty for a possibility that this device cannot be", () => {
    expect(tellApart(KNOWN, half, [NONE, { fault: { code: "wiper-open", pins: [2] } }])).toEqual([]);
  });
});

describe("counting sets", () => {
  it("gives each once, and as many as the binomial coefficients say", () => {
    expect([...setsOfSize(4, 2)]).toEqual([[0, 1], [0, 2], [0, 3], [1, 2], [1, 3], [2, 3]]);
    expect(countUpTo(11, 3)).toBe(11 + 55 + 165);
    expect(countUpTo(5, 5)).toBe(31);
    expect(countUpTo(5, 0)).toBe(0);
  });
});
