import type { Candidate } from "../circuit/candidate";
import { PARAMETER_COUNT } from "../circuit/parameters";
import { factor, logDeterminant, solveFactored } from "./cholesky";
import { differentiate, evaluate, followOn, gradientAt, makeRoom, normalEquations, pullInFull, stillOpen, stuck, type Evidence } from "./misfit";
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
  /** What the log-evidence is at most: itself, or where the fit was given up what it might have reached. */
  readonly ceiling: number;
}

const MAX_ITERATIONS = 14;
const LONGEST_STEP = 2.5;
/** Steps made with every residual pulling in full, so that a start far off does not leave a reading for lost. */
const FULL_PULL_STEPS = 4;
/** A fit is given up when this many times what its next step promises, and a little more, would not be enough. */
const TRUST = 6, MARGIN = 8;
/** What a step has to promise to be made, and the gain from which on another is tried, natural-log units. */
const WORTH_A_STEP = 0.02, STALLED = 0.002;
/** How often a step is tried, ever shorter. */
const MOST_HALVINGS = 6;
const MIDDLE = new Float64Array(PARAMETER_COUNT);

/**
 * Fits one candidate. `start` is a first guess of z (not changed); `least` is the log-evidence below which the candidate
 * does not matter: its fit is given up as soon as it cannot get there. Same input, same result, to the last bit.
 */
export function fitCandidate(c: Candidate, e: Evidence, start: Float64Array, least = -Infinity): Fit {
  makeRoom(e.observations.length);
  const log = evaluate(c, start, e);
  if (log + stillOpen() < least) return givenUp(start, log + stillOpen());
  const direct = climb(c, e, start, log, least);
  if (direct.logEvidence === -Infinity || !stuck(e) || direct.logEvidence + stillOpen() < least) return direct;
  const reach = Math.max(least, direct.logEvidence), near = pulledIn(c, e, start);
  const pulled = climb(c, e, near, evaluate(c, near, e), reach);
  const better = pulled.logEvidence > direct.logEvidence ? pulled : direct;
  if (!stuck(e) || start.every((v) => v === 0)) return better;
  const fresh = afresh(c, e, Math.max(least, better.logEvidence));
  return fresh.logEvidence > better.logEvidence ? fresh : better;
}

/** A climb from the middle of every range. */
function afresh(c: Candidate, e: Evidence, least: number): Fit {
  return climb(c, e, MIDDLE, evaluate(c, MIDDLE, e), least);
}

/** A start from which no residual is out of reach: some steps with every residual pulling in full. */
function pulledIn(c: Candidate, e: Evidence, start: Float64Array): Float64Array {
  pullInFull(true);
  const w = workFor(c, e, start);
  let log = evaluate(c, w.z, e);
  for (let step = 0; step < FULL_PULL_STEPS; step++) {
    exactStep(c, e, w, step > 0);
    const better = lineSearch(c, w, e, log);
    if (better - log < 1) break;
    log = better;
  }
  pullInFull(false);
  return w.z.slice();
}

/** What one climb works on. */
interface Work { readonly z: Float64Array; movable: readonly number[]; readonly precision: Float64Array; readonly gradient: Float64Array; readonly step: Float64Array; readonly moved: Float64Array; readonly trial: Float64Array }

/** One for each number of unknowns; a climb overwrites the last one's. */
const works: Work[] = [];

function workFor(c: Candidate, e: Evidence, start: Float64Array): Work {
  const movable = movedBy(c, e.plan, e.pins), m = movable.length;
  const work = works[m] ??= { z: new Float64Array(PARAMETER_COUNT), movable, precision: new Float64Array(m * m), gradient: new Float64Array(m), step: new Float64Array(m), moved: new Float64Array(m), trial: new Float64Array(PARAMETER_COUNT) };
  work.movable = movable;
  work.z.set(start);
  return work;
}

/** Gauss-Newton step and the factor of the precision, by the derivatives in force; returns what the step promises. */
function newtonStep(e: Evidence, w: Work): number {
  normalEquations(w.z, w.movable, e.observations.length, w.precision, w.gradient);
  factor(w.precision, w.movable.length);
  w.step.set(w.gradient);
  solveFactored(w.precision, w.movable.length, w.step);
  return promised(w.gradient, w.step);
}

/** The same with derivatives taken at z, where the last evaluation has been. */
function exactStep(c: Candidate, e: Evidence, w: Work, again: boolean): number {
  differentiate(c, w.z, w.movable, e, again);
  return newtonStep(e, w);
}

