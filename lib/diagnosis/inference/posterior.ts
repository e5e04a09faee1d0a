import type { Candidate } from "../circuit/candidate";
import { PARAMETER_COUNT } from "../circuit/parameters";
import { GROUP } from "../circuit/predict";
import type { MeterSpec } from "../types";
import { fitCandidate, type Fit } from "./fit";
import { evidenceOf, type Evidence } from "./misfit";
import type { Observation } from "./observe";
import { exp } from "../numerics";

/** A candidate with its fit and its share of the belief. */
export interface Believed { readonly candidate: Candidate; readonly fit: Fit; readonly logWeight: number; p: number }

/** Candidates this far (in natural-log units) behind the best are left out: less than one in twenty thousand. */
const CUT = 10;
const HARNESS = GROUP.cold | GROUP.live | GROUP.wires;
const ZERO = new Float64Array(PARAMETER_COUNT);
const NO_FIT: Fit = { logEvidence: 0, z: ZERO, active: [], precision: new Float64Array(0) };

/** The readings by the part of the machine they speak of, and the most that each part could add to a fit. */
interface Parts { readonly device: Evidence; readonly harness: Evidence; readonly all: Evidence; readonly harnessPeak: number; readonly matedPeak: number; readonly joint: boolean }

const peakOf = (obs: readonly Observation[]) => obs.reduce((sum, o) => sum + (o.word === null ? o.logPeak : 0), 0);

function partsOf(obs: readonly Observation[], meter: MeterSpec): Parts {
  const harness = obs.filter((o) => o.group & HARNESS), mated = obs.filter((o) => o.group === GROUP.mated);
  return {
    device: evidenceOf(obs.filter((o) => o.group === GROUP.device), meter), harness: evidenceOf(harness, meter), all: evidenceOf(obs, meter),
    harnessPeak: peakOf(harness), matedPeak: peakOf(mated), joint: mated.length > 0,
  };
}

/** Candidates whose device, seen alone, is the same: one fit of the device readings serves them all. */
interface Block { readonly device: Fit; readonly members: readonly Candidate[]; readonly bound: number }

/**
 * Belief over all candidates. Device readings and harness readings have no unknown in common, so each is
 * fitted apart and shared by all candidates that agree there; their sum, with the best that the mated
 * readings could add, bounds a candidate from above. Only those whose bound can still matter are fitted to
 * everything jointly, best bound first.
 */
export function believe(candidates: readonly Candidate[], obs: readonly Observation[], meter: MeterSpec): Believed[] {
  const parts = partsOf(obs, meter), harnessFits: HarnessFits = new Map(), out: Believed[] = [];
  let best = -Infinity;
  for (const block of blocksOf(candidates, parts)) {
    if (block.bound < best - CUT) break;
    for (const b of blockBelief(block, parts, harnessFits, best)) { best = Math.max(best, b.logWeight); out.push(b); }
  }
  return normalise(out);
}

function blocksOf(candidates: readonly Candidate[], parts: Parts): Block[] {
  const byKey = new Map<string, Candidate[]>();
  for (const c of candidates) {
    const list = byKey.get(c.deviceKey);
    if (list) list.push(c); else byKey.set(c.deviceKey, [c]);
  }
  const blocks = [...byKey.values()].map((members) => {
    const device = parts.device.observations.length === 0 ? NO_FIT : fitCandidate(members[0]!, parts.device, ZERO);
    const prior = members.reduce((most, c) => Math.max(most, c.logPrior), -Infinity);
    return { device, members, bound: prior + device.logEvidence + parts.harnessPeak + parts.matedPeak };
  });
  return blocks.sort((a, b) => b.bound - a.bound || byId(a.members[0]!, b.members[0]!));
}

function blockBelief(block: Block, parts: Parts, harnessFits: HarnessFits, toBeat: number): Believed[] {
  const scored = block.members.map((candidate) => {
    const apart = candidate.logPrior + block.device.logEvidence + parts.matedPeak;
    const harness = harnessFit(harnessFits, candidate, parts.harness, toBeat - CUT - apart);
    return { candidate, harness, bound: apart + harness.logEvidence };
  }).sort((a, b) => b.bound - a.bound || byId(a.candidate, b.candidate));
  const out: Believed[] = [];
  let best = toBeat;
  for (const { candidate, harness, bound } of scored) {
    if (bound < best - CUT) break;
    const fit = parts.joint ? fitCandidate(candidate, parts.all, startOf(block.device, harness), best - CUT - candidate.logPrior) : together(block.device, harness);
    const logWeight = candidate.logPrior + fit.logEvidence;
    best = Math.max(best, logWeight);
    out.push({ candidate, fit, logWeight, p: 0 });
  }
  return out;
}

/** Fits of the harness readings by what they hang on, each with the evidence it was asked to reach. */
type HarnessFits = Map<string, { readonly fit: Fit; readonly least: number }>;

function harnessFit(cache: HarnessFits, c: Candidate, evidence: Evidence, least: number): Fit {
  if (evidence.observations.length === 0) return NO_FIT;
  let known = cache.get(c.harnessKey);
  if (!known || (known.fit.logEvidence === -Infinity && least < known.least)) cache.set(c.harnessKey, known = { fit: fitCandidate(c, evidence, ZERO, least), least });
  return known.fit;
}

const byId = (a: Candidate, b: Candidate) => (a.hypothesis.id < b.hypothesis.id ? -1 : 1);

function startOf(...fits: readonly Fit[]): Float64Array {
  const z = new Float64Array(PARAMETER_COUNT);
  for (const fit of fits) for (const p of fit.active) z[p] = fit.z[p]!;
  return z;
}

/** One fit out of two that were made apart: their unknowns do not overlap, so the precision is block-diagonal. */
function together(...fits: readonly Fit[]): Fit {
  const active = fits.flatMap((f) => f.active), m = active.length, precision = new Float64Array(m * m);
  let offset = 0;
  for (const f of fits) {
    const k = f.active.length;
    for (let i = 0; i < k; i++) for (let j = 0; j <= i; j++) precision[(offset + i) * m + offset + j] = f.precision[i * k + j]!;
    offset += k;
  }
  return { logEvidence: fits.reduce((sum, f) => sum + f.logEvidence, 0), z: startOf(...fits), active, precision };
}

function normalise(list: Believed[]): Believed[] {
  list.sort((a, b) => b.logWeight - a.logWeight || byId(a.candidate, b.candidate));
  const best = list[0]!.logWeight;
  const kept = list.filter((b) => b.logWeight >= best - CUT);
  const total = kept.reduce((sum, b) => sum + exp(b.logWeight - best), 0);
  for (const b of kept) b.p = exp(b.logWeight - best) / total;
  return kept;
}
