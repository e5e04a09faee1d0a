import { compile, effortFrom, stateAfter, type Compiled } from "./compile";
import { planNext } from "./plan";
import type { PlanOptions, PlanProblem } from "./types";

/** Cost of a whole strategy. */
export interface StrategyCost {
  /** Expected effort until the hypothesis is known, or as far as the tests can tell. */
  readonly cost: number;
  /** The test at the root; null when there is nothing to tell. */
  readonly root: string | null;
}

const MOST_HYPOTHESES = 20;

/** Outcome of each test under each hypothesis. @throws RangeError unless every row has one certain outcome. */
function table(c: Compiled): Int32Array {
  if (c.size > MOST_HYPOTHESES) throw new RangeError(`at most ${MOST_HYPOTHESES} hypotheses`);
  return Int32Array.from({ length: c.ids.length * c.size }, (_, i) => {
    const test = Math.floor(i / c.size);
    const row = c.offset[test]! + (i % c.size) * c.outcomes[test]!;
    const certain = c.chance.subarray(row, row + c.outcomes[test]!).indexOf(1);
    if (certain < 0) throw new RangeError(`test ${c.ids[test] ?? ""} has an uncertain outcome`);
    return certain;
  });
}

/** Splits a set of hypotheses (bits) by a test's outcome. */
function parts(c: Compiled, outcomes: Int32Array, test: number, set: number): number[] {
  const found = new Array<number>(c.outcomes[test]!).fill(0);
  for (let h = 0; h < c.size; h += 1) if (set & (1 << h)) found[outcomes[test * c.size + h]!]! |= 1 << h;
  return found.filter((part) => part !== 0);
}

function mass(c: Compiled, set: number): number {
  let sum = 0;
  for (let h = 0; h < c.size; h += 1) if (set & (1 << h)) sum += c.priors[h]!;
  return sum;
}

/** Hypotheses of chance zero are never met. */
function everything(c: Compiled): number {
  return c.priors.reduce((set, p, h) => (p > 0 ? set | (1 << h) : set), 0);
}

/**
 * Least expected effort of identifying the hypothesis with tests of certain outcome, by dynamic programming over the sets of
 * hypotheses left and the machine's state (the search of Pattipati & Alexandridis 1990, without their bounds).
 * @throws RangeError for more than 20 hypotheses, or a test whose outcome is not certain.
 */
export function optimalCost(problem: PlanProblem): StrategyCost {
  const c = compile(problem);
  const outcomes = table(c);
  const known = new Map<string, StrategyCost>();
  const best = (set: number, state: number): StrategyCost => {
    const key = `${set}/${state}`;
    const seen = known.get(key);
    if (seen) return seen;
    let least: StrategyCost = { cost: Infinity, root: null };
    for (let t = 0; t < c.ids.length; t += 1) {
      const split = parts(c, outcomes, t, set);
      if (split.length < 2) continue;
      // Weighted by the chance of getting here, so that sub-trees simply add up.
      const cost = mass(c, set) * effortFrom(c, t, state) + split.reduce((sum, part) => sum + best(part, stateAfter(c, t, state)).cost, 0);
      if (cost < least.cost - 1e-12) least = { cost, root: c.ids[t] ?? null };
    }
    const answer = least.root === null ? { cost: 0, root: null } : least;
    known.set(key, answer);
    return answer;
  };
  return best(everything(c), c.state);
}

/**
 * Expected effort when every test is chosen by `planNext`, for tests of certain outcome.
 * @throws RangeError as `optimalCost` does.
 */
export function policyCost(problem: PlanProblem, options: PlanOptions = {}): StrategyCost {
  const c = compile(problem);
  const outcomes = table(c);
  const follow = (set: number, state: number): StrategyCost => {
    const priors = problem.priors.map((p, h) => (set & (1 << h) ? p : 0));
    const flags = c.toggleCosts.length > 0 ? Array.from(c.toggleCosts, (_, i) => (state & (1 << i)) !== 0) : undefined;
    const next = planNext({ ...problem, priors, ...(flags ? { state: flags } : {}) }, options);
    if (!next) return { cost: 0, root: null };
    const test = c.ids.indexOf(next.test);
    const below = parts(c, outcomes, test, set).map((part) => follow(part, stateAfter(c, test, state)).cost);
    return { cost: mass(c, set) * effortFrom(c, test, state) + below.reduce((sum, cost) => sum + cost, 0), root: next.test };
  };
  return follow(everything(c), c.state);
}
