import { describe, expect, it } from "vitest";
import { assess, type Expect, type Reading } from "@/lib/diagnosis";
import { SLOW } from "../support/slow";

/**
 * Cases worked by hand. Unless said otherwise the values are Ohm's law with a sound harness (a wire some tenths of an ohm, the
 * meter's leads a quarter), the wiring is common practice, and the finding is what a technician would call it.
 */
const PINS: readonly [string, string, string] = ["1", "2", "3"];
const POT: Expect = { kind: "potentiometer", pins: { supply: 1, ground: 2, signal: 3 }, supplyVolts: 5, totalOhms: 5000, tolerancePercent: 20, signalRatio: { rest: 0.2, full: 0.8 } };
/** Runs from the battery; its open collector pulls down a rail of 12 V behind 2.2 kohm in the controller. */
const OPEN: Expect = { kind: "pwm", pins: { supply: 1, ground: 2, signal: 3 }, supplyVolts: "battery", output: "open-collector", frequencyHz: 500, duty: { rest: 0.2, full: 0.8 } };
const DRIVEN: Expect = { ...OPEN, supplyVolts: 5, output: "push-pull" };
const VOLTS: Expect = { kind: "voltage", pins: { supply: 1, ground: 2, signal: 3 }, supplyVolts: 5, signalVolts: { rest: 0.5, full: 4.5 } };

function standing(readings: readonly Reading[], entry?: Expect) {
  const a = assess(entry ? { pins: PINS, expect: entry } : { pins: PINS }, readings);
  if (a.state === "invalid-input") throw new Error(`${a.message} (${a.where})`);
  return a;
}
const text = (f: { code: string; pins?: readonly number[] }) => (f.pins ? `${f.code}:${f.pins}` : f.code);

/** Wires 1 to 3 whole, and clear of ground and of each other. */
const WHOLE: Reading[] = [["res:wire:1", 0.5], ["res:wire:2", 0.5], ["res:wire:3", 0.6]];
const CLEAR: Reading[] = [["res:loose:1-gnd", "OL"], ["res:loose:2-gnd", "OL"], ["res:loose:3-gnd", "OL"], ["res:loose:1-2", "OL"], ["res:loose:2-3", "OL"], ["res:loose:1-3", "OL"]];
const GRIPS: Reading[] = [["fit:contact:1", "grips"], ["fit:contact:2", "grips"], ["fit:contact:3", "grips"]];
const FEED: Reading[] = [["volt:harness:1-gnd", 5.01], ["volt:harness:2-gnd", 0.001]];
/** 5 kohm with the wiper at 0.2 from ground: 1 k and 4 k; they add up to the track (computed). */
const TRACK: Reading[] = [["res:device:1-2@rest", 5000], ["res:device:2-3@rest", 1050], ["res:device:1-3@rest", 4050]];

