import { describe, expect, it } from "vitest";
import { vocabulary, type Expect, type Reading } from "@/lib/diagnosis";
import { judge, judgeInSlices } from "./judge";
import type { RunSetup, RunStep } from "./run";
import { verdictColumns } from "./verdict-columns";
import { SURE } from "./verdict-sentence";

const SETUP: RunSetup = { cavityLabels: ["A", "B", "C"] };
const POT: Expect = { kind: "potentiometer", pins: { supply: 1, ground: 3, signal: 2 }, supplyVolts: 5, totalOhms: 5000, tolerancePercent: 10, signalRatio: { rest: 0.1, full: 0.9 }, wiperSeriesOhms: 0 };
const id = (n: number) => `01J0000000000000000000${String(1000 + n)}`;
const AT = "2026-03-01T08:00:00Z";
const steps = (readings: readonly Reading[]): RunStep[] => readings.map(([check, value], i) => ({ id: id(i), at: AT, type: "reading", check, value, typed: "" }));
const verdictOf = (readings: readonly Reading[], expect?: Expect) => judge({ setup: { ...SETUP, ...(expect ? { expect } : {}) }, steps: steps(readings) }).verdict;

/** The divider of 5 kΩ at 0.9 of 5 V and a harness whose wire B is open. [computed; harness values common practice] */
const OPEN_B: readonly Reading[] = [["res:device:1-3@rest", 5010], ["res:device:1-2@rest", 4560], ["volt:harness:1-3", 5], ["volt:harness:1-2", 0], ["res:wire:2", "OL"], ["res:wire:1", 0.2], ["res:wire:3", 0.2]];

/** A voltage device whose signal wire lies on ground; ohms of powered electronics, from memory. With the signal at 0 V there is no output to tell by. */
const SHORTED_SIGNAL: readonly Reading[] = [
  ["res:device:3-1@full", 222_500], ["res:device:1-2@full", "OL"], ["res:harness:2-gnd", 35_880], ["res:harness:3-gnd", 1.2], ["res:harness:1-gnd", 0.4], ["res:loose:3-gnd", 1.4], ["volt:harness:1-3", -0.002],
];

