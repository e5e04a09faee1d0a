import { describe, expect, it } from "vitest";
import { assess, optionalVocabulary, parseCheck, vocabulary, type Expect, type Fault, type Reading, type ReadingValue, type Setup } from "@/lib/diagnosis";
import { hintFactor } from "@/lib/diagnosis/hints";
import { benchCases, everyNth } from "../support/bench";
import { followCheck } from "../support/run-check";
import { SLOW } from "../support/slow";

/** Readings that nobody is asked for: half way, AC volts, colours of wires, the controller's message. */
const PINS: readonly [string, string, string] = ["1", "2", "3"];
const POT: Expect = { kind: "potentiometer", pins: { supply: 1, ground: 2, signal: 3 }, supplyVolts: 5, totalOhms: 5000, tolerancePercent: 20, signalRatio: { rest: 0.2, full: 0.8 } };
const WHOLE: Reading[] = [["res:wire:1", 0.5], ["res:wire:2", 0.5], ["res:wire:3", 0.6]];

function standing(readings: readonly Reading[], setup: Partial<Setup> = {}) {
  const a = assess({ pins: PINS, ...setup }, readings);
  if (a.state === "invalid-input") throw new Error(`${a.message} (${a.where})`);
  return a;
}
const chance = (a: ReturnType<typeof standing>, code: Fault["code"]) => a.faults.filter((f) => f.code === code).reduce((sum, { p }) => sum + p, 0);

describe("the planner", SLOW, () => {
  it("never asks for an optional reading, whatever is excluded", () => {
    for (const c of everyNth(benchCases(), 40)) {
      const run = followCheck((readings) => {
        const a = standing(readings, c.setup);
        for (const { check } of a.next) expect(parseCheck(check)?.optional, check).toBe(false);
        return a;
      }, (check) => c.readings[check]);
      expect(run.invalid).toBeNull();
    }
    expect(standing([], { excluded: vocabulary().map(({ code }) => code) }).next).toEqual([]);
  });

  it("asks for those of circuits where the setup says so, never for what is only looked at", () => {
    const next = standing([["res:device:2-3@rest", 1050]], { proposeOptional: true, excluded: vocabulary().map(({ code }) => code) }).next.map(({ check }) => parseCheck(check)!);
    expect(next.length).toBeGreaterThan(0);
    for (const spec of next) expect([spec.optional, spec.meter === "look"]).toEqual([true, false]);
  });

  it("takes every optional reading out of turn", () => {
    for (const spec of optionalVocabulary()) {
      const value: ReadingValue = spec.unit === "ohm" ? 2500 : spec.unit === "volt" ? 2.5 : spec.unit === "ratio" ? 0.5 : spec.words[3]!;
      expect(standing([[spec.code, value]]).state, spec.code).not.toBe("contradictory");
    }
  });
});

describe("the actuator half way", SLOW, () => {
  // Linear between 0.2 and 0.8 of 5 V: 2.5 V half way; by eye and with some dead travel a few tenths off (common practice).
  const ends: Reading[] = [["volt:harness:1-gnd", 5.01], ["volt:mated:1-gnd@rest", 5], ["volt:mated:3-gnd@rest", 1], ["volt:mated:3-gnd@full", 4]];
  it.each([2.5, 2.2, 2.9])("%d V between 1 and 4 V fits", (volts) => {
    const a = standing([...ends, ["volt:mated:3-gnd@half", volts]], { expect: POT });
    expect(a.state).toBe("ranked");
    expect(a.faults[0]!.code).toBe("none");
  });

  it("0.1 V between 1 and 4 V speaks for a worn track", () => {
    const without = standing([...ends, ...WHOLE], { expect: POT }), half = standing([...ends, ...WHOLE, ["volt:mated:3-gnd@half", 0.1]], { expect: POT });
    expect(chance(half, "track-worn")).toBeGreaterThan(5 * chance(without, "track-worn"));
  });

  it("OL from the wiper half way, with both ends of travel sound, speaks for a worn track", () => {
    const ohms: Reading[] = [["res:device:2-3@rest", 1050], ["res:device:2-3@full", 4050]];
    expect(standing([...ohms, ["res:device:2-3@half", "OL"]], { expect: POT }).faults[0]!.code).toBe("track-worn");
  });

  it("gives ohms and duty midway", () => {
    expect(standing([["res:device:2-3@rest", 1050], ["res:device:2-3@half", 2550], ["res:device:2-3@full", 4050]], { expect: POT }).state).toBe("ranked");
    const pulses: Reading[] = [["freq:mated:3@rest", 500], ["duty:mated:3@rest", 0.1], ["duty:mated:3@full", 0.9]];
    expect(standing([...pulses, ["duty:mated:3@half", 0.52]]).kinds[0]!.kind).toBe("pwm");
    expect(standing([...pulses, ["duty:mated:3@half", 0.52]]).state).toBe("ranked");
  });
});

