import type { Candidate } from "../circuit/candidate";
import { PARAMETER_COUNT } from "../circuit/parameters";
import { ALL_GROUPS, CHECK_COUNT, newPredictions, planFor, predictInto, type Plan, type Predictions } from "../circuit/predict";
import type { MeterSpec } from "../types";
import { factor, logDeterminant, solveFactored } from "./cholesky";
import { movedBy, reachOf } from "./movable";
import { numberLogChance, scalePrediction, strayNumberLogDensity, wordLogChance, type Observation } from "./observe";
import { exp, ln, norm } from "../numerics";

/**
 * Joint fit of everything unknown to everything read. Parameters are measured in standard deviations of
 * their range (z); the misfit is robust (a single wild reading pulls with bounded force); the integral over
 * z is taken by Laplace's method, which is exact where the model is linear in z.
 */
export interface Fit {
  /** Log-chance of the readings under the candidate, the unknowns integrated over. */
  readonly logEvidence: number;
  readonly z: Float64Array;
  /** Places of the parameters that the readings speak of, and the Cholesky factor of their precision. */
  readonly active: readonly number[];
  readonly precision: Float64Array;
}

/** Readings with what is needed to compare them: made once, used for every candidate. */
export interface Evidence { readonly observations: readonly Observation[]; readonly plan: Plan; readonly meter: MeterSpec }

/** Gathers observations with the plan of checks they need. */
export function evidenceOf(observations: readonly Observation[], meter: MeterSpec): Evidence {
  return { observations, plan: planFor(observations.map((o) => o.index)), meter };
}

const MAX_ITERATIONS = 9;
const DIFFERENCE = 1e-3;
const LONGEST_STEP = 2.5;
/** Residuals beyond about this many standard uncertainties pull ever less. */
const TAIL_SQUARED = 25;
/** A fit this far below the best after a few steps is given up, natural-log units. */
const HOPELESS = 30;

const x = new Float64Array(PARAMETER_COUNT);
const base: Predictions = newPredictions(), nudged: Predictions = newPredictions();
const predicted = new Float64Array(CHECK_COUNT);

/** Workspace that grows to the longest list of readings seen; overwritten by every fit. */
let room = 0;
let residual = new Float64Array(0), weight = residual, sds = residual, jacobian = residual, live = new Uint8Array(0);

function makeRoom(observations: number): void {
  if (observations <= room) return;
  room = observations + 16;
  residual = new Float64Array(room); weight = new Float64Array(room); sds = new Float64Array(room);
  jacobian = new Float64Array(room * PARAMETER_COUNT); live = new Uint8Array(room);
}

function physicalAt(c: Candidate, i: number, z: number): number {
  const v = c.ranges.mean[i]! + c.ranges.sd[i]! * z;
  return c.ranges.log[i] ? exp(v) : v;
}

/** Physical values at z, written into `out`. */
export function physical(c: Candidate, z: Float64Array, out: Float64Array): Float64Array {
  out.set(c.middle);
  for (let i = 0; i < PARAMETER_COUNT; i++) if (z[i] !== 0) out[i] = physicalAt(c, i, z[i]!);
  return out;
}

/** Log-posterior density at z up to the integral; leaves residuals, weights and scaled predictions in the workspace. */
function evaluate(c: Candidate, z: Float64Array, e: Evidence): number {
  base.logState = 0; base.idle = false;
  predictInto(c, physical(c, z, x), e.plan, ALL_GROUPS, base);
  let log = base.logState;
  for (let i = 0; i < PARAMETER_COUNT; i++) log -= 0.5 * z[i]! * z[i]!;
  for (let i = 0; i < e.observations.length; i++) log += compare(e.observations[i]!, i, e.meter);
  return log;
}

