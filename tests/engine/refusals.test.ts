import { describe, expect, it } from "vitest";
import { answerRequest, assess, type Expect, type OtherDevice, type Reading } from "@/lib/diagnosis";
import { benchCases, everyNth } from "../support/bench";
import { SLOW } from "../support/slow";

/** Devices that are none of the three kinds, by readings whose numbers come from the standards named beside them. */
const PINS: readonly [string, string, string] = ["1", "2", "3"];
const POT: Expect = { kind: "potentiometer", pins: { supply: 1, ground: 2, signal: 3 }, supplyVolts: 5, totalOhms: 5000, tolerancePercent: 20, signalRatio: { rest: 0.2, full: 0.8 } };

function standing(readings: readonly Reading[], entry?: Expect) {
  const a = assess(entry ? { pins: PINS, expect: entry } : { pins: PINS }, readings);
  if (a.state === "invalid-input") throw new Error(`${a.message} (${a.where})`);
  return a;
}
/** 24 V fed to cavity 1, cavity 2 at battery negative (common practice for industrial sensors on mobile plant). */
const FEED_24: Reading[] = [["volt:harness:1-gnd", 24.1], ["volt:harness:2-gnd", 0.001], ["res:harness:2-gnd", 0.5]];
const FEED_5: Reading[] = [["volt:harness:1-gnd", 5.02], ["volt:harness:2-gnd", 0.001], ["volt:harness:3-gnd", 4.98]];

const CASES: readonly (readonly [string, OtherDevice, readonly Reading[]])[] = [
  // NAMUR NE43: 3.8 to 20.5 mA; 4.0 and 20.0 mA across 250 ohm are 1.00 and 5.00 V (Ohm's law).
  ["4 and 20 mA across 250 ohm", "current-loop", [["res:device:2-3@rest", "OL"], ["volt:harness:1-gnd", 24.1], ["volt:harness:2-gnd", 0], ["res:harness:2-gnd", 250.4], ["volt:mated:2-gnd@rest", 1], ["volt:mated:2-gnd@full", 5], ["freq:mated:2@rest", "none"]]],
  // 7.2 and 16.8 mA across 120 ohm are 0.864 and 2.016 V (Ohm's law).
  ["7.2 and 16.8 mA across 120 ohm, plus on pin 3", "current-loop", [["res:device:1-2@rest", "OL"], ["volt:harness:3-gnd", 18.2], ["res:harness:1-gnd", 120.6], ["volt:mated:1-gnd@rest", 0.864], ["volt:mated:1-gnd@full", 2.016], ["volt:mated:2-gnd@rest", 0.001]]],
  // Common practice: a PNP output gives its supply less 0.5 to 2.5 V, and lets the line fall to 0 V.
  ["0 V, then 24 V less 1.5 V, at one place of the travel", "switch-pnp", [...FEED_24, ["volt:harness:3-gnd", 0], ["res:harness:3-gnd", 4700], ["volt:mated:3-gnd@rest", 0.02], ["volt:mated:3-gnd@full", 22.6], ["freq:mated:3@full", "none"], ["sweep:mated:3", "jumps"]]],
  // Common practice: an NPN output pulls a line that the controller holds up to under 2 V.
  ["24 V, then 0.9 V, at one place of the travel", "switch-npn", [...FEED_24, ["volt:harness:3-gnd", 24.1], ["res:harness:3-gnd", 4700], ["volt:mated:3-gnd@rest", 24.1], ["volt:mated:3-gnd@full", 0.9], ["freq:mated:3@rest", "none"], ["freq:mated:3@full", "none"], ["duty:mated:3@full", "none"], ["sweep:mated:3", "jumps"]]],
  // SAE J2716: nibbles of 12 to 27 ticks of 3 microseconds; 23 ticks a pulse on average are 14.5 kHz, 5 of them low are 22 % (computed).
  ["unsteady 13 to 14 kHz at a duty that hardly follows", "edge-protocol", [...FEED_5, ["volt:mated:3-gnd@rest", 3.62], ["volt:mated:3-gnd@full", 3.56], ["freq:mated:3@rest", 14_200], ["freq:mated:3@full", 12_900], ["duty:mated:3@rest", 0.77], ["duty:mated:3@full", 0.76]]],
  // The same with ticks of 90 microseconds: 1 / (23 × 90 us) = 483 Hz (computed), within the range of PWM.
  ["480 Hz at a duty that does not follow at all", "edge-protocol", [...FEED_5, ["volt:mated:3-gnd@rest", 3.6], ["volt:mated:3-gnd@full", 3.55], ["freq:mated:3@rest", 480], ["freq:mated:3@full", 450], ["duty:mated:3@rest", 0.77], ["duty:mated:3@full", 0.765]]],
  // ISO 11898-2: 2.5 V on both lines when recessive, 60 ohm between them.
  ["two lines near 2.5 V with 60 ohm between them", "can-pair", [["res:device:1-2@rest", 60.2], ["res:device:1-3@rest", "OL"], ["res:device:2-3@rest", "OL"], ["volt:harness:1-gnd", 2.55], ["volt:harness:2-gnd", 2.44], ["volt:mated:1-gnd@rest", 2.61], ["volt:mated:2-gnd@rest", 2.38], ["volt:mated:1-gnd@full", 2.62], ["volt:mated:2-gnd@full", 2.39], ["volt:mated:3-gnd@rest", 0.002]]],
  // A sine of 50 Hz: no mean, half of the period above it (common practice).
  ["50 Hz at half duty without any DC", "mains", [["freq:mated:1@rest", 50], ["duty:mated:1@rest", 0.5], ["volt:mated:1-gnd@rest", 0.01], ["volt:mated:2-gnd@rest", 0]]],
];

