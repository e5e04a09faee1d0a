import { describe, expect, it } from "vitest";
import { dutyFromMean, measurePulses, pulseAcRms, pulseMean, pulseRms, pulseWidth, referenceLevels } from "@/lib/waveform";

// Source: computed from the definitions of mean and root mean square of a two-level wave.
const TRAINS = [
  { duty: 0.1, high: 5, low: 0, hertz: 200, mean: 0.5, rms: 1.5811, acRms: 1.5, widthMs: 0.5 },
  { duty: 0.25, high: 4.8, low: 0.2, hertz: 200, mean: 1.35, rms: 2.4062, acRms: 1.9919, widthMs: 1.25 },
  { duty: 0.5, high: 12, low: 0, hertz: 1000, mean: 6, rms: 8.4853, acRms: 6, widthMs: 0.5 },
  { duty: 0.9, high: 4.8, low: 0.2, hertz: 130, mean: 4.34, rms: 4.5541, acRms: 1.38, widthMs: 6.923 },
] as const;

describe.each(TRAINS)("$duty of $low/$high V at $hertz Hz", (train) => {
  it("has the tabled mean, rms, a.c. rms and width", () => {
    expect(pulseMean(train, train.duty)).toBeCloseTo(train.mean, 4);
    expect(pulseRms(train, train.duty)).toBeCloseTo(train.rms, 4);
    expect(pulseAcRms(train, train.duty)).toBeCloseTo(train.acRms, 4);
    expect(pulseWidth(train.duty, train.hertz) * 1000).toBeCloseTo(train.widthMs, 3);
    expect(dutyFromMean(train, train.mean)).toBeCloseTo(train.duty, 9);
  });

  it("is measured back from its samples", () => {
    const perPeriod = 2000;
    const samples: number[] = Array.from({ length: perPeriod * 5 }, (_, i) => ((i + 300) % perPeriod < train.duty * perPeriod ? train.high : train.low));
    const measured = measurePulses(samples, 1 / (train.hertz * perPeriod));
    expect(measured?.duty).toBeCloseTo(train.duty, 3);
    expect(measured?.hertz).toBeCloseTo(train.hertz, 1);
    expect((measured?.widthSeconds ?? NaN) * 1000).toBeCloseTo(train.widthMs, 2);
    expect(samples.reduce((sum, sample) => sum + sample, 0) / samples.length).toBeCloseTo(train.mean, 2);
  });
});

describe("reference levels of IEEE 181", () => {
  it("lie at 10, 50 and 90 % between states of 0.0138 and 5.1848 V", () => {
    // Source: manual of a signal-processing library for 10 and 90 %; 50 % computed.
    const levels = referenceLevels({ low: 0.0138, high: 5.1848 });
    expect(levels.proximal).toBeCloseTo(0.5309, 4);
    expect(levels.mid).toBeCloseTo(2.5993, 4);
    expect(levels.distal).toBeCloseTo(4.6677, 4);
  });
});