function compare(o: Observation, i: number, meter: MeterSpec): number {
  live[i] = 0;
  if (o.word !== null) return wordLogChance(o, base);
  const shown = numberLogChance(o, base);
  if (shown === null) return strayNumberLogDensity();
  const slack = base.slack[o.index]!, sd = slack === 0 ? o.sd : norm(o.sd, slack);
  predicted[o.index] = scalePrediction(o.spec, base.value[o.index]!, meter);
  const r = (o.scaled - predicted[o.index]!) / sd, spread = 1 + r * r / TAIL_SQUARED;
  live[i] = 1; residual[i] = r; sds[i] = sd; weight[i] = 1 / spread;
  return shown + o.logPeak - (slack === 0 ? 0 : ln(sd / o.sd)) - 0.5 * TAIL_SQUARED * ln(spread);
}

/** Derivatives of the scaled predictions by z, over sd, by forward differences at the point last evaluated. */
function differentiate(c: Candidate, z: Float64Array, movable: readonly number[], e: Evidence): void {
  const m = movable.length, n = e.observations.length;
  physical(c, z, x);
  for (let k = 0; k < m; k++) {
    const p = movable[k]!, kept = x[p]!, reach = reachOf(c, p, base.idle);
    x[p] = physicalAt(c, p, z[p]! + DIFFERENCE);
    predictInto(c, x, e.plan, reach, nudged);
    x[p] = kept;
    for (let i = 0; i < n; i++) {
      const o = e.observations[i]!;
      jacobian[i * m + k] = live[i] && o.group & reach ? (scalePrediction(o.spec, nudged.value[o.index]!, e.meter) - predicted[o.index]!) / (DIFFERENCE * sds[i]!) : 0;
    }
  }
}

/** Precision matrix I + J'WJ and gradient J'Wr - z. */
function normalEquations(z: Float64Array, movable: readonly number[], n: number, precision: Float64Array, gradient: Float64Array): void {
  const m = movable.length;
  precision.fill(0);
  for (let a = 0; a < m; a++) { precision[a * m + a] = 1; gradient[a] = -z[movable[a]!]!; }
  for (let i = 0; i < n; i++) {
    if (!live[i]) continue;
    for (let a = 0; a < m; a++) {
      const ja = jacobian[i * m + a]! * weight[i]!;
      if (ja === 0) continue;
      gradient[a]! += ja * residual[i]!;
      for (let b = 0; b <= a; b++) precision[a * m + b]! += ja * jacobian[i * m + b]!;
    }
  }
}

/**
 * Fits one candidate. `start` is a first guess of z (not changed); `toBeat` is the log-density a fit has to come
 * near to be worth finishing (-Infinity: always). Same input, same result, to the last bit.
 */
export function fitCandidate(c: Candidate, e: Evidence, start: Float64Array, toBeat = -Infinity): Fit {
  makeRoom(e.observations.length);
  const movable = movedBy(c, e.plan.groups), m = movable.length;
  const z = Float64Array.from(start), precision = new Float64Array(m * m), step = new Float64Array(m), trial = new Float64Array(PARAMETER_COUNT);
  let log = evaluate(c, z, e);
  for (let iteration = 0; ; iteration++) {
    differentiate(c, z, movable, e);
    normalEquations(z, movable, e.observations.length, precision, step);
    factor(precision, m);
    if (iteration === MAX_ITERATIONS || (iteration >= 3 && log < toBeat - HOPELESS)) break;
    solveFactored(precision, m, step);
    const better = lineSearch(c, z, movable, step, trial, e, log), gained = better - log;
    log = Math.max(log, better);
    if (gained < 0.02) break;
  }
  return { logEvidence: log - 0.5 * logDeterminant(precision, m), z, active: movable, precision };
}

/** Halves the step until the fit improves; moves z when it does. Returns the log-density reached, -Infinity if none. */
function lineSearch(c: Candidate, z: Float64Array, movable: readonly number[], step: Float64Array, trial: Float64Array, e: Evidence, from: number): number {
  let longest = 0;
  for (const s of step) longest = Math.max(longest, Math.abs(s));
  let share = longest > LONGEST_STEP ? LONGEST_STEP / longest : 1;
  for (let half = 0; half < 4; half++, share /= 2) {
    trial.set(z);
    for (let k = 0; k < movable.length; k++) trial[movable[k]!]! += share * step[k]!;
    const log = evaluate(c, trial, e);
    if (log > from) { z.set(trial); return log; }
  }
  return -Infinity;
}