describe("AC volts", SLOW, () => {
  // A pulse train of 12 V at 20 %: 12 × root(0.2 × 0.8) = 4.8 V rms, 2.22 × 12 × 0.16 = 4.26 V on a meter that averages (computed); 2.4 V mean.
  it.each([4.8, 4.26])("of %d V with a mean of 2.4 V point to pulses, without any frequency read", (ac) => {
    const a = standing([["volt:harness:3-gnd", 12], ["volt:mated:3-gnd@rest", 2.6], ["ac:mated:3", ac]]);
    expect(a.kinds[0]).toMatchObject({ kind: "pwm" });
    expect(a.kinds[0]!.p).toBeGreaterThan(0.95);
  });

  it("of nothing speak against pulses", () => {
    const before = standing([["volt:mated:3-gnd@rest", 2.6]]), after = standing([["volt:mated:3-gnd@rest", 2.6], ["ac:mated:3", 0.004]]);
    const pwm = (a: typeof before) => a.kinds.find(({ kind }) => kind === "pwm")!.p;
    // Not to nothing: a pulsing output may be broken, or its wire.
    expect(pwm(after)).toBeLessThan(0.7 * pwm(before));
  });

  // Warnings of hand-held meters; voltage class B of ISO 6469-3: above 30 V a.c.
  it.each([[30, false], [30.5, true], [231, true]] as const)("of %d V end the check: %s", (volts, ends) => {
    expect(standing([["ac:mated:1", volts], ["volt:mated:1-gnd@rest", 0.02]]).overLimit !== null).toBe(ends);
  });

  it("of 24 V at 50 Hz without DC are a transformer's", () => {
    expect(standing([["ac:mated:1", 24.3], ["volt:mated:1-gnd@rest", 0.02], ["freq:mated:1@rest", 50]]).others[0]).toMatchObject({ device: "mains" });
  });
});

const FACTORS: readonly Fault[] = [{ code: "none" }, { code: "wire-open", pins: [3] }, { code: "short-to-ground", pins: [3] }, { code: "short-to-battery", pins: [3] }, { code: "track-worn" }, { code: "contact-open", pins: [1] }];
const PIN_ORDER = { supply: 1, ground: 2, signal: 3 } as const;

describe("the controller's own message", SLOW, () => {
  const factor = (message: number, fault: Fault) => hintFactor([["fmi:controller", `FMI ${message}`]], PIN_ORDER, fault);
  // SAE J1939-73; section 7 of the check values: 3 and 4 never discriminate open from short by themselves.
  it.each([3, 4])("FMI %d gives an open and a short the same", (message) => {
    expect(factor(message, FACTORS[1]!)).toBe(factor(message, FACTORS[2]!));
    expect(factor(message, FACTORS[1]!)).toBe(factor(message, FACTORS[3]!));
    expect(factor(message, FACTORS[1]!)).toBeGreaterThan(factor(message, FACTORS[0]!));
  });

  it("goes with what its text says: 2 erratic, 5 open, 6 grounded; 11 and those reserved say nothing", () => {
    expect(factor(2, { code: "track-worn" })).toBeGreaterThan(factor(2, { code: "short-to-ground", pins: [3] }));
    expect(factor(5, { code: "wire-open", pins: [3] })).toBeGreaterThan(factor(5, { code: "short-to-ground", pins: [3] }));
    expect(factor(6, { code: "short-to-ground", pins: [3] })).toBeGreaterThan(factor(6, { code: "wire-open", pins: [3] }));
    for (const message of [11, 22, 30, 31]) expect(new Set(FACTORS.map((fault) => factor(message, fault)))).toEqual(new Set([1]));
  });

  it("is never decisive: within a factor of three, and no check ends by it", () => {
    for (let message = 0; message < 32; message++) {
      for (const fault of FACTORS) expect(factor(message, fault)).toBeLessThanOrEqual(3);
      expect(standing([["fmi:controller", `FMI ${message}`]]).done).toBe(false);
    }
    const open: Reading[] = [["res:wire:3", "OL"]];
    expect(standing([...open, ["fmi:controller", "FMI 5"]], { expect: POT }).done).toBe(standing(open, { expect: POT }).done);
  });

  it("takes 0 to 31 and nothing else", () => {
    for (const word of ["FMI 32", "FMI -1", "3", "FMI 03"]) expect(assess({ pins: PINS }, [["fmi:controller", word as ReadingValue]]).state).toBe("invalid-input");
  });
});

describe("colours of wires", SLOW, () => {
  // Letters of IEC 60757; black and brown often ground, red supply (common practice).
  it("are a hint at roles: red supply, black ground", () => {
    const a = standing([["colour:1", "RD"], ["colour:2", "BK"], ["colour:3", "WH"]]);
    expect(a.pins[0]).toMatchObject(PIN_ORDER);
    expect(a.pins[0]!.p).toBeGreaterThan(1 / 6);
    expect(a.pins[0]!.p).toBeLessThan(0.6);
    expect(a.done).toBe(false);
  });

  it("never outweigh a reading: 5 V on the black wire's cavity, ground on the red one's", () => {
    const volts: Reading[] = [["volt:harness:1-gnd", 0.001], ["volt:harness:2-gnd", 5.01], ["res:harness:1-gnd", 0.5], ["res:device:1-2@rest", 5000], ["res:device:2-3@rest", 3950], ["volt:mated:3-gnd@rest", 1], ["volt:mated:3-gnd@full", 4]];
    expect(standing([...volts, ["colour:1", "RD"], ["colour:2", "BK"], ["colour:3", "WH"]]).pins[0]).toMatchObject({ supply: 2, ground: 1 });
  });

  it("together with a message stay within a factor of three", () => {
    const hints: Reading[] = [["colour:1", "RD"], ["colour:2", "BN"], ["colour:3", "GN"], ["fmi:controller", "FMI 5"]];
    expect(hintFactor(hints, PIN_ORDER, { code: "wire-open", pins: [3] })).toBe(3);
    expect(hintFactor(hints, { supply: 2, ground: 3, signal: 1 }, { code: "none" })).toBeCloseTo(1 / 3, 12);
  });
});
