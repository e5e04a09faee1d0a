import { describe, expect, it } from "vitest";
import { dutyFromMean, measurePulses, pulseMean } from "@/lib/waveform";
import { seedEntries } from "../../seed/catalogue";

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

describe("the demo catalogue keeps the trade's rules (common practice)", () => {
  const pwm = seedEntries().map(({ data }) => data).filter(({ kind }) => kind === "pwm");

  it("PWM sensors keep their duty between 5 and 95 %, long strokes from 4 %", () => {
    expect(pwm.length).toBeGreaterThan(10);
    for (const { name, healthy } of pwm) {
      const { rest, full } = healthy.duty ?? { rest: NaN, full: NaN };
      expect(Math.min(rest, full), name).toBeGreaterThanOrEqual(0.04);
      expect(Math.max(rest, full), name).toBeLessThanOrEqual(0.95);
    }
  });

  it("their frequency is between 100 Hz and 2 kHz, most often 500 Hz", () => {
    const count = new Map<number, number>();
    for (const { healthy } of pwm) {
      const hertz = healthy.frequencyHz ?? NaN;
      expect(hertz).toBeGreaterThanOrEqual(100);
      expect(hertz).toBeLessThanOrEqual(2000);
      count.set(hertz, (count.get(hertz) ?? 0) + 1);
    }
    expect([...count].sort((a, b) => b[1] - a[1])[0]?.[0]).toBe(500);
  });

  it("an open-collector output has its pull-up named: without it there is no signal, and no fault of the sensor", () => {
    for (const { healthy } of pwm.filter(({ healthy }) => healthy.output === "open-collector")) expect(healthy.pullUpNeeded).toBe(true);
  });

  it("potentiometers keep clear of their ends and lie between 100 ohm and 100 kilohm", () => {
    // Source: component handbook for the range of totals, read.
    for (const { kind, healthy, name } of seedEntries().map(({ data }) => data)) {
      if (kind !== "potentiometer") continue;
      expect(healthy.totalOhms, name).toBeGreaterThanOrEqual(100);
      expect(healthy.totalOhms, name).toBeLessThanOrEqual(100_000);
    }
  });
});
