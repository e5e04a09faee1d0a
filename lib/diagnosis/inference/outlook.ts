import { ALL_GROUPS, CHECK_COUNT, newPredictions, predictInto, WHOLE_PLAN, WIDEST_PLAN, type Plan, type Predictions } from "../circuit/predict";
import { PARAMETER_COUNT, physicalValue } from "../circuit/parameters";
import { ALL_CHECKS, PLANNED_COUNT } from "../checks";
import type { MeterSpec } from "../types";
import { forward } from "./cholesky";
import { physical } from "./misfit";
import { movedBy, reachOf } from "./movable";
import { scaledSd, scalePrediction, unscale } from "./observe";
import type { Believed } from "./posterior";
import { square } from "../numerics";

/** What one candidate, fitted to the readings so far, expects of every check: a normal on the comparison scale, or a word. */
export interface Outlook {
  readonly mean: Float64Array;
  readonly sd: Float64Array;
  /** Chance of "OL", "none", "loose" or, for a sweep, "still"; and of "jumps". */
  readonly word: Float64Array;
  readonly jumps: Float64Array;
}

const DIFFERENCE = 1e-3;
const at = newPredictions(), nudged = newPredictions();
const x = new Float64Array(PARAMETER_COUNT);

/**
 * Expectation of every check under a fitted candidate, with what the fit leaves open and the meter's own error in the spread;
 * of the optional ones only where `wide` is set.
 */
export function outlookOf(b: Believed, meter: MeterSpec, wide = false): Outlook {
  const { candidate: c, fit } = b, plan = wide ? WIDEST_PLAN : WHOLE_PLAN, count = wide ? CHECK_COUNT : PLANNED_COUNT;
  at.logState = 0; at.idle = false;
  predictInto(c, physical(c, fit.z, x), plan, ALL_GROUPS, at);
  const variance = new Float64Array(CHECK_COUNT), mean = new Float64Array(CHECK_COUNT);
  for (let i = 0; i < count; i++) mean[i] = numeric(at, i) ? scalePrediction(ALL_CHECKS[i]!, at.value[i]!, meter) : 0;
  const derivatives = derivativesOf(b, meter, mean, plan, count);
  addKnown(b, derivatives, variance, count);
  const sd = new Float64Array(CHECK_COUNT);
  for (let i = 0; i < count; i++) {
    if (numeric(at, i)) sd[i] = Math.sqrt(variance[i]! + square(at.slack[i]!) + square(scaledSd(ALL_CHECKS[i]!, unscale(ALL_CHECKS[i]!, mean[i]!), meter)));
  }
  return { mean, sd, word: Float64Array.from(at.word), jumps: Float64Array.from(at.jumps) };
}

/** Whether a number, rather than a word, is expected at all. */
const numeric = (p: Predictions, i: number) => ALL_CHECKS[i]!.unit !== "word" && p.word[i]! < 0.999;

interface Derivatives { readonly parameters: readonly number[]; readonly rows: readonly Float64Array[] }

function derivativesOf(b: Believed, meter: MeterSpec, mean: Float64Array, plan: Plan, count: number): Derivatives {
  const { candidate: c, fit } = b, parameters = movedBy(c, plan);
  const idle = at.idle, rows = parameters.map((p) => {
    const row = new Float64Array(CHECK_COUNT), kept = x[p]!, reach = reachOf(c, p, idle);
    x[p] = physicalValue(c.ranges, p, fit.z[p]! + DIFFERENCE);
    nudged.value.set(at.value);
    predictInto(c, x, plan, reach, nudged, true);
    x[p] = kept;
    for (let i = 0; i < count; i++) if (numeric(at, i) && nudged.value[i] !== at.value[i]) row[i] = (scalePrediction(ALL_CHECKS[i]!, nudged.value[i]!, meter) - mean[i]!) / DIFFERENCE;
    return row;
  });
  return { parameters, rows };
}

/** Adds the variance that the unknowns still carry: what the readings fixed jointly, and untouched unknowns at their full range. */
function addKnown(b: Believed, d: Derivatives, variance: Float64Array, count: number): void {
  const { active, precision } = b.fit, m = active.length;
  const place = new Map(d.parameters.map((p, k) => [p, k])), untouched = d.parameters.filter((p) => !active.includes(p));
  const joint = new Float64Array(m);
  for (let i = 0; i < count; i++) {
    let sum = 0;
    for (const p of untouched) sum += square(d.rows[place.get(p)!]![i]!);
    let any = false;
    for (let k = 0; k < m; k++) { const row = place.get(active[k]!); joint[k] = row === undefined ? 0 : d.rows[row]![i]!; any ||= joint[k] !== 0; }
    if (any) { forward(precision, m, joint); for (let k = 0; k < m; k++) sum += square(joint[k]!); }
    variance[i] = sum;
  }
}
