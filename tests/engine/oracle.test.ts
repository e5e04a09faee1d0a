import { describe, expect, it } from "vitest";
import { DEFAULT_METER, type Expect, type Reading, type Setup } from "@/lib/diagnosis";
import { beliefs } from "@/lib/diagnosis/assess";
import { P } from "@/lib/diagnosis/circuit/parameters";
import { observe } from "@/lib/diagnosis/inference/observe";
import { fitCandidate } from "@/lib/diagnosis/inference/fit";
import { evidenceOf } from "@/lib/diagnosis/inference/misfit";
import type { Candidate } from "@/lib/diagnosis/circuit/candidate";
import { bruteLogEvidence, gridLogEvidence } from "../support/brute-force";
import { drawer } from "../support/draw";
import { SLOW } from "../support/slow";

/**
 * A slow, plain oracle for the engine's integral over the unknowns (Laplace's method): the same integral by brute force, fixed seed.
 * Compared are differences of log-evidence between hypotheses, which are all that a posterior hangs on. The engine's tail is a little
 * heavier than normal, and Laplace's method is exact only where the model is linear: a factor of two either way is allowed. Not met
 * where a wiper would have to stand at the very end of its track (the third build of the first problem: a factor of four).
 */
const TOLERANCE = Math.log(2), WORTH = 7;
const PINS: Setup = { pins: ["1", "2", "3"] };
const POT: Expect = { kind: "potentiometer", pins: { supply: 1, ground: 2, signal: 3 }, supplyVolts: 5, totalOhms: 5000, tolerancePercent: 20, signalRatio: { rest: 0.2, full: 0.8 } };

const PROBLEMS: readonly (readonly [string, Setup, readonly Reading[], number])[] = [
  ["ohms of a potentiometer that nobody knows", PINS, [["res:device:1-2@rest", 5010], ["res:device:2-3@rest", 1052], ["res:device:1-3@rest", 4049]], 2],
  ["ohms of a potentiometer with 1 kohm before its wiper", PINS, [["res:device:1-2@rest", 4710], ["res:device:2-3@rest", 3290], ["res:device:1-3@rest", 3420]], 3],
  ["volts of a harness", PINS, [["volt:harness:1-gnd", 5.01], ["volt:harness:2-gnd", 0.001], ["volt:harness:3-gnd", 4.86]], 4],
  ["a supply wire with a bad joint, or a weak supply", { ...PINS, expect: POT }, [["volt:harness:1-gnd", 4.97], ["volt:mated:1-gnd@rest", 4.02], ["volt:mated:3-gnd@rest", 0.81]], 4],
  ["signal held at 5 V, mated", { ...PINS, expect: POT }, [["volt:harness:3-gnd", 4.86], ["volt:mated:3-gnd@rest", 4.99], ["volt:mated:3-gnd@full", 5]], 4],
];

/** The likeliest builds, `most` of them at most, each with an evidence of its own: builds that these readings see alike count once. */
function likeliest(setup: Setup, readings: readonly Reading[], most: number): Candidate[] {
  const list = beliefs(setup, readings), best = list[0]!.logWeight, seen = new Set<string>();
  return list.filter((b) => b.logWeight > best - WORTH).map((b) => b.candidate).filter((c) => {
    const key = fitted(c, readings).toFixed(6);
    return !seen.has(key) && seen.add(key) !== null;
  }).slice(0, most);
}

const fitted = (c: Candidate, readings: readonly Reading[]) => fitCandidate(c, evidenceOf(observe(readings, DEFAULT_METER), DEFAULT_METER), new Float64Array(c.ranges.mean.length)).logEvidence;

describe("the engine's integral against brute force", SLOW, () => {
  it.each(PROBLEMS)("%s", (_, setup, readings, most) => {
    const list = likeliest(setup, readings, most), draw = drawer(1_618);
    expect(list.length).toBeGreaterThan(1);
    const gaps = list.map((c) => fitted(c, readings) - bruteLogEvidence(c, readings, draw));
    list.forEach((c, i) => expect(Math.abs(gaps[i]! - gaps[0]!), `${c.hypothesis.id} ${c.pull} against ${list[0]!.hypothesis.id}: ${gaps.map((g) => g.toFixed(2))}`).toBeLessThan(TOLERANCE));
  });

  it("one unknown alone, a bad joint's ohms, summed over a grid", () => {
    const readings: Reading[] = [["res:wire:2", 2200]], bad = beliefs(PINS, readings).find((b) => b.candidate.code === "wire-resistive")!.candidate;
    const grid = gridLogEvidence(bad, readings, P.fault);
    expect(Math.abs(fitted(bad, readings) - grid)).toBeLessThan(0.05);
    expect(Math.abs(bruteLogEvidence(bad, readings, drawer(2)) - grid)).toBeLessThan(0.25);
  });
});