const CASES: readonly (readonly [string, Expect, readonly Reading[], string])[] = [
  ["5 V divided at 0.2 and 0.8: 1 V and 4 V, sweeping smoothly", POT, [...FEED, ["volt:mated:1-gnd@rest", 5], ["volt:mated:3-gnd@rest", 1], ["volt:mated:3-gnd@full", 4], ["sweep:mated:3", "smooth"], ["volt:mated:2-gnd@rest", 0.001], ...WHOLE], "none"],
  // Mean of the pulses: 0.2 × 12 + 0.8 × 0.25 = 2.6 V at rest, 0.8 × 12 + 0.2 × 0.25 = 9.65 V at full (45 ohm below 2.2 k: 0.25 V).
  ["a pulsed 12 V at 20 and 80 % duty", OPEN, [["volt:battery", 24.2], ["volt:harness:1-gnd", 24.2], ["volt:harness:3-gnd", 12], ["freq:mated:3@rest", 500], ["duty:mated:3@rest", 0.2], ["duty:mated:3@full", 0.8], ["volt:mated:3-gnd@rest", 2.6], ["volt:mated:3-gnd@full", 9.65]], "none"],
  ["a wire that measures OL from end to end", POT, [["volt:harness:1-gnd", 0], ["res:wire:1", "OL"], ...WHOLE.slice(1)], "wire-open:1"],
  ["a wire of 2.2 kohm from end to end", POT, [["res:wire:1", 0.4], ["res:wire:2", 2200], ["res:wire:3", 0.5]], "wire-resistive:2"],
  ["a loose wire at 0.9 ohm to ground", POT, [...WHOLE, ["res:loose:3-gnd", 0.9], ["res:loose:1-gnd", "OL"]], "short-to-ground:3"],
  ["two loose wires 1.1 ohm from each other", OPEN, [...WHOLE, ["res:loose:1-2", 1.1], ["res:loose:2-3", "OL"]], "wires-shorted:1,2"],
  // Common practice: a wet connector leaks tens of kilohms to a megohm; 120 k from 5 V against 180 k to ground stand at 3 V (divider, computed).
  ["a pulled-down input that stands at 3 V with the device away", POT, [...FEED, ["volt:harness:3-gnd", 3], ["res:harness:3-gnd", 74_000], ["res:loose:1-3", 121_000], ["res:loose:2-3", "OL"], ...WHOLE], "connector-damp:1,3"],
  ["5 V where ground belongs and none where the supply does", POT, [["volt:harness:1-gnd", 0.001], ["volt:harness:2-gnd", 5.01], ["res:harness:1-gnd", 0.6], ...CLEAR.slice(0, 2)], "wires-swapped:1,2"],
  ["supply at the cavity, none in the device, a loose grip", POT, [...FEED, ["volt:mated:1-gnd@rest", 5.01], ["volt:mated:3-gnd@rest", 0], ["volt:mated:3-gnd@full", 0], ...TRACK, ["fit:contact:1", "loose"]], "contact-open:1"],
  ["no supply though its wire is whole and clear", POT, [["volt:harness:1-gnd", 0.001], ["volt:harness:2-gnd", 0], ...WHOLE, ...CLEAR, ["res:harness:1-gnd", 7000]], "supply-missing"],
  ["an input without its pull: nothing at the cavity, whole wire, 20 megohm", OPEN, [["volt:battery", 24.2], ["volt:harness:1-gnd", 24.2], ["volt:harness:3-gnd", 0], ["res:harness:3-gnd", 20e6], ...WHOLE, ...CLEAR], "pull-missing"],
  ["battery volts on the signal of a 5 V device", POT, [["volt:battery", 24.2], ["volt:harness:1-gnd", 5.01], ["volt:harness:3-gnd", 24.2], ["res:loose:1-3", "OL"]], "short-to-battery:3"],
  ["a track that measures, a wiper that does not", POT, [["res:device:1-2@rest", 5000], ["res:device:2-3@rest", "OL"], ["res:device:1-3@rest", "OL"]], "wiper-open"],
  ["a wiper that reaches one end only", POT, [["res:device:1-2@rest", "OL"], ["res:device:2-3@rest", 1050], ["res:device:1-3@rest", "OL"]], "track-open"],
  ["right volts at both ends of travel, jumps between", POT, [...FEED, ["volt:mated:3-gnd@rest", 1], ["volt:mated:3-gnd@full", 4], ["volt:mated:1-gnd@rest", 5], ["sweep:mated:3", "jumps"], ...WHOLE], "track-worn"],
  // Driven low: 0.05 V behind 100 ohm against 5 V behind 20 k leaves 0.05 + 4.95 × 100/20100 = 0.075 V.
  ["an input pulled up to 5 V that the device holds down in both positions", DRIVEN, [...FEED, ["volt:harness:3-gnd", 5], ["res:harness:3-gnd", 22_000], ["volt:mated:1-gnd@rest", 5], ["volt:mated:2-gnd@rest", 0.003], ["volt:mated:3-gnd@rest", 0.075], ["volt:mated:3-gnd@full", 0.075], ["freq:mated:3@rest", "none"], ...WHOLE, ...CLEAR, ...GRIPS], "output-stuck-low"],
  // Stuck high: the driver's 5 V less 0.1 V.
  ["a voltage device that stands near its supply in both positions", VOLTS, [...FEED, ["volt:harness:3-gnd", 0], ["res:harness:3-gnd", 180_000], ["volt:mated:1-gnd@rest", 5], ["volt:mated:3-gnd@rest", 4.9], ["volt:mated:3-gnd@full", 4.9], ...WHOLE, ...CLEAR, ...GRIPS], "output-stuck-high"],
  // 180 k of pull-down against a leak of megohms and no drive: nothing on the line.
  ["a voltage device that gives nothing though it is fed and its wires are whole", VOLTS, [...FEED, ["volt:harness:3-gnd", 0], ["res:harness:3-gnd", 180_000], ["volt:mated:1-gnd@rest", 5], ["volt:mated:2-gnd@rest", 0.002], ["volt:mated:3-gnd@rest", 0], ["volt:mated:3-gnd@full", 0], ...WHOLE, ...CLEAR, ...GRIPS], "output-dead"],
];

