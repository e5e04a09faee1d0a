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
}

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
export function believeWith(fits: PartFits, candidates: readonly Candidate[], { cut = CUT }: Looking = {}): Believed[] {
  const bounds = Float64Array.from(candidates, (c) => fits.bound(c)), highest = bounds.reduce((a, b) => Math.max(a, b), -Infinity), out: Believed[] = [];
  let best = -Infinity, mark = best, shell = Infinity;
  for (let top = highest; top >= best - cut && top > -Infinity; top -= SLICE) {
    for (const i of between(bounds, top - SLICE, top === highest ? Infinity : top)) {
      const candidate = candidates[i]!, bound = bounds[i]!;
      if (bound < shell - SHELL) { shell = bound; mark = best; }
      if (bound < mark - cut) break;
      const fit = fits.fit(candidate, mark - cut), logWeight = candidate.logPrior + fit.logEvidence;
      if (logWeight === -Infinity) continue;
      best = Math.max(best, logWeight);
      out.push({ candidate, fit, logWeight, p: 0 });
    }
  }
  return normalise(out, cut);
}

/** Bounds are put in order so much of them at a time, natural-log units: most candidates are never looked at. */
const SLICE = 8;

/** Places of the bounds from `low` up to (not with) `high`, highest first. */
function between(bounds: Float64Array, low: number, high: number): number[] {
  const places: number[] = [];
  for (let i = 0; i < bounds.length; i++) if (bounds[i]! >= low && bounds[i]! < high) places.push(i);
  return places.sort((a, b) => bounds[b]! - bounds[a]! || a - b);
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