/** A stuck open collector read once on the pin beside looks much the same as a switch to ground: named first, but not sure. */
const LESS_SURE: Readonly<Partial<Record<OtherDevice, number>>> = { "switch-npn": 0.85 };

describe("a device that is none of the three kinds", SLOW, () => {
  it.each(CASES)("%s: %s", (_, device, readings) => {
    const a = standing(readings);
    expect(a.others[0]?.device, JSON.stringify(a.faults.slice(0, 2))).toBe(device);
    expect(a.others[0]!.p).toBeGreaterThan(LESS_SURE[device] ?? 0.95);
    expect(a.state).toBe("ranked");
    expect([...a.kinds, ...a.others].reduce((sum, { p }) => sum + p, 0)).toBeCloseTo(1, 5);
  });

  it("is found though an entry names another, and said to other programs", () => {
    const [, , readings] = CASES[0]!;
    expect(standing(readings, POT).others[0]).toMatchObject({ device: "current-loop" });
    expect(answerRequest({ setup: { pins: PINS }, readings })).toMatchObject({ others: [{ device: "current-loop" }], done: true });
  });

  it("is not what any machine of the bench is said to be, all readings at hand or a few", () => {
    for (const c of everyNth(benchCases(), 16)) for (const count of [4, 9, 55]) {
      const readings = Object.entries(c.readings).slice(0, count) as Reading[], answer = answerRequest({ setup: c.setup, readings });
      expect(answer, c.id).not.toHaveProperty("others");
      expect(standing(readings).others.every(({ p }) => p < 0.01), c.id).toBe(true);
    }
  });
});

describe("readings above the limits of the tool", SLOW, () => {
  // Warnings of hand-held meters; voltage class B of ISO 6469-3: above 60 V d.c.
  it.each([[60, false], [-60, false], [60.1, true], [-72, true], [400, true]])("%d V d.c.: the check ends there: %s", (volts, ends) => {
    const a = standing([["volt:mated:1-gnd@rest", volts], ["volt:mated:2-gnd@rest", 0.001]]);
    expect(a.overLimit).toEqual(ends ? { check: "volt:mated:1-gnd@rest", value: volts } : null);
    if (ends) expect([a.done, a.next]).toEqual([true, []]);
  });
});
