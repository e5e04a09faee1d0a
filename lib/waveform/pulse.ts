import { referenceLevels, stateLevels, type StateLevels } from "./levels";

/** One steady pulse train as measured: seconds, hertz, duty 0..1. */
export interface PulseMeasure extends StateLevels {
  readonly periodSeconds: number;
  readonly hertz: number;
  readonly widthSeconds: number;
  readonly duty: number;
}

interface Crossing { readonly at: number; readonly rising: boolean }

/** Instants at which the samples pass a level, straight lines between samples, in sample steps. */
function crossings(samples: readonly number[], level: number): Crossing[] {
  const found: Crossing[] = [];
  for (let i = 1; i < samples.length; i += 1) {
    const before = samples[i - 1] ?? 0;
    const now = samples[i] ?? 0;
    if (before < level === now < level) continue;
    found.push({ at: i - 1 + (level - before) / (now - before), rising: now > before });
  }
  return found;
}

function mean(values: readonly number[]): number {
  return values.reduce((sum, value) => sum + value, 0) / values.length;
}

/**
 * Period, pulse duration and duty factor at the 50 % reference level (terms of IEEE 181): from one crossing to the next
 * in the same direction, and from a rising crossing to the falling one after it, averaged over the record.
 * @param stepSeconds time between samples.
 * @returns null without a swing or without one whole period.
 */
export function measurePulses(samples: readonly number[], stepSeconds: number): PulseMeasure | null {
  const states = stateLevels(samples);
  if (!states) return null;
  const all = crossings(samples, referenceLevels(states).mid);
  const rising = all.filter((crossing) => crossing.rising).map(({ at }) => at);
  const periods = rising.slice(1).map((at, i) => at - (rising[i] ?? 0));
  if (periods.length === 0) return null;
  const last = rising[rising.length - 1] ?? 0;
  const widths = all.flatMap((now, i) => {
    const before = all[i - 1];
    return !now.rising && before?.rising && before.at < last ? [now.at - before.at] : [];
  });
  const periodSeconds = mean(periods) * stepSeconds;
  const widthSeconds = mean(widths) * stepSeconds;
  return { ...states, periodSeconds, hertz: 1 / periodSeconds, widthSeconds, duty: widthSeconds / periodSeconds };
}

/** Mean of a pulse train, what a DC-volts reading shows; duty 0..1. */
export function pulseMean({ low, high }: StateLevels, duty: number): number {
  return duty * high + (1 - duty) * low;
}

/** Root mean square of a pulse train, DC included. */
export function pulseRms({ low, high }: StateLevels, duty: number): number {
  return Math.sqrt(duty * high ** 2 + (1 - duty) * low ** 2);
}

/** Root mean square without the mean, what a true-RMS meter shows on AC volts. */
export function pulseAcRms({ low, high }: StateLevels, duty: number): number {
  return Math.abs(high - low) * Math.sqrt(duty * (1 - duty));
}

/** Duty 0..1 from a DC-volts reading; null when the levels are equal or the reading is not between them. */
export function dutyFromMean({ low, high }: StateLevels, volts: number): number | null {
  if (high === low) return null;
  const duty = (volts - low) / (high - low);
  return duty >= 0 && duty <= 1 ? duty : null;
}

/** High time of one period, seconds. */
export function pulseWidth(duty: number, hertz: number): number {
  return duty / hertz;
}
