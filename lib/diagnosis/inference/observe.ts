import { CHECK_GROUP, CHECK_INDEX, type Predictions } from "../circuit/predict";
import { ALL_CHECKS } from "../checks";
import { DEFAULT_METER, meterLimit, standardUncertainty } from "../meter";
import type { CheckSpec, MeterSpec, Reading } from "../types";
import { exp, ln, norm } from "../numerics";

/** A reading made ready for comparison: on the scale where the meter's error is nearly constant. */
export interface Observation {
  readonly index: number;
  readonly spec: CheckSpec;
  readonly group: number;
  readonly word: string | null;
  /** Number as read, in the check's unit; 0 where a word was entered. */
  readonly value: number;
  readonly scaled: number;
  readonly sd: number;
  readonly logPeak: number;
}

/** Keeps the logarithm of ohms finite near a short; about the resistance of a pair of leads. */
const OHM_OFFSET = 2;
/** The same for hertz: no meter shows less but nothing. */
const LEAST_HERTZ = 1e-3;
/** The circuit model is itself only so good; common practice for lumped models of wiring. */
const MODEL_OHM_SHARE = 0.004, MODEL_VOLTS = 0.004, MODEL_VOLT_SHARE = 0.0005, MODEL_HERTZ_SHARE = 0.0005, MODEL_DUTY = 0.001;
const LOG_ROOT_TWO_PI = 0.5 * ln(2 * Math.PI);

/** Number on the comparison scale: logarithm for ohms and hertz, straight for volts and duty. */
export function scale(spec: CheckSpec, value: number): number {
  if (spec.unit === "ohm") return ln(Math.max(value, 0) + OHM_OFFSET);
  return spec.unit === "hertz" ? ln(Math.max(value, LEAST_HERTZ)) : value;
}

/** The number a scaled value stands for; inverse of `scale`. */
export function unscale(spec: CheckSpec, scaled: number): number {
  if (spec.unit === "ohm") return Math.max(0, exp(scaled) - OHM_OFFSET);
  return spec.unit === "hertz" ? exp(scaled) : scaled;
}

/** Predicted reading on the comparison scale; test leads add their own resistance to ohms. */
export function scalePrediction(spec: CheckSpec, value: number, meter: MeterSpec): number {
  return scale(spec, spec.unit === "ohm" ? value + meter.ohms.leadOhms : value);
}

/** Standard uncertainty on the comparison scale at a value: the meter's limit over root three, with the model's own. */
export function scaledSd(spec: CheckSpec, value: number, meter: MeterSpec): number {
  const u = standardUncertainty(meterLimit(spec, value, meter));
  switch (spec.unit) {
    case "ohm": return norm(u, MODEL_OHM_SHARE * value) / (Math.max(value, 0) + OHM_OFFSET);
    case "volt": return norm(u, MODEL_VOLTS, MODEL_VOLT_SHARE * value);
    case "hertz": return norm(u / Math.max(value, LEAST_HERTZ), MODEL_HERTZ_SHARE);
    default: return norm(u, MODEL_DUTY);
  }
}

/** Readings in the order of the vocabulary, so that the order they were taken in cannot matter. What is no circuit's (a colour, a message) is left out. Unknown checks are the caller's to refuse. */
export function observe(readings: readonly Reading[], meter: MeterSpec = DEFAULT_METER): Observation[] {
  return readings.filter(([check]) => CHECK_INDEX.has(check)).map(([check, value]) => observation(CHECK_INDEX.get(check)!, value, meter))
    .sort((a, b) => a.index - b.index || (a.word ?? "").localeCompare(b.word ?? "") || a.scaled - b.scaled);
}

function observation(index: number, value: Reading[1], meter: MeterSpec): Observation {
  const spec = ALL_CHECKS[index]!, group = CHECK_GROUP[index]!;
  if (typeof value === "string") return { index, spec, group, word: value, value: 0, scaled: 0, sd: 1, logPeak: 0 };
  const sd = scaledSd(spec, value, meter);
  return { index, spec, group, word: null, value, scaled: scale(spec, value), sd, logPeak: -ln(sd) - LOG_ROOT_TWO_PI };
}

/** Least log-chance given to a word that a candidate rules out: people misread and mistype. */
const WORD_FLOOR = -11;
/** Log-density of a number where a word was due: any number over the scale's width is as good as another. */
const STRAY_NUMBER = -13;

const logChance = (p: number) => (p > 0 ? Math.max(ln(p), WORD_FLOOR) : WORD_FLOOR);

/** Log-chance of a word under the predictions. */
export function wordLogChance(o: Observation, p: Predictions): number {
  const word = p.word[o.index]!;
  switch (o.word) {
    case "jumps": return logChance(p.jumps[o.index]!);
    case "smooth": return logChance(Math.max(1 - word - p.jumps[o.index]!, 0.002));
    case "grips": return logChance(1 - word);
    default: return logChance(word);
  }
}

/** Log-chance that a number is shown at all, or null when the candidate all but rules numbers out. */
export function numberLogChance(o: Observation, p: Predictions): number | null {
  const word = p.word[o.index]!;
  return word > 0.5 ? null : ln(1 - word);
}

export function strayNumberLogDensity(): number { return STRAY_NUMBER; }
