import { beliefs } from "../assess";
import type { Candidate } from "../circuit/candidate";
import { candidatesForEntry, candidatesForUnknown } from "../inference/candidates";
import { observe } from "../inference/observe";
import { believe, type Believed } from "../inference/posterior";
import { DEFAULT_METER } from "../meter";
import type { Reading, Setup } from "../types";
import { holds, type Claim } from "./claim";

/** The likeliest so many candidates against the claim, of a set put before every candidate, are kept as rivals for the sets to come. */
const RIVALS_A_SET = 12;
/** Fits stop a little short of their end when they are hopeless: this near the mark the rivals alone decide nothing. */
const MARGIN = 0.01;

/**
 * Decides which sets of readings carry a claim; sets are places in the list of readings. Most sets do not, and a few rivals are
 * enough to see that: the claim's share among its own candidates and some rivals is an upper bound of its share among all.
 * Only sets that pass are put before every candidate, and those name new rivals.
 */
export class Court {
  /** Sets put before every candidate so far. */
  full = 0;
  private readonly rulings = new Map<string, boolean>();
  private readonly failed: ReadonlySet<number>[] = [];
  private readonly rivals = new Set<Candidate>();
  private readonly own: readonly Candidate[];

  constructor(private readonly setup: Setup, private readonly readings: readonly Reading[], private readonly claim: Claim, all: readonly Believed[], without: readonly (readonly Believed[])[]) {
    const list = setup.expect ? candidatesForEntry(setup.expect, setup.experience) : candidatesForUnknown(setup.experience);
    // Where another device than the entry's may be fitted the candidates differ from set to set, and so no bound is to be had.
    this.own = list.includes(all[0]!.candidate) ? list.filter((c) => claim.includes(c)) : [];
    const places = readings.map((_, i) => i);
    without.forEach((believed, left) => this.rule(places.filter((i) => i !== left), holds(claim, believed), believed));
  }

  /** Has this set been ruled on? */
  knows(set: readonly number[]): boolean {
    return this.rulings.has(nameOf(set));
  }

  /** Is this set inside one that does not carry? */
  fellWithMore(set: readonly number[]): boolean {
    return this.failed.some((larger) => set.every((i) => larger.has(i)));
  }

  /** False: the set does not carry. True: nothing known so far speaks against it. Quick. */
  mayCarry(set: readonly number[]): boolean {
    const known = this.rulings.get(nameOf(set));
    if (known !== undefined) return known;
    if (this.own.length === 0) return this.carries(set);
    return this.share(this.of(set)) >= this.claim.leastShare - MARGIN || this.rule(set, false, []);
  }

  /** Does the set carry? As slow as a belief over everything, unless the rivals known so far decide it. */
  carries(set: readonly number[]): boolean {
    const known = this.rulings.get(nameOf(set));
    if (known !== undefined) return known;
    if (this.own.length > 0 && !this.mayCarry(set)) return false;
    this.full++;
    const believed = beliefs(this.setup, this.of(set));
    return this.rule(set, holds(this.claim, believed), believed);
  }

  private of(set: readonly number[]): readonly Reading[] {
    return this.readings.filter((_, i) => set.includes(i));
  }

  private rule(set: readonly number[], carried: boolean, believed: readonly Believed[]): boolean {
    this.rulings.set(nameOf(set), carried);
    if (!carried) this.failed.push(new Set(set));
    for (const b of believed.filter((one) => !this.claim.includes(one.candidate)).slice(0, RIVALS_A_SET)) this.rivals.add(b.candidate);
    return carried;
  }

  /** The claim's share among its own candidates and the rivals known so far, 0..1. */
  private share(readings: readonly Reading[]): number {
    const meter = this.setup.meter ?? DEFAULT_METER;
    return this.claim.shareIn(believe([...this.own, ...this.rivals], observe(readings, meter), meter));
  }
}

const nameOf = (set: readonly number[]) => [...set].sort((a, b) => a - b).join(" ");
