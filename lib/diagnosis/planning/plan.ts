import { compile, effortFrom, type Compiled } from "./compile";
import { entropyBits, gainBits, surest } from "./gain";
import { LookAhead, NO_GAIN } from "./look-ahead";
import type { PlannedTest, PlanOptions, PlanProblem } from "./types";

interface Candidate { readonly index: number; readonly gain: number; readonly effort: number; readonly rate: number; toGo: number }

function candidates(c: Compiled): Candidate[] {
  const scratch = new Float64Array(c.mostOutcomes);
  return c.ids.map((_, index) => {
    const gain = gainBits(c, index, c.priors, scratch);
    const effort = effortFrom(c, index, c.state);
    return { index, gain, effort, rate: gain / effort, toGo: Infinity };
  }).filter(({ gain }) => gain > NO_GAIN);
}

/** By expected effort, then by information per effort, then by id, so that the same input always gives the same order. */
function inOrder(c: Compiled): (a: Candidate, b: Candidate) => number {
  const id = (candidate: Candidate) => c.ids[candidate.index] ?? "";
  return (a, b) => {
    if (Math.abs(a.toGo - b.toGo) > 1e-12 * Math.max(1, Math.abs(a.toGo))) return a.toGo - b.toGo;
    if (Math.abs(a.rate - b.rate) > 1e-12) return b.rate - a.rate;
    return id(a) < id(b) ? -1 : 1;
  };
}

function lookInto(c: Compiled, all: Candidate[], price: number, depth: number, beam: number): void {
  const open = entropyBits(c.priors);
  for (const candidate of all) candidate.toGo = candidate.effort + price * Math.max(0, open - candidate.gain);
  if (depth <= 1) return;
  const search = new LookAhead(c, depth, price, beam);
  const promising = [...all].sort(inOrder(c)).slice(0, beam);
  for (const candidate of promising) candidate.toGo = search.after(candidate.index, c.priors, c.state, depth);
  // A test that was not looked into keeps its one-step estimate, and must not overtake on it.
  const worst = promising.reduce((most, { toGo }) => Math.max(most, toGo), 0);
  for (const candidate of all) if (!promising.includes(candidate)) candidate.toGo = Math.max(candidate.toGo, worst);
}

/**
 * All tests that can still tell something, best first. One step ahead this is information per effort (the figure of merit of
 * Johnson 1960). Further ahead it is the expected effort to the end, with information beyond the horizon priced at the best rate
 * on offer now. Greedy choice can lose by any factor (Garey & Graham 1974), and so can a short look ahead: no optimality is claimed.
 *
 * @returns empty when a hypothesis has reached `stopAt` or no test would tell anything.
 * @throws RangeError for a malformed problem.
 */
export function rankTests(problem: PlanProblem, options: PlanOptions = {}): PlannedTest[] {
  const c = compile(problem);
  if (surest(c.priors) >= c.stopAt - 1e-12) return [];
  const all = candidates(c);
  const rate = all.reduce((best, candidate) => Math.max(best, candidate.rate), 0);
  if (rate === 0) return [];
  lookInto(c, all, 1 / rate, Math.max(1, options.lookAhead ?? 1), options.beam ?? c.ids.length);
  const open = entropyBits(c.priors);
  return all.sort(inOrder(c)).map(({ index, gain, effort, toGo }) => ({ test: c.ids[index] ?? "", gainBits: gain, effort, score: open / toGo }));
}

/** The test to make next, or null when nothing is left to find out; see `rankTests`. */
export function planNext(problem: PlanProblem, options: PlanOptions = {}): PlannedTest | null {
  return rankTests(problem, options)[0] ?? null;
}
