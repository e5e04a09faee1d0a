import { describe, expect, it } from "vitest";
import { COPPER_TABLE } from "./wire-tables";
import { awgAreaMm2, awgDiameterMm, copperFactor, iec60228Factor, largestOhmsPerMetre, wireOhms } from "@/lib/units";

describe("AWG by ASTM B258: diameter, section and ideal copper at 20 °C", () => {
  // Source: ASTM B258 formula; diameters as reproduced by the `units` program; mΩ/m computed from IACS copper.
  it.each(COPPER_TABLE)("AWG $awg", ({ awg, diameterMm, areaMm2, milliohmsPerMetre }) => {
    expect(awgDiameterMm(awg)).toBeCloseTo(diameterMm, 4);
    expect(awgAreaMm2(awg)).toBeCloseTo(areaMm2, 3);
    expect(wireOhms(1, awgAreaMm2(awg)) * 1000 / milliohmsPerMetre).toBeCloseTo(1, 3);
  });

  it("makes 4/0 0.4600 inch and each step the 39th root of 92", () => {
    expect(awgDiameterMm(-3) / 25.4).toBeCloseTo(0.46, 6);
    expect(awgDiameterMm(15) / awgDiameterMm(16)).toBeCloseTo(1.1229322, 7);
  });

  it("agrees with printed tables: 16.14 ohm per 1000 ft at AWG 22, 3.28 ohm per km at AWG 10", () => {
    expect(wireOhms(304.8, awgAreaMm2(22))).toBeCloseTo(16.14, 2);
    expect(wireOhms(1000, awgAreaMm2(10))).toBeCloseTo(3.28, 2);
  });

  it("stays within about a tenth of real strand: 15.1 and 9.19 ohm per 1000 ft for AWG 22 and 20", () => {
    // Source: slash sheets of an aerospace wire specification, read as a listing.
    expect(Math.abs(wireOhms(304.8, awgAreaMm2(22)) / 15.1 - 1)).toBeLessThan(0.11);
    expect(Math.abs(wireOhms(304.8, awgAreaMm2(20)) / 9.19 - 1)).toBeLessThan(0.11);
  });
});

describe("copper and temperature", () => {
  // Source: coefficient 0.00393 /K from memory; factors computed from it.
  it.each([[-40, 0.7642], [0, 0.9214], [20, 1], [25, 1.0197], [50, 1.1179], [80, 1.2358], [105, 1.3341]] as const)("%d °C", (celsius, factor) => {
    expect(Math.abs(copperFactor(celsius) - factor)).toBeLessThan(0.00006);
    expect((234.45 + celsius) / 254.45).toBeCloseTo(factor, 3);
  });

  // Source: IEC 60228 correction table, read in a reproduction; the rounded form with 0.004 /K.
  it.each([[5, 1.064], [10, 1.042], [25, 0.98], [50, 0.893], [75, 0.82], [100, 0.758]] as const)("IEC 60228 factor at %d °C", (celsius, factor) => {
    expect(iec60228Factor(celsius)).toBeCloseTo(factor, 3);
    expect(1 / copperFactor(celsius)).toBeCloseTo(factor, 2);
  });
});

describe("fine-stranded wire, IEC 60228 class 5", () => {
  // Source: IEC 60228 class 5, largest ohm/km plain and tinned, read in two reproductions.
  it.each([[0.5, 39, 40.1], [0.75, 26, 26.7], [1, 19.5, 20], [1.5, 13.3, 13.7], [2.5, 7.98, 8.21], [4, 4.95, 5.09], [6, 3.3, 3.39], [10, 1.91, 1.95]] as const)(
    "%d mm²", (areaMm2, plain, tinned) => {
      expect((largestOhmsPerMetre(areaMm2) ?? NaN) * 1000).toBeCloseTo(plain, 6);
      expect((largestOhmsPerMetre(areaMm2, "tinned") ?? NaN) * 1000).toBeCloseTo(tinned, 6);
      const ratio = plain / wireOhms(1000, areaMm2);
      expect(ratio).toBeGreaterThan(1.1);
      expect(ratio).toBeLessThan(1.165);
    });

  it("knows no limit for a size outside the table", () => expect(largestOhmsPerMetre(0.9)).toBeNull());

  it("puts a 5 m loop of 0.75 mm² in the range of the meter's own leads", () => {
    // Source: computed, 24.7 mΩ/m (ISO 6722-1, from memory) and four contacts of 10 mΩ; leads 0.2 to 0.5 ohm.
    const loop = 2 * 5 * 0.0247 + 4 * 0.01;
    expect(loop).toBeCloseTo(0.287, 3);
    expect(wireOhms(10, 0.75) + 0.04).toBeLessThan(loop);
    expect(wireOhms(10, 0.75) + 0.04).toBeGreaterThan(0.2);
  });
});
