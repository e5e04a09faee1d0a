import { describe, expect, it } from "vitest";
import { dutyFromMean, measurePulses, pulseMean } from "@/lib/waveform";

describe("rules of the trade (common practice)", () => {
  it("a pulsed 24 V at 50 % reads about 12 V: the mean is amplitude times duty", () => {
    expect(pulseMean({ low: 0, high: 24 }, 0.5)).toBe(12);
  });

  it("at 0 or 100 % duty the edges are gone: nothing to measure, and volts alone do not tell it from a steady level", () => {
    for (const level of [0, 5]) expect(measurePulses(new Array<number>(5000).fill(level), 1e-6)).toBeNull();
    expect(dutyFromMean({ low: 0, high: 5 }, 5)).toBe(1);
    expect(dutyFromMean({ low: 0, high: 5 }, 0)).toBe(0);
  });

  it.each([0.05, 0.04, 0.95])("a sensor at %d duty still has its edges: 500 Hz stays 500 Hz whatever is measured", (duty) => {
    const samples = Array.from({ length: 20_000 }, (_, i) => ((i + 77) % 2000 < duty * 2000 ? 4.8 : 0.2));
    const measured = measurePulses(samples, 1e-6);
    expect(measured?.hertz).toBeCloseTo(500, 3);
    expect(measured?.duty).toBeCloseTo(duty, 3);
  });
});
