import { CHECK_INDEX } from "../circuit/predict";
import { contradictions } from "../inference/contradiction";
import { DEFAULT_METER } from "../meter";
import type { Carrying, Reading, Setup } from "../types";
import { claimOf } from "./claim";
import { Court } from "./court";
import { believedOf, drain, leavingOut } from "./leaving-out";
import { countUpTo, setsOfSize } from "./sets";

/** Sets put to the court before the search for a smaller one is given up, those of them put before every candidate, and sets looked at at all. */
const MOST_TRIED = 100, MOST_FULL = 1, MOST_SEEN = 20_000;
/** Rounds of taking readings away on the rivals' word alone; after that every step is put before every candidate. */
const MOST_ROUNDS = 8;

/** Takes away one reading after another, the least needed first, until none can be spared. Places in the list of readings. */
function* irreducible(court: Court, leastNeeded: readonly number[]): Generator<void, readonly number[]> {
  for (let round = 0; ; round++) {
    const passes = round < MOST_ROUNDS ? (set: readonly number[]) => court.mayCarry(set) : (set: readonly number[]) => court.carries(set);
    const kept = yield* reduced(passes, leastNeeded);
    yield;
    if (kept.length === leastNeeded.length || court.carries(kept)) return kept;
  }
}

function* reduced(passes: (set: readonly number[]) => boolean, from: readonly number[]): Generator<void, readonly number[]> {
  let kept = from;
  for (let spared = true; spared;) {
    spared = false;
    for (const place of kept) {
      const rest = kept.filter((p) => p !== place);
      if (rest.length === 0) break;
      yield;
      if (passes(rest)) { kept = rest; spared = true; }
    }
  }
  return kept;
}

/**
 * Looks for a set smaller than `size` that carries, by size. A set inside one that is known not to carry is passed over when
 * `sparing`: fewer readings hardly ever tell what more do not. Returns null when there is none, "unknown" when it gave up.
 */
function* smaller(court: Court, readings: number, size: number, sparing: boolean): Generator<void, readonly number[] | null | "unknown"> {
  const most = court.full + MOST_FULL;
  let tried = 0, seen = 0;
  for (let members = 1; members < size; members++) {
    for (const set of setsOfSize(readings, members)) {
      if (++seen > MOST_SEEN || tried >= MOST_TRIED || court.full >= most) return "unknown";
      if (court.knows(set) ? !court.carries(set) : sparing && court.fellWithMore(set)) continue;
      if (!court.knows(set)) { tried++; yield; }
      if (court.carries(set)) return set;
    }
  }
  return null;
}

/** The smallest set found, and whether every smaller one was tried. */
function* smallest(court: Court, readings: number, kept: readonly number[]): Generator<void, { set: readonly number[]; all: boolean }> {
  const sparing = yield* smaller(court, readings, kept.length, true), set = sparing === null || sparing === "unknown" ? kept : sparing;
  if (countUpTo(readings, set.length - 1) > MOST_TRIED) return { set, all: false };
  const found = yield* smaller(court, readings, set.length, false);
  return { set: found === null || found === "unknown" ? set : found, all: found !== "unknown" };
}

/** The same as `carrying`, in steps of at most one belief each. */
export function* carryingSteps(setup: Setup, taken: readonly Reading[]): Generator<void, Carrying | null> {
  if (taken.length === 0) return null;
  const whole = believedOf(setup, taken), claim = claimOf(whole);
  if (!claim || contradictions(whole[0]!, taken, setup.meter ?? DEFAULT_METER).length > 0) return null;
  const left = yield* leavingOut(setup, taken);
  // In the order of the vocabulary, so that the order they were taken in does not matter.
  const order = taken.map((_, i) => i).sort((a, b) => CHECK_INDEX.get(taken[a]![0])! - CHECK_INDEX.get(taken[b]![0])!);
  const readings = order.map((i) => taken[i]!), without = order.map((i) => left.without[i]!);
  const court = new Court(setup, readings, claim, left.all, without), shares = without.map((b) => claim.shareIn(b));
  const kept = yield* irreducible(court, readings.map((_, i) => i).sort((a, b) => shares[b]! - shares[a]! || a - b));
  const { set, all } = yield* smallest(court, readings.length, kept);
  return { checks: [...set].sort((a, b) => a - b).map((i) => readings[i]![0]), smallest: all };
}

/**
 * The smallest set of readings that by itself leads to the same verdict: the same findings open, and the same kind and pins, as
 * sure as before where they were sure (95 %). All readings when none can be spared; null when there is no verdict to carry: no
 * reading, more than three findings open, or readings that contradict each other. Of several sets of that size, one of them.
 *
 * First readings are taken away one by one until none can be spared. Then smaller sets are tried by size, without those inside a
 * set that failed. `smallest` is only claimed when every smaller set, at most 100, was tried; else the set is irreducible.
 */
export function carrying(setup: Setup, readings: readonly Reading[]): Carrying | null {
  return drain(carryingSteps(setup, readings));
}