describe("the verdict on a run", () => {
  it("names the wire, with evidence that says why", () => {
    const verdict = verdictOf(OPEN_B, POT);
    expect(verdict.sentence).toContain("the wire of cavity B (signal) is open");
    expect(verdict.short).toBe("Wire to B open.");
    expect(verdict.evidenceFinding).toEqual({ code: "wire-open", pins: [2] });
    const wire = verdict.evidence.find((row) => row.check === "res:wire:2");
    expect(wire?.ifFinding.words[0]?.word).toBe("OL");
    expect(wire?.ifSound.number?.high).toBeLessThan(10);
    expect(verdict.advice[0]?.prove.join(" ")).toContain("wire B end to end");
  });

  it("sets the next likeliest finding against a sound machine, and asks for no part", () => {
    const sound: readonly Reading[] = [["volt:mated:2-gnd@full", 4.5], ["volt:mated:3-gnd@rest", 0], ["sweep:mated:2", "smooth"], ["volt:harness:1-2", 4.97], ["res:wire:2", 0.2], ["fit:contact:1", "grips"], ["fit:contact:2", "grips"], ["fit:contact:3", "grips"]];
    const verdict = verdictOf(sound, POT);
    expect(verdict.openFindings.map((f) => f.code)).toEqual(["none"]);
    expect(verdict.sentence).toContain("every reading fits a sound device and sound wiring");
    expect(verdict.evidenceFinding?.code).not.toBe("none");
    expect(verdict.advice[0]?.next.join(" ")).not.toMatch(/renew/i);
  });

  it("after one reading asserts nothing, and says what would tell the rest apart", () => {
    const verdict = verdictOf([["volt:battery", 24.6]]);
    expect(verdict.sentence).not.toMatch(/^It is/);
    expect(verdict.openFindings.length).toBeGreaterThan(1);
    expect(verdict.inseparable).toBe(false);
    const known = new Set(vocabulary().map((spec) => spec.code));
    expect(verdict.tellApart.length).toBeGreaterThan(0);
    expect(verdict.tellApart.every((next) => known.has(next.check))).toBe(true);
  });

  it("counts a skipped check among what would tell the rest apart: it could be made elsewhere", () => {
    const readings: readonly Reading[] = [["volt:mated:2-gnd@full", 4.98], ["volt:mated:1-gnd@rest", 5]];
    const best = verdictOf(readings, POT).tellApart[0]?.check;
    if (!best) throw new Error("the readings leave nothing open");
    const skip: RunStep = { id: id(50), at: AT, type: "skip", check: best, reason: "cannot-reach" };
    const { verdict } = judge({ setup: { ...SETUP, expect: POT }, steps: [...steps(readings), skip] });
    expect(verdict.tellApart.map((next) => next.check)).toContain(best);
    expect(verdict.inseparable).toBe(false);
  });

  it("gives no advice on repairs while the readings contradict each other", () => {
    const slipped = OPEN_B.map(([check, value]): Reading => (check === "res:device:1-2@rest" ? [check, 45_600] : [check, value]));
    const verdict = verdictOf([...slipped, ["res:device:2-1@rest", 4561], ["res:device:3-1@rest", 5008], ["res:device:2-3@rest", 560]], POT);
    expect(verdict.contradictory).toBe(true);
    expect(verdict.advice).toEqual([]);
    expect(verdict.short).toBe("Readings contradict each other.");
    expect(verdict.suspects.map((s) => s.check)).toContain("res:device:1-2@rest");
    expect(verdict.carrying).toBeNull();
    expect(verdict.evidence.every((row) => row.factor === null)).toBe(true);
  });

  it("is the same for the same steps, sent in any order, with a reading that was taken back left out", () => {
    const wrong: RunStep = { id: id(60), at: AT, type: "reading", check: "res:wire:1", value: "OL", typed: "OL" };
    const undo: RunStep = { id: id(61), at: AT, type: "retract", step: wrong.id };
    const plain = verdictOf(OPEN_B, POT);
    const again = judge({ setup: { ...SETUP, expect: POT }, steps: [undo, wrong, ...steps(OPEN_B)].reverse() }).verdict;
    expect(again).toEqual(plain);
  });

  it("holds open findings of at least 95 % together", () => {
    const { openFindings } = verdictOf(OPEN_B.slice(0, 3), POT);
    expect(openFindings.reduce((sum, f) => sum + f.p, 0)).toBeGreaterThanOrEqual(SURE);
  });

  it("keeps the evidence for every finding still open and for sound, and the readings that carry it", () => {
    const verdict = verdictOf(OPEN_B, POT);
    expect(verdict.explained.map(({ finding }) => finding.code)).toEqual(["wire-open", "none"]);
    expect(verdict.explained[0]?.rows).toEqual(verdict.evidence);
    expect(verdict.carrying?.checks).toContain("res:wire:2");
    expect(verdict.engineVersion).toBe("3");
  });

  it("leaves the kind open where a shorted signal hides it, and says so", () => {
    const verdict = judge({ setup: { cavityLabels: ["1", "2", "3"] }, steps: steps(SHORTED_SIGNAL) }).verdict;
    expect(verdict.tellKindsApart?.map(({ check }) => check)).toEqual(["volt:mated:1-gnd@full", "volt:mated:3-gnd@full"]);
    expect(verdict.sentence).toMatch(/^The wire of cavity 3 \(signal\) is shorted to ground; .* is either an analogue voltage device or a PWM device, which the readings so far do not tell\.$/);
    expect(verdictColumns(verdict)).toMatchObject({ kind: null, findingCode: "short-to-ground" });
    expect(verdictOf(OPEN_B, POT).tellKindsApart).toBeNull();
    expect(verdictColumns(verdictOf(OPEN_B, POT)).kind).toBe("potentiometer");
  });

  it("comes out the same in slices", async () => {
    const run = { setup: { ...SETUP, expect: POT }, steps: steps(OPEN_B) };
    expect(await judgeInSlices(run)).toEqual(judge(run));
  });

  it("needs a reading", () => {
    expect(() => judge({ setup: SETUP, steps: [] })).toThrow("at least one reading");
  });
});
