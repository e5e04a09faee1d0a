import type { Candidate } from "../circuit/candidate";
import { ALL_PINS } from "../circuit/harness-parts";
import { PARAMETER_COUNT, physicalValue } from "../circuit/parameters";
import { ALL_GROUPS, CHECK_COUNT, newPredictions, planFor, predictInto, type Plan, type Predictions } from "../circuit/predict";
import type { MeterSpec } from "../types";
import { reachOf } from "./movable";
import { numberLogChance, scalePrediction, strayNumberLogDensity, wordLogChance, type Observation } from "./observe";
import { ln, norm } from "../numerics";

/**
 * How far a candidate's predictions are from the readings, and how that changes with its unknowns. One workspace serves
 * every fit: what the point last evaluated left behind is read before the next evaluation.
 */

/** Readings with what is needed to compare them: made once, used for every candidate. */
export interface Evidence {
  readonly observations: readonly Observation[];
  readonly plan: Plan;
  readonly meter: MeterSpec;
  /** Pins of the harness that the readings speak of, as bits. */
  readonly pins: number;
}

/** Gathers observations with the plan of checks they need. */
export function evidenceOf(observations: readonly Observation[], meter: MeterSpec, pins = ALL_PINS): Evidence {
  return { observations, plan: planFor(observations.map((o) => o.index)), meter, pins };
}

const DIFFERENCE = 1e-3;
/** Square of the standard uncertainties beyond which a residual pulls ever less; on the way there every residual pulls in full. */
const TAIL_SQUARED = 25, NO_TAIL = 1e6;
/** Residual, in standard uncertainties, from which a fit counts as stuck and is tried another way. */
const STUCK = 3.5;

const x = new Float64Array(PARAMETER_COUNT);
const base: Predictions = newPredictions(), nudged: Predictions = newPredictions();
const predicted = new Float64Array(CHECK_COUNT);
const moves = new Uint8Array(PARAMETER_COUNT);

/** Workspace that grows to the longest list of readings seen; overwritten by every fit. */
let room = 0;
let residual = new Float64Array(0), weight = residual, sds = residual, jacobian = residual, from = residual, live = new Uint8Array(0);

/** Makes the workspace large enough for so many readings. */
export function makeRoom(observations: number): void {
  if (observations <= room) return;
  room = observations + 16;
  residual = new Float64Array(room); weight = new Float64Array(room); sds = new Float64Array(room);
  jacobian = new Float64Array(room * PARAMETER_COUNT); from = new Float64Array(room); live = new Uint8Array(room);
}

/** Physical values at z, written into `out`. */
export function physical(c: Candidate, z: Float64Array, out: Float64Array): Float64Array {
  out.set(c.middle);
  for (let i = 0; i < PARAMETER_COUNT; i++) if (z[i] !== 0) out[i] = physicalValue(c.ranges, i, z[i]!);
  return out;
}

/** The most that the point last evaluated could still gain: what its numbers are off, and its unknowns off their middles. */
let open = 0;

/** Tail in force. */
let tail = TAIL_SQUARED;

/** Lets every residual pull in full (on the way to a fit), or wild ones with bounded force. */
export function pullInFull(full: boolean): void { tail = full ? NO_TAIL : TAIL_SQUARED; }

/** The most that the point last evaluated could still gain, natural-log units. */
export function stillOpen(): number { return open; }

/** Log-posterior density at z up to the integral; leaves residuals, weights and scaled predictions in the workspace. */
export function evaluate(c: Candidate, z: Float64Array, e: Evidence): number {
  base.logState = 0; base.idle = false; open = 0;
  predictInto(c, physical(c, z, x), e.plan, ALL_GROUPS, base);
  let log = base.logState;
  for (let i = 0; i < PARAMETER_COUNT; i++) open += 0.5 * z[i]! * z[i]!;
  log -= open;
  for (let i = 0; i < e.observations.length; i++) log += compare(e.observations[i]!, i, e.meter);
  return log;
}

/** What each reading costs at z, natural-log units below the best it could be; and last what the unknowns cost that are off their middles. */
export function lossesAt(c: Candidate, z: Float64Array, e: Evidence): Float64Array {
  const losses = new Float64Array(e.observations.length + 1);
  makeRoom(e.observations.length);
  evaluate(c, z, e);
  e.observations.forEach((o, i) => { losses[i] = (o.word === null ? o.logPeak : 0) - compare(o, i, e.meter); });
  losses[e.observations.length] = 0.5 * z.reduce((sum, v) => sum + v * v, 0);
  return losses;
}

