import { CHECK_GROUP, GROUP } from "../circuit/predict";
import type { Candidate } from "../circuit/candidate";
import { PARAMETER_COUNT } from "../circuit/parameters";
import type { MeterSpec } from "../types";
import { fitCandidate, type Fit } from "./fit";
import type { Observation } from "./observe";

/** A candidate with its fit and its share of the belief. */
export interface Believed { readonly candidate: Candidate; readonly fit: Fit; readonly logWeight: number; p: number }

/** Candidates this far (in natural-log units) behind the best are left out: less than one in a million. */
const CUT = 14;
const GROUPS_APART = GROUP.cold | GROUP.live | GROUP.wires;

interface Scored { candidate: Candidate; bound: number; start: Float64Array; device: Fit | null; harness: Fit | null }

const maskOf = (obs: readonly Observation[]) => obs.reduce((mask, o) => mask | CHECK_GROUP[o.index]!, 0);
const ZERO = new Float64Array(PARAMETER_COUNT);

/**
 * Belief over all candidates. Device readings and harness readings have no unknown in common, so each is
 * fitted apart and shared by all candidates that agree there; their sum, with the best that the mated
 * readings could add, bounds a candidate from above. Only those whose bound can still matter are fitted to
 * everything jointly, best bound first.
 */
export function believe(candidates: readonly Candidate[], obs: readonly Observation[], meter: MeterSpec): Believed[] {
  const device = obs.filter((o) => o.group === GROUP.device), harness = obs.filter((o) => o.group & GROUPS_APART);
  const mated = obs.filter((o) => o.group === GROUP.mated);
  const scored = score(candidates, device, harness, mated, meter);
  const believed = mated.length > 0 ? joint(scored, obs, meter) : apart(scored);
  return normalise(believed);
}

function score(candidates: readonly Candidate[], device: readonly Observation[], harness: readonly Observation[], mated: readonly Observation[], meter: MeterSpec): Scored[] {
  const deviceFits = new Map<string, Fit>(), harnessFits = new Map<string, Fit>();
  const best = mated.reduce((sum, o) => sum + (o.word === null ? o.logPeak : 0), 0);
  return candidates.map((candidate) => {
    const d = device.length === 0 ? null : shared(deviceFits, deviceKey(candidate), candidate, device, meter);
    const h = harness.length === 0 ? null : shared(harnessFits, harnessKey(candidate), candidate, harness, meter);
    const bound = candidate.logPrior + (d?.logEvidence ?? 0) + (h?.logEvidence ?? 0) + best;
    return { candidate, bound, start: startOf(d, h), device: d, harness: h };
  }).sort((a, b) => b.bound - a.bound || (a.candidate.hypothesis.id < b.candidate.hypothesis.id ? -1 : 1));
}

function shared(cache: Map<string, Fit>, key: string, c: Candidate, obs: readonly Observation[], meter: MeterSpec): Fit {
  let fit = cache.get(key);
  if (!fit) cache.set(key, fit = bestStart(c, obs, maskOf(obs), meter, [ZERO]));
  return fit;
}

const DEVICE_FAULTS = new Set(["wiper-open", "track-open"]);
const deviceKey = (c: Candidate) => `${c.family}|${c.pinOf}|${DEVICE_FAULTS.has(c.code) ? c.code + c.breakEnd : ""}`;
const HARNESS_SOUND = new Set(["none", "wiper-open", "track-open", "track-worn", "output-dead", "output-stuck-high", "output-stuck-low"]);
const harnessKey = (c: Candidate) => `${c.family}|${c.pull}|${c.pinOf}|${HARNESS_SOUND.has(c.code) ? "" : `${c.code}${c.at}${c.at2}`}`;

function startOf(d: Fit | null, h: Fit | null): Float64Array {
  const z = new Float64Array(PARAMETER_COUNT);
  for (const fit of [d, h]) if (fit) for (const p of fit.active) z[p] = fit.z[p]!;
  return z;
}

/** Fits from each start and keeps the best; the misfit of a fault's ohms may have more than one valley. */
function bestStart(c: Candidate, obs: readonly Observation[], groups: number, meter: MeterSpec, starts: readonly Float64Array[]): Fit {
  return starts.map((start) => fitCandidate(c, obs, groups, meter, start)).reduce((a, b) => (b.logEvidence > a.logEvidence ? b : a));
}

function joint(scored: readonly Scored[], obs: readonly Observation[], meter: MeterSpec): Believed[] {
  const groups = maskOf(obs), out: Believed[] = [];
  let best = -Infinity;
  for (const s of scored) {
    if (s.bound < best - CUT) break;
    const fit = bestStart(s.candidate, obs, groups, meter, [s.start]);
    const logWeight = s.candidate.logPrior + fit.logEvidence;
    best = Math.max(best, logWeight);
    out.push({ candidate: s.candidate, fit, logWeight, p: 0 });
  }
  return out;
}

function apart(scored: readonly Scored[]): Believed[] {
  const best = scored[0]!.bound;
  return scored.filter((s) => s.bound >= best - CUT).map((s) => ({ candidate: s.candidate, fit: together(s), logWeight: s.bound, p: 0 }));
}

/** One fit out of the two that were made apart: their unknowns do not overlap, so the precision is block-diagonal. */
function together(s: Scored): Fit {
  const parts = [s.device, s.harness].filter((f): f is Fit => f !== null);
  const active = parts.flatMap((f) => f.active), m = active.length, precision = new Float64Array(m * m);
  let offset = 0;
  for (const f of parts) {
    const k = f.active.length;
    for (let i = 0; i < k; i++) for (let j = 0; j <= i; j++) precision[(offset + i) * m + offset + j] = f.precision[i * k + j]!;
    offset += k;
  }
  return { logEvidence: parts.reduce((sum, f) => sum + f.logEvidence, 0), z: s.start, active, precision };
}

function normalise(list: Believed[]): Believed[] {
  list.sort((a, b) => b.logWeight - a.logWeight || (a.candidate.hypothesis.id < b.candidate.hypothesis.id ? -1 : 1));
  const best = list[0]!.logWeight;
  const kept = list.filter((b) => b.logWeight >= best - CUT);
  const total = kept.reduce((sum, b) => sum + Math.exp(b.logWeight - best), 0);
  for (const b of kept) b.p = Math.exp(b.logWeight - best) / total;
  return kept;
}
