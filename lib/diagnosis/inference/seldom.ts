import type { Candidate } from "../circuit/candidate";
import { exp } from "../numerics";
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

/** An unknown this many standard deviations from the middle of its range strains an explanation. */
const STRAINED = 3.5;

/** Whether even the likeliest explanation has to take an unknown far out of its range. */
export function strained(b: Believed): boolean {
  return b.fit.active.some((place) => Math.abs(b.fit.z[place]!) > STRAINED);
}
