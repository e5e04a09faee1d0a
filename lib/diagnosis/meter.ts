import type { CheckSpec, MeterSpec } from "./types";

/** A common 6000-count hand-held meter; used when the technician has not said which meter is in hand. */
export const DEFAULT_METER: MeterSpec = {
  counts: 6000,
  ohms: { percent: 0.9, counts: 2, leadOhms: 0.25, maxOhms: 60e6 },
  volts: { percent: 0.5, fixedVolts: 0.004, inputOhms: 10e6 },
  hertz: { percent: 0.1 },
  duty: { percent: 0.5, fixed: 0.002 },
  triggerVolts: 0.8,
};

/**
 * Smallest step of the display at a value, in the value's unit: the range is the lowest decade of the
 * display's full count that still holds the value (600.0, 6.000 k, ... for 6000 counts).
 */
export function resolutionAt(ohms: number, counts: number): number {
  let range = counts / 10;
  while (range * (1 + 1e-12) < Math.abs(ohms)) range *= 10;
  return range / counts;
}

/**
 * Meter's limit of error (half-width, same unit as the value) for one reading; 0 for words.
 * Percent of reading plus counts or a fixed part, as makers state it; JCGM 100:2008 4.3.7 turns
 * such a half-width a into a standard uncertainty a / sqrt(3).
 */
export function meterLimit(check: Pick<CheckSpec, "unit">, value: number, meter: MeterSpec = DEFAULT_METER): number {
  const size = Math.abs(value);
  switch (check.unit) {
    case "ohm": return size * meter.ohms.percent / 100 + meter.ohms.counts * resolutionAt(size, meter.counts) + meter.ohms.leadOhms;
    case "volt": return size * meter.volts.percent / 100 + meter.volts.fixedVolts;
    case "hertz": return size * meter.hertz.percent / 100;
    case "ratio": return size * meter.duty.percent / 100 + meter.duty.fixed;
    case "word": return 0;
  }
}

/** Standard uncertainty of a limit of error taken as a rectangular distribution (JCGM 100:2008 4.3.7). */
export function standardUncertainty(limit: number): number {
  return limit / Math.sqrt(3);
}
