import { describe, expect, it } from "vitest";
import { OTHER_DEVICES, type Reading } from "@/lib/diagnosis";
import { DEFERRAL } from "./advice";
import { judge } from "./judge";
import { isDangerous, refusalOf, shortRefusal } from "./refusal";
import { refusalSentence, refusalSteps } from "./refusal-advice";
import type { RunStep } from "./run";
import { verdictColumns } from "./verdict-columns";

const LABELS = ["A", "B", "C"] as const;
const steps = (readings: readonly Reading[]): RunStep[] => readings.map(([check, value], i) => ({ id: `01J0000000000000000000000${i}`, at: "2026-03-01T08:00:00Z", type: "reading", check, value, typed: String(value) }));

describe("a refusal", () => {
  it.each(OTHER_DEVICES.map((device) => [device]))("of %s says in whole sentences what to do, and who decides", (device) => {
    const refusal = refusalOf({ others: [{ device, p: 0.97 }], overLimit: null })!;
    for (const line of refusalSteps(refusal)) expect(line).toMatch(/^[A-Z].*\.$/);
    expect(refusalSteps(refusal).at(-1)).toBe(DEFERRAL);
    expect(refusalSentence({ others: [{ device, p: 0.97 }], overLimit: null }, LABELS)).toMatch(/^Not one of the three kinds: it reads like .*\.$/);
    expect(refusalSentence({ others: [{ device, p: 0.8 }], overLimit: null }, LABELS)).toMatch(/^Most likely not/);
    expect(shortRefusal(refusal)).toMatch(/^Not one of the three: [a-zC].*\.$/);
  });

  it("is none while the three kinds hold half of the chance or more", () => {
    expect(refusalOf({ others: [{ device: "mains", p: 0.49 }], overLimit: null })).toBeNull();
    expect(refusalOf({ others: [], overLimit: null })).toBeNull();
  });

  // Warnings of hand-held meters; ISO 6469-3, voltage class B: above 60 V d.c. or 30 V a.c.
  it("stops at a reading above the limits, whatever it may be", () => {
    const over = { others: [], overLimit: { check: "volt:mated:2-gnd@rest", value: 72 } };
    expect(refusalSentence(over, LABELS)).toMatch(/^Stop: .*72\sV.*Above 30 V a\.c\. or 60 V d\.c\. this tool ends\.$/);
    expect(refusalSteps(refusalOf(over)!).join(" ")).toMatch(/licensed person/);
    expect(isDangerous(refusalOf(over)!)).toBe(true);
    expect(isDangerous(refusalOf({ others: [{ device: "can-pair", p: 1 }], overLimit: null })!)).toBe(false);
  });

  it("is the verdict of a check on a current loop: no pins, no finding, nothing filed under one", () => {
    // NAMUR NE43: 4 and 20 mA across 250 ohm are 1 and 5 V (Ohm's law).
    const { verdict } = judge({ setup: { cavityLabels: LABELS }, steps: steps([["volt:harness:1-gnd", 24.1], ["volt:harness:2-gnd", 0], ["res:harness:2-gnd", 250.4], ["volt:mated:2-gnd@rest", 1], ["volt:mated:2-gnd@full", 5], ["freq:mated:2@rest", "none"]]) });
    expect(verdict.refusal?.device).toBe("current-loop");
    expect(verdict.sentence).toBe("Not one of the three kinds: it reads like a two-wire current loop of 4 to 20 mA.");
    expect([verdict.pins, verdict.openFindings, verdict.advice, verdict.evidence]).toEqual([[], [], [], []]);
    expect(verdictColumns(verdict)).toMatchObject({ sentence: "Not one of the three: two-wire current loop.", kind: null, findingCode: null, findingChance: null });
  });
});
