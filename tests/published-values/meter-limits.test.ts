import { describe, expect, it } from "vitest";
import { DOMINANT_RECTANGULAR_K, combinedUncertainty, limitOfError, standardUncertainty } from "@/lib/units";

describe("limit of error: percent of reading plus counts", () => {
  // Sources: the first three from application texts on meters; the rest computed from the formula.
  it.each([
    ["120 V in a 600.0 V range, 1 % + 3", 120, { percent: 1, counts: 3, resolution: 0.1 }, 1.5],
    ["0.5 V at 10 µV, 3 % + 5", 0.5, { percent: 3, counts: 5, resolution: 1e-5 }, 0.01505],
    ["100.0 V, 1 % + 2", 100, { percent: 1, counts: 2, resolution: 0.1 }, 1.2],
    ["5.000 V, 0.5 % + 2", 5, { percent: 0.5, counts: 2, resolution: 0.001 }, 0.027],
    ["2500 ohm, 0.9 % + 2", 2500, { percent: 0.9, counts: 2, resolution: 1 }, 24.5],
    ["0.5 ohm at 0.1 ohm, 0.9 % + 3", 0.5, { percent: 0.9, counts: 3, resolution: 0.1 }, 0.3045],
    ["250.0 Hz, 0.1 % + 3", 250, { percent: 0.1, counts: 3, resolution: 0.1 }, 0.55],
    ["50.0 % duty, 0.5 % + 5", 50, { percent: 0.5, counts: 5, resolution: 0.1 }, 0.75],
  ] as const)("%s", (_what, reading, limit, expected) => expect(limitOfError(limit, reading)).toBeCloseTo(expected, 9));

  it("takes the size of a negative reading", () => expect(limitOfError({ percent: 0.5, counts: 2, resolution: 0.001 }, -5)).toBeCloseTo(0.027, 9));
});

describe("JCGM 100:2008", () => {
  it("4.3.7: limits ±a without more knowledge have u = a/√3", () => {
    // Source: 4.3.7, from memory; numbers computed.
    expect(standardUncertainty(0.027)).toBeCloseTo(0.01559, 5);
    expect(standardUncertainty(24.5)).toBeCloseTo(14.15, 2);
  });

  it("4.3.7 example 2 with 5.1.5: a voltmeter's budget", () => {
    // Source: from memory; arithmetic computed. 14 ppm of 0.928571 V and 2 ppm of the 1 V range; repeats 12 µV.
    const halfWidth = 14e-6 * 0.928571 + 2e-6 * 1;
    expect(halfWidth).toBeCloseTo(15e-6, 9);
    const u = combinedUncertainty([{ u: 12e-6 }, { u: standardUncertainty(halfWidth) }]);
    expect(standardUncertainty(halfWidth)).toBeCloseTo(8.7e-6, 7);
    expect(u ** 2).toBeCloseTo(219e-12, 12);
    expect(u / 0.928571).toBeCloseTo(16e-6, 6);
  });
});

describe("EA-4/02, worked examples", () => {
  it("S9: a hand-held meter at 100 V d.c.", () => {
    // Source: EA-4/02 example S9, read in a listing; half-widths from memory.
    const u = combinedUncertainty([{ u: 0.001, sensitivity: -1 }, { u: standardUncertainty(0.05) }, { u: standardUncertainty(0.011), sensitivity: -1 }]);
    expect(standardUncertainty(0.05)).toBeCloseTo(0.029, 3);
    expect(standardUncertainty(0.011)).toBeCloseTo(0.0064, 4);
    expect(u).toBeCloseTo(0.03, 3);
    expect(DOMINANT_RECTANGULAR_K).toBeCloseTo(1.65, 2);
    expect(DOMINANT_RECTANGULAR_K * u).toBeCloseTo(0.05, 2);
  });

  it("S3: a 10 kilohm resistor, in milliohms", () => {
    // Source: EA-4/02 example S3, read; its inputs are rounded, so 1 % is allowed.
    const u = combinedUncertainty([
      { u: 2.5 }, { u: standardUncertainty(5.8 * Math.sqrt(3)) }, { u: 1.6 }, { u: 3.2 },
      { u: 4.1e-7 * 1e4 * 1000 }, { u: 7e-8 * 1e4 * 1000 },
    ]);
    expect(Math.abs(u / 8.33 - 1)).toBeLessThan(0.01);
    expect(2 * u).toBeCloseTo(17, 0);
  });
});
