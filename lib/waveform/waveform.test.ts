import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { dutyFromMean, measurePulses, pulseAcRms, pulseMean, pulseRms, stateLevels } from "./index";

const levels = fc.tuple(fc.double({ min: -5, max: 5, noNaN: true }), fc.double({ min: 0.1, max: 24, noNaN: true })).map(([low, swing]) => ({ low, high: low + swing }));
const duties = fc.double({ min: 0, max: 1, noNaN: true });

describe("laws of pulse trains", () => {
  it("rms² is mean² plus the a.c. part²", () => {
    fc.assert(fc.property(levels, duties, (states, duty) => {
      expect(Math.hypot(pulseMean(states, duty), pulseAcRms(states, duty))).toBeCloseTo(pulseRms(states, duty), 6);
    }));
  });

  it("duty comes back from the mean", () => {
    fc.assert(fc.property(levels, fc.double({ min: 0.001, max: 0.999, noNaN: true }), (states, duty) => {
      expect(dutyFromMean(states, pulseMean(states, duty))).toBeCloseTo(duty, 6);
    }));
  });

  it("turned upside down, the duty is one minus itself and the period stays", () => {
    fc.assert(fc.property(fc.integer({ min: 5, max: 95 }), fc.integer({ min: 0, max: 99 }), (percent, shift) => {
      const samples = Array.from({ length: 1000 }, (_, i) => ((i + shift) % 100 < percent ? 5 : 0));
      const upright = measurePulses(samples, 1e-3);
      const inverted = measurePulses(samples.map((sample) => 5 - sample), 1e-3);
      expect(inverted?.duty).toBeCloseTo(1 - (upright?.duty ?? NaN), 6);
      expect(inverted?.periodSeconds).toBeCloseTo(upright?.periodSeconds ?? NaN, 9);
    }));
  });
});

describe("state levels", () => {
  it("are the modes, not the overshoot", () => {
    const wave = Array.from({ length: 1000 }, (_, i) => (i % 100 < 40 ? 5 : 0) + (i % 100 === 0 ? 0.8 : 0) - (i % 100 === 40 ? 0.6 : 0));
    const states = stateLevels(wave, 200);
    expect(states?.low).toBeCloseTo(0, 1);
    expect(states?.high).toBeCloseTo(5, 1);
  });

  it("need a swing and a finite record", () => {
    expect(stateLevels([])).toBeNull();
    expect(stateLevels([5])).toBeNull();
    expect(stateLevels([5, 5, 5])).toBeNull();
    expect(stateLevels([0, Number.POSITIVE_INFINITY])).toBeNull();
  });

  it("measure nothing from less than one period", () => expect(measurePulses([0, 0, 5, 5, 0, 0], 1)).toBeNull());
  it("give no duty when the reading is outside the states", () => {
    expect(dutyFromMean({ low: 0.2, high: 4.8 }, 5)).toBeNull();
    expect(dutyFromMean({ low: 2, high: 2 }, 2)).toBeNull();
  });
});