/** Laplace's integral over z from the log-density at its peak; an upper bound on the way there. */
const integrated = (log: number, w: Work) => log - 0.5 * logDeterminant(w.precision, w.movable.length);

/** Climbs from a start to a peak of the density, where derivatives are taken anew only at the start and the end. */
function climb(c: Candidate, e: Evidence, start: Float64Array, from: number, least: number): Fit {
  const w = workFor(c, e, start);
  let log = from, gained = Infinity, exact = true;
  // The last evaluation may have been elsewhere; residuals and weights have to be those of the start.
  evaluate(c, w.z, e);
  let promise = exactStep(c, e, w, false);
  for (let iteration = 0; iteration < MAX_ITERATIONS; iteration++) {
    if (!exact && (promise < WORTH_A_STEP || gained < STALLED)) { promise = exactStep(c, e, w, true); exact = true; }
    if (promise < WORTH_A_STEP) break;
    const ceiling = integrated(log, w) + TRUST * Math.max(gained, promise) + MARGIN;
    if (ceiling < least) return givenUp(w.z.slice(), ceiling);
    const better = lineSearch(c, w, e, log);
    if (better === -Infinity) {
      if (exact) break;
      evaluate(c, w.z, e);
    } else {
      gained = better - log;
      log = better;
      if (exact && gained < STALLED) break;
    }
    exact = better === -Infinity || !followOn(w.moved, e);
    promise = exact ? exactStep(c, e, w, true) : newtonStep(e, w);
  }
  if (!exact) exactStep(c, e, w, true);
  const logEvidence = integrated(log, w);
  return { logEvidence, z: w.z.slice(), active: w.movable, precision: w.precision.slice(), ceiling: logEvidence };
}

const NOTHING = new Float64Array(0);
const givenUp = (z: Float64Array, ceiling: number): Fit => ({ logEvidence: -Infinity, z, active: [], precision: NOTHING, ceiling });

/** Gain of a step in the quadratic model of the misfit, natural-log units. */
function promised(gradient: Float64Array, step: Float64Array): number {
  let sum = 0;
  for (let k = 0; k < step.length; k++) sum += gradient[k]! * step[k]!;
  return 0.5 * sum;
}

/**
 * Takes the step, or where that leads astray in a bent valley the step and what its end asks for by the same derivatives, or
 * a half of it, and so on; moves z when the fit improves. Returns the log-density reached, -Infinity if none.
 */
function lineSearch(c: Candidate, w: Work, e: Evidence, from: number): number {
  const m = w.movable.length;
  let longest = 0;
  for (const s of w.step) longest = Math.max(longest, Math.abs(s));
  let share = longest > LONGEST_STEP ? LONGEST_STEP / longest : 1;
  for (let half = 0; half < MOST_HALVINGS; half++, share /= 2) {
    for (let k = 0; k < m; k++) w.moved[k] = share * w.step[k]!;
    let log = tryOut(c, w, e);
    if (!(log > from)) {
      gradientAt(w.trial, w.movable, e.observations.length, w.gradient);
      solveFactored(w.precision, m, w.gradient);
      for (let k = 0; k < m; k++) w.moved[k]! += w.gradient[k]!;
      log = tryOut(c, w, e);
    }
    if (log > from) { w.z.set(w.trial); return log; }
  }
  return -Infinity;
}

/** Log-density at z with what is moved. */
function tryOut(c: Candidate, w: Work, e: Evidence): number {
  w.trial.set(w.z);
  for (let k = 0; k < w.movable.length; k++) w.trial[w.movable[k]!]! += w.moved[k]!;
  return evaluate(c, w.trial, e);
}

/** Where nothing was read. */
export const NO_FIT: Fit = { logEvidence: 0, z: MIDDLE, active: [], precision: NOTHING, ceiling: 0 };

/** One fit out of several that have no unknown in common: their precision is block-diagonal. */
export function together(...fits: readonly Fit[]): Fit {
  const active = fits.flatMap((f) => f.active), m = active.length, precision = new Float64Array(m * m), z = new Float64Array(PARAMETER_COUNT);
  let offset = 0, logEvidence = 0;
  for (const f of fits) {
    const k = f.active.length;
    for (let i = 0; i < k; i++) {
      z[f.active[i]!] = f.z[f.active[i]!]!;
      for (let j = 0; j <= i; j++) precision[(offset + i) * m + offset + j] = f.precision[i * k + j]!;
    }
    offset += k;
    logEvidence += f.logEvidence;
  }
  return { logEvidence, z, active, precision, ceiling: logEvidence };
}
