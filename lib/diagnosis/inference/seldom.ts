import type { Candidate } from "../circuit/candidate";
import { exp, ln } from "../numerics";
import type { Believed } from "./posterior";

/** Belief this far (in natural-log units) behind the best is left out, as where it is first worked out. */
const CUT = 10;
const byId = (a: Candidate, b: Candidate) => (a.hypothesis.id < b.hypothesis.id ? -1 : 1);

/** One belief out of two over different candidates, whose chances before the first reading are of one measure. */
export function mergeBeliefs(a: readonly Believed[], b: readonly Believed[]): Believed[] {
  const list = [...a, ...b].sort((one, other) => other.logWeight - one.logWeight || byId(one.candidate, other.candidate));
  const best = list[0]!.logWeight, kept = list.filter((one) => one.logWeight >= best - CUT);
  const total = kept.reduce((sum, one) => sum + exp(one.logWeight - best), 0);
  return kept.map((one) => ({ ...one, p: exp(one.logWeight - best) / total }));
}

/** What a slip costs (its chance, and a value that may be anything), and the square of the uncertainties where a fit's loss grows slowly, natural-log units. */
const SLIP_COST = 9, TAIL_SQUARED = 25;

/** What the reading furthest off costs its explanation beyond what a slip would; `far` in standard uncertainties. */
export function slipRelief(far: readonly number[]): number {
  const worst = far.reduce((most, f) => Math.max(most, f), 0);
  return Math.max(0, 0.5 * TAIL_SQUARED * ln(1 + worst * worst / TAIL_SQUARED) - SLIP_COST);
}

/** An unknown this many standard deviations from the middle of its range strains an explanation. */
const STRAINED = 3.5;

/** Whether even the likeliest explanation has to take an unknown far out of its range. */
export function strained(b: Believed): boolean {
  return b.fit.active.some((place) => Math.abs(b.fit.z[place]!) > STRAINED);
}
