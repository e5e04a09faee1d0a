import type { Candidate } from "../circuit/candidate";
import { PARAMETER_COUNT } from "../circuit/parameters";
import { newPredictions, predictInto, type Predictions } from "../circuit/predict";
import type { MeterSpec } from "../types";
import { numberLogChance, scalePrediction, strayNumberLogDensity, wordLogChance, type Observation } from "./observe";
import { factor, logDeterminant, solveFactored } from "./cholesky";
import { movedBy } from "./movable";

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

const MAX_ITERATIONS = 9;
const DIFFERENCE = 1e-3;
const LONGEST_STEP = 2.5;
/** Residuals beyond about this many standard uncertainties pull ever less. */
const TAIL = 5;

const x = new Float64Array(PARAMETER_COUNT);
const base: Predictions = newPredictions(), nudged: Predictions = newPredictions();

/** Physical values at z, into the shared vector that is also returned. */
export function physical(c: Candidate, z: Float64Array, out: Float64Array = x): Float64Array {
  const { mean, sd, log } = c.ranges;
  for (let i = 0; i < PARAMETER_COUNT; i++) {
    const v = mean[i]! + sd[i]! * z[i]!;
    out[i] = log[i] ? Math.exp(v) : v;
  }
  return out;
}

interface Workspace { residual: Float64Array; weight: Float64Array; sd: Float64Array; jacobian: Float64Array; live: Uint8Array }

function newWorkspace(observations: number): Workspace {
  return { residual: new Float64Array(observations), weight: new Float64Array(observations), sd: new Float64Array(observations), jacobian: new Float64Array(observations * PARAMETER_COUNT), live: new Uint8Array(observations) };
}

/** Log-posterior density at z up to the integral; fills residuals and weights. */
function evaluate(c: Candidate, z: Float64Array, obs: readonly Observation[], groups: number, meter: MeterSpec, w: Workspace): number {
  predictInto(c, physical(c, z), groups, base);
  let log = base.logState;
  for (let i = 0; i < PARAMETER_COUNT; i++) log -= 0.5 * z[i]! * z[i]!;
  for (let i = 0; i < obs.length; i++) {
    const o = obs[i]!;
    w.live[i] = 0;
    if (o.word !== null) { log += wordLogChance(o, base); continue; }
    const shown = numberLogChance(o, base);
    if (shown === null) { log += strayNumberLogDensity(); continue; }
    const sd = Math.hypot(o.sd, base.slack[o.index]!);
    const r = (o.scaled - scalePrediction(o.spec, base.value[o.index]!, meter)) / sd;
    w.live[i] = 1; w.residual[i] = r; w.sd[i] = sd;
    w.weight[i] = 1 / (1 + r * r / (TAIL * TAIL));
    log += shown + o.logPeak - Math.log(sd / o.sd) - 0.5 * TAIL * TAIL * Math.log(1 + r * r / (TAIL * TAIL));
  }
  return log;
}

/** Derivatives of the scaled predictions by z, over sd, by forward differences. `base` holds the predictions at z. */
function differentiate(c: Candidate, z: Float64Array, movable: readonly number[], obs: readonly Observation[], groups: number, meter: MeterSpec, w: Workspace): void {
  for (let k = 0; k < movable.length; k++) {
    const p = movable[k]!, kept = z[p]!;
    z[p] = kept + DIFFERENCE;
    predictInto(c, physical(c, z), groups, nudged);
    z[p] = kept;
    for (let i = 0; i < obs.length; i++) {
      const o = obs[i]!;
      w.jacobian[i * movable.length + k] = w.live[i] ? (scalePrediction(o.spec, nudged.value[o.index]!, meter) - scalePrediction(o.spec, base.value[o.index]!, meter)) / (DIFFERENCE * w.sd[i]!) : 0;
    }
  }
}

/** Precision matrix I + J'WJ and gradient J'Wr - z. */
function normalEquations(z: Float64Array, movable: readonly number[], n: number, w: Workspace, precision: Float64Array, gradient: Float64Array): void {
  const m = movable.length;
  precision.fill(0);
  for (let a = 0; a < m; a++) { precision[a * m + a] = 1; gradient[a] = -z[movable[a]!]!; }
  for (let i = 0; i < n; i++) {
    if (!w.live[i]) continue;
    for (let a = 0; a < m; a++) {
      const ja = w.jacobian[i * m + a]! * w.weight[i]!;
      if (ja === 0) continue;
      gradient[a]! += ja * w.residual[i]!;
      for (let b = 0; b <= a; b++) precision[a * m + b]! += ja * w.jacobian[i * m + b]!;
    }
  }
}

/** Fits one candidate. `start` is a first guess of z (not changed). Same input, same result, to the last bit. */
export function fitCandidate(c: Candidate, obs: readonly Observation[], groups: number, meter: MeterSpec, start: Float64Array): Fit {
  const movable = movedBy(c, groups), m = movable.length, w = newWorkspace(obs.length);
  const z = Float64Array.from(start), precision = new Float64Array(m * m), step = new Float64Array(m), trial = new Float64Array(PARAMETER_COUNT);
  let log = evaluate(c, z, obs, groups, meter, w);
  for (let iteration = 0; ; iteration++) {
    differentiate(c, z, movable, obs, groups, meter, w);
    normalEquations(z, movable, obs.length, w, precision, step);
    factor(precision, m);
    if (iteration === MAX_ITERATIONS) break;
    solveFactored(precision, m, step);
    const better = lineSearch(c, z, movable, step, trial, obs, groups, meter, w, log);
    const gained = better - log;
    log = Math.max(log, better);
    if (gained < 0.02) { if (gained <= 0) evaluate(c, z, obs, groups, meter, w); break; }
  }
  return { logEvidence: log - 0.5 * logDeterminant(precision, m), z, active: movable, precision };
}

/** Halves the step until the fit improves; moves z when it does. Returns the log-density reached, -Infinity if none. */
function lineSearch(c: Candidate, z: Float64Array, movable: readonly number[], step: Float64Array, trial: Float64Array, obs: readonly Observation[], groups: number, meter: MeterSpec, w: Workspace, from: number): number {
  let longest = 0;
  for (const s of step) longest = Math.max(longest, Math.abs(s));
  let share = longest > LONGEST_STEP ? LONGEST_STEP / longest : 1;
  for (let half = 0; half < 5; half++, share /= 2) {
    trial.set(z);
    for (let k = 0; k < movable.length; k++) trial[movable[k]!]! += share * step[k]!;
    const log = evaluate(c, trial, obs, groups, meter, w);
    if (log > from) { z.set(trial); return log; }
  }
  return -Infinity;
}
