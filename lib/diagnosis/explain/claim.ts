import { faultId, type Candidate } from "../circuit/candidate";
import type { Believed } from "../inference/posterior";
import { marginals, type Marginals } from "../inference/standing";

/** From this chance on a kind or the pins are part of what a verdict states; the same share that the open findings hold. */
const SURE = 0.95;
/** More open findings than this are not a verdict. */
const MOST_OPEN = 3;

/** What a verdict states, for other sets of readings to be held against. */
export interface Claim {
  readonly findings: string;
  readonly kind: string;
  readonly pins: string;
  readonly kindSure: boolean;
  readonly pinsSure: boolean;
  /** Least share of the belief, 0..1, that the claim's candidates hold together where the claim holds. */
  readonly leastShare: number;
  includes(c: Candidate): boolean;
  /** Share of the belief that the claim's candidates hold, 0..1. */
  shareIn(believed: readonly Believed[]): number;
}

const openOf = (m: Marginals) => m.openFindings.map(faultId).sort().join(" ");
const pinsOf = (m: Marginals) => `${m.pins[0]!.supply}-${m.pins[0]!.ground}-${m.pins[0]!.signal}`;

/** The claim that a belief makes: the findings that hold 95 % and, where they do so too, kind and pins. Null when too much is open. */
export function claimOf(believed: readonly Believed[]): Claim | null {
  const m = marginals(believed);
  if (m.openFindings.length > MOST_OPEN) return null;
  const open = new Set(m.openFindings.map(faultId)), kind = m.kinds[0]!.kind, pins = pinsOf(m);
  const kindSure = m.kinds[0]!.p >= SURE, pinsSure = m.pins[0]!.p >= SURE;
  const includes = ({ hypothesis: h, pinOf }: Candidate) => open.has(faultId(h.fault)) && (!kindSure || h.kind === kind) && (!pinsSure || pinOf.join("-") === pins);
  // Each part may miss SURE by as much without the others having to: together they can miss it by the sum.
  const leastShare = 1 - (1 - SURE) * (1 + Number(kindSure) + Number(pinsSure));
  const shareIn = (list: readonly Believed[]) => list.reduce((sum, b) => (includes(b.candidate) ? sum + b.p : sum), 0);
  return { findings: openOf(m), kind, pins, kindSure, pinsSure, leastShare, includes, shareIn };
}

/** Does a belief make the same claim, as surely? */
export function holds(claim: Claim, believed: readonly Believed[]): boolean {
  const m = marginals(believed);
  return openOf(m) === claim.findings && m.kinds[0]!.kind === claim.kind && pinsOf(m) === claim.pins
    && (!claim.kindSure || m.kinds[0]!.p >= SURE) && (!claim.pinsSure || m.pins[0]!.p >= SURE);
}
