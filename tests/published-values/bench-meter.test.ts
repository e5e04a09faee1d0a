import { describe, expect, it } from "vitest";
import { predict } from "@/lib/diagnosis";
import { DEFAULT_METER, meterLimit, resolutionAt, standardUncertainty } from "@/lib/diagnosis/meter";

describe("the engine's meter: percent of reading plus counts", () => {
  // Source: common classes of 6000-count hand-held meters; computed from percent and counts, without the leads' share.
  const noLeads = { ...DEFAULT_METER, ohms: { ...DEFAULT_METER.ohms, leadOhms: 0 } };

  it.each([[2500, 24.5], [470, 4.43], [4700, 44.3], [47_000, 443], [1e6, 11_000]] as const)("%d ohm: ±%d", (ohms, limit) => {
    expect(meterLimit({ unit: "ohm" }, ohms, noLeads)).toBeCloseTo(limit, 6);
  });

  it.each([[0.5, 0.1], [599, 0.1], [601, 1], [5999, 1], [6001, 10], [47e6, 10_000]] as const)("shows %d ohm in steps of %d", (ohms, step) => {
    expect(resolutionAt(ohms, 6000)).toBeCloseTo(step, 9);
  });

  it("cannot resolve milliohms by ohms: the limit is most of a reading of half an ohm", () => {
    expect(meterLimit({ unit: "ohm" }, 0.5) / 0.5).toBeGreaterThan(0.6);
  });

  it("has a limit in every unit, the same either side of zero, and none for words", () => {
    expect(meterLimit({ unit: "volt" }, -5)).toBeCloseTo(0.029, 9);
    expect(meterLimit({ unit: "volt" }, 5)).toBe(meterLimit({ unit: "volt" }, -5));
    expect(meterLimit({ unit: "hertz" }, 250)).toBeCloseTo(0.25, 9);
    expect(meterLimit({ unit: "ratio" }, 0.5)).toBeCloseTo(0.0045, 9);
    expect(meterLimit({ unit: "word" }, 1)).toBe(0);
  });

  it("takes a limit as rectangular: u = a/√3 (JCGM 100:2008, 4.3.7, from memory)", () => {
    expect(standardUncertainty(24.5)).toBeCloseTo(14.15, 2);
    expect(standardUncertainty(0.027)).toBeCloseTo(0.01559, 5);
  });

  it("expects the leads' own ohms in every reading: half an ohm more of leads, half an ohm more shown (two resistances in series, computed)", () => {
    const middle = (leadOhms: number, check: string) => predict({ pins: ["1", "2", "3"], meter: { ...DEFAULT_METER, ohms: { ...DEFAULT_METER.ohms, leadOhms } } }, [], { code: "none" }, check)?.number?.middle ?? NaN;
    for (const check of ["res:wire:1", "res:wire:3"]) expect(middle(0.5, check) - middle(0, check)).toBeCloseTo(0.5, 6);
  });
});