function compare(o: Observation, i: number, meter: MeterSpec): number {
  live[i] = 0;
  if (o.word !== null) return wordLogChance(o, base);
  const shown = numberLogChance(o, base);
  if (shown === null) return strayNumberLogDensity();
  const slack = base.slack[o.index]!, sd = slack === 0 ? o.sd : norm(o.sd, slack);
  predicted[o.index] = scalePrediction(o.spec, base.value[o.index]!, meter);
  const r = (o.scaled - predicted[o.index]!) / sd, spread = 1 + r * r / tail;
  const loss = 0.5 * tail * ln(spread);
  open += loss;
  live[i] = 1; residual[i] = r; sds[i] = sd; weight[i] = 1 / spread;
  return shown + o.logPeak - (slack === 0 ? 0 : ln(sd / o.sd)) - loss;
}

/**
 * Derivatives of the scaled predictions by z, by forward differences at the point last evaluated. An unknown that
 * had nothing to move the first time (`again` false) is passed over later.
 */
export function differentiate(c: Candidate, z: Float64Array, movable: readonly number[], e: Evidence, again: boolean): void {
  const m = movable.length, n = e.observations.length;
  physical(c, z, x);
  for (let k = 0; k < m; k++) {
    if (again && !moves[k]) continue;
    const p = movable[k]!, kept = x[p]!, reach = reachOf(c, p, base.idle);
    x[p] = physicalValue(c.ranges, p, z[p]! + DIFFERENCE);
    predictInto(c, x, e.plan, reach, nudged, true);
    x[p] = kept;
    let any = z[p] === 0 ? 0 : 1;
    for (let i = 0; i < n; i++) {
      const o = e.observations[i]!;
      const d = live[i] && o.group & reach ? (scalePrediction(o.spec, nudged.value[o.index]!, e.meter) - predicted[o.index]!) / DIFFERENCE : 0;
      jacobian[i * m + k] = d;
      if (d !== 0 || (!live[i] && o.word === null)) any = 1;
    }
    moves[k] = any;
  }
  for (let i = 0; i < n; i++) from[i] = live[i] ? predicted[e.observations[i]!.index]! : NaN;
}

/**
 * Brings the derivatives up to the point last evaluated, `moved` from where they were last right, by the least change
 * that makes them agree with what the predictions did on the way (Broyden 1965). False where a reading turned from
 * number to word or back, so that they have to be taken anew.
 */
export function followOn(moved: Float64Array, e: Evidence): boolean {
  const m = moved.length;
  let length = 0;
  for (let k = 0; k < m; k++) length += moved[k]! * moved[k]!;
  for (let i = 0; i < e.observations.length; i++) {
    if (live[i] ? Number.isNaN(from[i]!) : !Number.isNaN(from[i]!)) return false;
    if (!live[i]) continue;
    const now = predicted[e.observations[i]!.index]!;
    let miss = now - from[i]!;
    for (let k = 0; k < m; k++) miss -= jacobian[i * m + k]! * moved[k]!;
    miss /= length;
    for (let k = 0; k < m; k++) jacobian[i * m + k]! += miss * moved[k]!;
    from[i] = now;
  }
  return true;
}

/** Gradient J'Wr - z at the point last evaluated, by the derivatives in force. */
export function gradientAt(z: Float64Array, movable: readonly number[], n: number, gradient: Float64Array): void {
  const m = movable.length;
  for (let a = 0; a < m; a++) gradient[a] = -z[movable[a]!]!;
  for (let i = 0; i < n; i++) {
    if (!live[i]) continue;
    const pull = residual[i]! * weight[i]! / sds[i]!;
    for (let a = 0; a < m; a++) gradient[a]! += jacobian[i * m + a]! * pull;
  }
}

/** Precision matrix I + J'WJ and gradient J'Wr - z. */
export function normalEquations(z: Float64Array, movable: readonly number[], n: number, precision: Float64Array, gradient: Float64Array): void {
  const m = movable.length;
  gradientAt(z, movable, n, gradient);
  precision.fill(0);
  for (let a = 0; a < m; a++) precision[a * m + a] = 1;
  for (let i = 0; i < n; i++) {
    if (!live[i]) continue;
    const scale = 1 / sds[i]!, heft = weight[i]! * scale;
    for (let a = 0; a < m; a++) {
      const ja = jacobian[i * m + a]! * heft;
      if (ja === 0) continue;
      for (let b = 0; b <= a; b++) precision[a * m + b]! += ja * (jacobian[i * m + b]! * scale);
    }
  }
}

/** Whether a number is far from what the point last evaluated predicts. */
export function stuck(e: Evidence): boolean {
  for (let i = 0; i < e.observations.length; i++) if (live[i] && Math.abs(residual[i]!) > STUCK) return true;
  return false;
}