describe("a finding worked by hand", SLOW, () => {
  it.each(CASES)("%s", (_, entry, readings, finding) => {
    const { faults } = standing(readings, entry);
    expect(text(faults[0]!), JSON.stringify(faults.slice(0, 3))).toBe(finding);
    expect(faults[0]!.p).toBeGreaterThan(0.8);
  });
});

describe("an unknown device worked by hand", SLOW, () => {
  it("is a potentiometer with its wiper on pin 3: the two parts add up to the track (identity of end, wiper and total resistance)", () => {
    const { kinds, pins } = standing(TRACK);
    expect(kinds[0]).toMatchObject({ kind: "potentiometer" });
    expect(kinds[0]!.p).toBeGreaterThan(0.99);
    expect(pins.filter(({ signal }) => signal === 3).reduce((sum, { p }) => sum + p, 0)).toBeGreaterThan(0.9);
  });

  it("has its supply where the harness gives 5 V and its ground where it is 0.4 ohm to battery negative", () => {
    const { pins } = standing([...TRACK, ["volt:harness:1-gnd", 5.01], ["volt:harness:2-gnd", 0], ["res:harness:2-gnd", 0.4], ["volt:mated:3-gnd@rest", 1.05], ["volt:mated:3-gnd@full", 4]]);
    expect(pins[0]).toMatchObject({ supply: 1, ground: 2, signal: 3 });
    expect(pins[0]!.p).toBeGreaterThan(0.95);
  });

  it("pulses where a frequency is shown: pulse width on that pin, and no other kind", () => {
    const { kinds, pins } = standing([["freq:mated:2@rest", 500.2], ["duty:mated:2@rest", 0.201]]);
    expect(kinds[0]!.kind).toBe("pwm");
    expect(kinds[0]!.p).toBeGreaterThan(0.99);
    expect(pins.filter(({ signal }) => signal === 2).reduce((sum, { p }) => sum + p, 0)).toBeGreaterThan(0.95);
  });
});

describe("what no meter can tell apart", SLOW, () => {
  it("an open collector that never pulls down: its output may be dead or stuck high (README of the bench: some truths read alike)", () => {
    const fed: Reading[] = [["volt:battery", 24.2], ["volt:harness:1-gnd", 24.2], ["volt:harness:3-gnd", 12], ["volt:mated:1-gnd@rest", 24.2], ["volt:mated:2-gnd@rest", 0.002], ["volt:mated:3-gnd@rest", 11.98], ["volt:mated:3-gnd@full", 11.98], ["freq:mated:3@rest", "none"]];
    const { openFindings, faults } = standing([...fed, ...WHOLE, ...CLEAR, ...GRIPS], OPEN);
    expect(new Set(openFindings.slice(0, 2).map(text))).toEqual(new Set(["output-dead", "output-stuck-high"]));
    expect(faults[0]!.p).toBeCloseTo(faults[1]!.p, 6);
  });
});
