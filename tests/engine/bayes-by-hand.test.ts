import { describe, expect, it } from "vitest";
import { assess, FINDING_PRIORS, type Expect, type Reading, type Setup } from "@/lib/diagnosis";
import { SLOW } from "../support/slow";

/** Bayes' rule by hand where a reading's chances are plain numbers. Sources beside each test. */
const POT: Expect = { kind: "potentiometer", pins: { supply: 1, ground: 2, signal: 3 }, supplyVolts: 5, totalOhms: 5000, tolerancePercent: 20, signalRatio: { rest: 0.2, full: 0.8 } };
const setup: Setup = { pins: ["1", "2", "3"], expect: POT };
const standing = (readings: readonly Reading[], s: Setup = setup) => {
  const a = assess(s, readings);
  if (a.state === "invalid-input") throw new Error(a.message);
  return a;
};
const chances = (a: ReturnType<typeof standing>) => new Map(a.hypotheses.map(({ hypothesis, p }) => [hypothesis.id, p]));

/** Sound 5 V potentiometer of 5 kohm, wiper at 0.2: 5 V in, 0 V, 1 V out (Ohm's law; the meter's leads add 0.25 ohm). */
const HARNESS: Reading[] = [["volt:harness:1-gnd", 5.003], ["volt:harness:2-gnd", 0.001], ["volt:harness:3-gnd", 0.002]];
const MATED: Reading[] = [["volt:mated:1-gnd@rest", 5.001], ["volt:mated:2-gnd@rest", 0.002], ["volt:mated:3-gnd@rest", 0.998], ["volt:mated:3-gnd@full", 3.995]];

describe("a contact tried for its grip", SLOW, () => {
  // Source: README of the bench: a bad contact reads "loose" 95 times in 100, a sound one 3.
  const bad = (id: string, pin: number) => id.endsWith(`/contact-open:${pin}`);

  it.each([["grips", 0.05, 0.97], ["loose", 0.95, 0.03]] as const)("that %s weighs the findings %d to %d", (word, ifBad, ifSound) => {
    const before = standing(HARNESS), after = chances(standing([...HARNESS, ["fit:contact:1", word]]));
    const weighed = before.hypotheses.map(({ hypothesis, p }) => ({ id: hypothesis.id, p: p * (bad(hypothesis.id, 1) ? ifBad : ifSound) }));
    const total = weighed.reduce((sum, { p }) => sum + p, 0);
    for (const { id, p } of weighed) expect(Math.abs((after.get(id) ?? 0) - p / total), id).toBeLessThan(2e-6);
  });
});

describe("a reading that everything still believed expects alike changes nothing", SLOW, () => {
  it("no frequency on a potentiometer's pin: no hypothesis of the entry pulses", () => {
    const before = chances(standing([...HARNESS, ...MATED.slice(0, 3)]));
    const after = chances(standing([...HARNESS, ...MATED.slice(0, 3), ["freq:mated:3@rest", "none"], ["duty:mated:1@full", "none"]]));
    expect(after.size).toBe(before.size);
    for (const [id, p] of before) expect(Math.abs(after.get(id)! - p), id).toBeLessThan(1e-9);
  });

  it("the battery's volts, once nothing believed has the battery in its circuit (Ohm's law: 5 V supply of its own)", () => {
    const wires: Reading[] = [["res:loose:1-gnd", "OL"], ["res:loose:2-gnd", "OL"], ["res:loose:3-gnd", "OL"]];
    const before = chances(standing([...HARNESS, ...MATED, ...wires]));
    for (const [id, p] of before) if (id.includes("short-to-battery")) expect(p).toBeLessThan(1e-6);
    for (const volts of [12.6, 27.4]) {
      const after = chances(standing([...HARNESS, ...MATED, ...wires, ["volt:battery", volts]]));
      // Hypotheses of a few parts in ten thousand may be dropped early or kept: as much may move.
      for (const [id, p] of before) expect(Math.abs((after.get(id) ?? 0) - p), id).toBeLessThan(5e-4);
    }
  });
});

describe("chances before the first reading", SLOW, () => {
  it("are the same for the six orders of pins of an unknown device (symmetry)", () => {
    const { pins } = standing([], { pins: ["1", "2", "3"] });
    expect(pins).toHaveLength(6);
    for (const { p } of pins) expect(p).toBeCloseTo(1 / 6, 9);
  });

  it("are the same for the places of one finding (symmetry)", () => {
    const { faults } = standing([], { pins: ["1", "2", "3"] });
    for (const code of ["wire-open", "wire-resistive", "short-to-battery", "wires-shorted", "wires-swapped", "contact-open"]) {
      const places = faults.filter((f) => f.code === code);
      expect(places).toHaveLength(3);
      for (const { p } of places) expect(p).toBeCloseTo(places[0]!.p, 9);
    }
  });

  it("are those of the published table, shared out among the findings that a potentiometer can have (computed from the table)", () => {
    // A damp connector is looked at when a verdict is near.
    const can = FINDING_PRIORS.filter(({ code }) => !code.startsWith("output-") && code !== "connector-damp"), whole = can.reduce((sum, { share }) => sum + share, 0), { faults } = standing([]);
    for (const { code, share } of can) expect(faults.filter((f) => f.code === code).reduce((sum, { p }) => sum + p, 0), code).toBeCloseTo(share / whole, 9);
    expect(faults.some(({ code }) => code.startsWith("output-"))).toBe(false);
  });

  it("leave open the fewest findings that hold 95 % together (by its definition)", () => {
    for (const entry of [POT, undefined]) {
      const { openFindings, faults } = standing([], entry ? setup : { pins: ["1", "2", "3"] }), sum = (list: typeof faults) => list.reduce((total, { p }) => total + p, 0);
      expect(openFindings).toEqual(faults.slice(0, openFindings.length));
      expect(sum(openFindings)).toBeGreaterThanOrEqual(0.95);
      expect(sum(openFindings.slice(0, -1))).toBeLessThan(0.95);
    }
  });

  it("put an entry's kind and pins at 1", () => {
    const { kinds, pins } = standing([]);
    expect(kinds[0]?.kind).toBe("potentiometer");
    expect(kinds[0]?.p).toBeCloseTo(1, 12);
    expect(pins).toHaveLength(1);
  });
});
