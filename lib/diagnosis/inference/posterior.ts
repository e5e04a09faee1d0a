import type { Candidate } from "../circuit/candidate";
import type { MeterSpec } from "../types";
import type { Fit } from "./fit";
import type { Observation } from "./observe";
import { PartFits } from "./part-fits";
import { exp } from "../numerics";

/** A candidate with its fit and its share of the belief. */
export interface Believed { readonly candidate: Candidate; readonly fit: Fit; readonly logWeight: number; p: number }

/** Candidates this far (in natural-log units) behind the best are left out: less than one in twenty thousand. */
const CUT = 10;
/** Candidates whose bounds are this near are looked into before any of them sets the mark for the rest: so the order of equals does not matter. */
const SHELL = 0.25;

/** How thoroughly to look. */
export interface Looking {
  /** Candidates this far behind the best are left out, natural-log units. */
  readonly cut?: number;
  /** Log-weight below which nothing matters. */
  readonly least?: number;
}

interface Bounded { readonly candidate: Candidate; readonly bound: number }

/**
 * Belief over all candidates. The readings of device and harness fall into parts that have no unknown in common: each is
 * fitted apart and shared by all candidates that agree there. Their sum, with the best that the readings on live wires
 * could add, bounds a candidate from above. Only those whose bound can still matter are fitted to everything jointly,
 * best bound first.
 */
export function believe(candidates: readonly Candidate[], obs: readonly Observation[], meter: MeterSpec, how: Looking = {}): Believed[] {
  return believeWith(new PartFits(obs, meter), candidates, how);
}

/** The same, with fits that may have been made before. */
export function believeWith(fits: PartFits, candidates: readonly Candidate[], { cut = CUT, least = -Infinity }: Looking = {}): Believed[] {
  const bounded = boundsOf(fits, candidates, fits.separate ? cut : Infinity), out: Believed[] = [];
  let best = least + cut, mark = best, shell = Infinity;
  for (const { candidate, bound } of bounded) {
    if (bound < shell - SHELL) { shell = bound; mark = best; }
    if (bound < mark - cut) break;
    const fit = fits.fit(candidate, mark - cut);
    const logWeight = candidate.logPrior + fit.logEvidence;
    if (logWeight === -Infinity) continue;
    best = Math.max(best, logWeight);
    out.push({ candidate, fit, logWeight, p: 0 });
  }
  return normalise(out, cut);
}

/** Candidates with what their log-weight is at most, best first; those further than `within` behind the best are left out. */
function boundsOf(fits: PartFits, candidates: readonly Candidate[], within: number): Bounded[] {
  const bounds = candidates.map((c) => fits.bound(c)), best = bounds.reduce((a, b) => Math.max(a, b), -Infinity);
  return candidates.map((candidate, i) => ({ candidate, bound: bounds[i]! })).filter(({ bound }) => bound >= best - within)
    .sort((a, b) => b.bound - a.bound || byId(a.candidate, b.candidate));
}

const byId = (a: Candidate, b: Candidate) => (a.hypothesis.id < b.hypothesis.id ? -1 : 1);

function normalise(list: Believed[], cut: number): Believed[] {
  if (list.length === 0) return list;
  list.sort((a, b) => b.logWeight - a.logWeight || byId(a.candidate, b.candidate));
  const best = list[0]!.logWeight;
  const kept = list.filter((b) => b.logWeight >= best - cut);
  const total = kept.reduce((sum, b) => sum + exp(b.logWeight - best), 0);
  for (const b of kept) b.p = exp(b.logWeight - best) / total;
  return kept;
}
