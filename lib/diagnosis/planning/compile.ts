import type { PlanProblem, PlanTest } from "./types";
import { log2 } from "../numerics";

/** The problem in flat arrays, so that the inner loops allocate nothing. */
export interface Compiled {
  readonly size: number;
  readonly priors: Float64Array;
  readonly ids: readonly string[];
  readonly cost: Float64Array;
  readonly outcomes: Int32Array;
  /** Start of each test's rows in `chance`: row of hypothesis h, outcome o at offset + h * outcomes + o. */
  readonly offset: Int32Array;
  readonly chance: Float64Array;
  /** Entropy of a test's outcome under one hypothesis, bits: test * size + hypothesis. */
  readonly noise: Float64Array;
  readonly needsMask: Int32Array;
  readonly needsValue: Int32Array;
  readonly toggleCosts: Float64Array;
  readonly state: number;
  readonly stopAt: number;
  readonly mostOutcomes: number;
}

/** Switches as bits; more than 30 do not fit. */
function bits(flags: readonly (boolean | null)[], wanted: (flag: boolean | null) => boolean): number {
  if (flags.length > 30) throw new RangeError("at most 30 switches");
  return flags.reduce<number>((mask, flag, i) => (wanted(flag) ? mask | (1 << i) : mask), 0);
}

function normalised(priors: readonly number[]): Float64Array {
  const total = priors.reduce((sum, p) => sum + p, 0);
  if (!(total > 0) || !Number.isFinite(total) || priors.some((p) => p < 0)) throw new RangeError("priors must be finite, not negative, and not all zero");
  return Float64Array.from(priors, (p) => p / total);
}

function checkTest(test: PlanTest, size: number): number {
  const outcomes = test.outcomes[0]?.length ?? 0;
  if (test.outcomes.length !== size || test.outcomes.some((row) => row.length !== outcomes)) throw new RangeError(`test ${test.id}: one row of outcomes for each hypothesis`);
  if (!(test.cost > 0) || !Number.isFinite(test.cost)) throw new RangeError(`test ${test.id}: cost must be greater than zero`);
  return outcomes;
}

function fillChances(tests: readonly PlanTest[], size: number, offset: Int32Array, chance: Float64Array, noise: Float64Array): void {
  tests.forEach((test, t) => {
    let at = offset[t]!;
    for (let h = 0; h < size; h += 1) {
      let entropy = 0;
      for (const p of test.outcomes[h]!) {
        chance[at] = p;
        at += 1;
        if (p > 0) entropy -= p * log2(p);
      }
      noise[t * size + h] = entropy;
    }
  });
}

/**
 * Lays the problem out flat.
 * @throws RangeError for priors or costs that are no numbers of their kind, or a test without a row for each hypothesis.
 */
export function compile(problem: PlanProblem): Compiled {
  const { tests } = problem;
  const priors = normalised(problem.priors);
  const size = priors.length;
  const outcomes = Int32Array.from(tests, (test) => checkTest(test, size));
  const offset = new Int32Array(tests.length + 1);
  outcomes.forEach((count, t) => { offset[t + 1] = offset[t]! + count * size; });
  const chance = new Float64Array(offset[tests.length]!);
  const noise = new Float64Array(tests.length * size);
  fillChances(tests, size, offset, chance, noise);
  return {
    size, priors, outcomes, offset, chance, noise,
    ids: tests.map((test) => test.id),
    cost: Float64Array.from(tests, (test) => test.cost),
    needsMask: Int32Array.from(tests, (test) => bits(test.needs ?? [], (flag) => flag !== null)),
    needsValue: Int32Array.from(tests, (test) => bits(test.needs ?? [], (flag) => flag === true)),
    toggleCosts: Float64Array.from(problem.toggleCosts ?? []),
    state: bits(problem.state ?? [], (flag) => flag === true),
    stopAt: problem.stopAt ?? 1,
    mostOutcomes: outcomes.reduce((most, count) => Math.max(most, count), 1),
  };
}

/** Effort of a test from a state of the machine, switches included. */
export function effortFrom(c: Compiled, test: number, state: number): number {
  let wrong = (state ^ c.needsValue[test]!) & c.needsMask[test]!;
  let effort = c.cost[test]!;
  for (let i = 0; wrong !== 0; i += 1, wrong >>= 1) if (wrong & 1) effort += c.toggleCosts[i] ?? 0;
  return effort;
}

/** State of the machine once the test has been made. */
export function stateAfter(c: Compiled, test: number, state: number): number {
  return (state & ~c.needsMask[test]!) | c.needsValue[test]!;
}
