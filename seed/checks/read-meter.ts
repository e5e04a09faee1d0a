import { meterLimit, type CheckSpec, type MeterSpec, type ReadingValue } from "@/lib/diagnosis";
import type { TrueValue } from "./simulate-readings";

/** Of a meter's limit of error, how much this instrument really uses, at most: makers leave themselves room. */
const USED = 0.6;

/** Rounded to what the display can show: counts over the decade range that holds the value. */
function displayed(value: number, unit: CheckSpec["unit"], counts: number): number {
  const full = unit === "volt" ? 6 : unit === "ohm" ? 600 : unit === "ratio" ? 1 : 1000;
  const decades = Math.max(0, Math.ceil(Math.log10(Math.max(Math.abs(value), 1e-9) / (full * counts / 6000))));
  const step = unit === "ratio" ? 0.001 : (full * 10 ** decades) / 6000;
  const digits = 10 ** Math.ceil(Math.log10(step));
  return Number((Math.round(value / digits) * digits).toPrecision(6));
}

/**
 * What the meter in hand shows of a true value: within its limit of error, rounded as its display rounds.
 * @param draw next of a row of numbers in [0, 1)
 */
export function readMeter(spec: CheckSpec, truth: TrueValue, meter: MeterSpec, draw: () => number): ReadingValue {
  if (typeof truth === "string") return truth;
  if (spec.unit === "ohm" && truth > meter.ohms.maxOhms) return "OL";
  const error = (2 * draw() - 1) * USED * meterLimit(spec, truth, meter);
  const lead = spec.unit === "ohm" ? Math.max(0, error) : error;
  return displayed(truth + (truth < 10 ? lead : error), spec.unit, meter.counts);
}
