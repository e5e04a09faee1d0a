import { faultId } from "../circuit/candidate";
import type { FaultChance, HypothesisChance, KindChance, PinsChance } from "../types";
import { KINDS } from "../types";
import type { Believed } from "./posterior";

/** Share of belief that the open findings hold together. */
const OPEN_SHARE = 0.95;

export interface Marginals {
  readonly kinds: readonly KindChance[];
  readonly pins: readonly PinsChance[];
  readonly faults: readonly FaultChance[];
  readonly hypotheses: readonly HypothesisChance[];
  readonly openFindings: readonly FaultChance[];
}

/** Sums belief by a key, likeliest first; equal chances in the order of the key. */
function sumBy<T>(believed: readonly Believed[], key: (b: Believed) => string, make: (b: Believed, p: number) => T): T[] {
  const sums = new Map<string, { first: Believed; p: number }>();
  for (const b of believed) {
    const seen = sums.get(key(b));
    if (seen) seen.p += b.p; else sums.set(key(b), { first: b, p: b.p });
  }
  return [...sums].sort((a, b) => b[1].p - a[1].p || (a[0] < b[0] ? -1 : 1)).map(([, { first, p }]) => make(first, Math.min(1, p)));
}

/** Belief in kinds, pins, findings and whole hypotheses. Every kind is listed, also where nothing is left of it. */
export function marginals(believed: readonly Believed[]): Marginals {
  const kinds = sumBy(believed, (b) => b.candidate.hypothesis.kind, (b, p): KindChance => ({ kind: b.candidate.hypothesis.kind, p }));
  for (const kind of KINDS) if (!kinds.some((k) => k.kind === kind)) kinds.push({ kind, p: 0 });
  const faults = sumBy(believed, (b) => faultId(b.candidate.hypothesis.fault), (b, p): FaultChance => ({ ...b.candidate.hypothesis.fault, p }));
  return {
    kinds, faults, openFindings: smallestSet(faults),
    pins: sumBy(believed, (b) => b.candidate.pinOf.join("-"), (b, p): PinsChance => ({ ...b.candidate.hypothesis.pins, p })),
    hypotheses: sumBy(believed, (b) => b.candidate.hypothesis.id, (b, p): HypothesisChance => ({ hypothesis: b.candidate.hypothesis, p })),
  };
}

function smallestSet(faults: readonly FaultChance[]): FaultChance[] {
  const set: FaultChance[] = [];
  let sum = 0;
  for (const f of faults) {
    set.push(f);
    sum += f.p;
    if (sum >= OPEN_SHARE) break;
  }
  return set;
}
