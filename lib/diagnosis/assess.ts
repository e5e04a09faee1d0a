import { ALL_CHECKS } from "./checks";
import type { Candidate } from "./circuit/candidate";
import { CHECK_INDEX } from "./circuit/predict";
import { hinted } from "./hints";
import { candidatesDamp, candidatesForEntry, candidatesForUnknown, candidatesTapped } from "./inference/candidates";
import { rankChecks } from "./inference/choose";
import { contradictions, FAR, fitsBadly, misfits } from "./inference/contradiction";
import { observe, type Observation } from "./inference/observe";
import { believe, type Believed } from "./inference/posterior";
import { mergeBeliefs, slipRelief, strained } from "./inference/seldom";
import { weighSlips, type Weighed } from "./inference/slips";
import { marginals, type Marginals } from "./inference/standing";
import { DEFAULT_METER } from "./meter";
import { othersBeside } from "./others";
import { overLimitOf } from "./over-limit";
import type { PlannedTest } from "./planning";
import { ENTRY_IS_RIGHT } from "./priors";
import type { Assessment, MeterSpec, NextCheck, OtherChance, Reading, Setup } from "./types";
import { validate } from "./validate";
import { whyText } from "./words";
import { ln } from "./numerics";

/** Belief in a finding, a kind and pins at which the question counts as answered. */
const SETTLED = 0.985;
/** Bits per unit of effort below which a further check is not worth a technician's while. */
const WORTH_WHILE = 0.012;
const MOST_NEXT = 5;
/** Other devices less likely than this are left out. */
const LEAST_OTHER = 1e-6;
/** Readings up to which each is weighed as wrong: more of them hold one another up, and take longer. */
const MOST_WEIGHED = 16;

/**
 * Belief over everything that may be true of the machine, all readings taken as right, likeliest first. What is rare is
 * left out while the usual builds explain the readings well: a damp connector until a verdict is near, a tapped track altogether.
 */
export function beliefs(setup: Setup, readings: readonly Reading[]): Believed[] {
  return hinted(measuredBeliefs(setup, readings), readings);
}

/** The same by what was measured alone. */
function measuredBeliefs(setup: Setup, readings: readonly Reading[]): Believed[] {
  const meter = setup.meter ?? DEFAULT_METER, observations = observe(readings, meter), usual = usualBeliefs(setup, readings);
  const badly = explainsBadly(usual[0]!, observations, meter);
  if (!badly && !settled(marginals(usual))) return usual;
  return mergeBeliefs(usual, believe([...dampFor(setup), ...(badly ? tappedFor(setup) : [])], observations, meter));
}

const dampFor = ({ expect, experience }: Setup) => candidatesDamp({ expect, experience });
/** An entry speaks of no tap: where there is one, another device is fitted. */
const tappedFor = ({ expect, experience }: Setup) => (expect ? shifted(candidatesTapped(experience), 1 - ENTRY_IS_RIGHT) : candidatesTapped(experience));
const shifted = (list: readonly Candidate[], share: number) => list.map((c) => ({ ...c, logPrior: c.logPrior + ln(share) }));

const explainsBadly = (b: Believed, observations: readonly Observation[], meter: MeterSpec) => strained(b) || fitsBadly(b, observations, meter);

function usualBeliefs(setup: Setup, readings: readonly Reading[]): Believed[] {
  const meter = setup.meter ?? DEFAULT_METER, observations = observe(readings, meter);
  if (!setup.expect) return believe(candidatesForUnknown(setup.experience), observations, meter);
  const byEntry = believe(candidatesForEntry(setup.expect, setup.experience), observations, meter);
  if (!fitsBadly(byEntry[0]!, observations, meter)) return byEntry;
  // The entry cannot explain the readings: another device may be fitted, or its pins may differ.
  return believe([...shifted(candidatesForEntry(setup.expect, setup.experience), ENTRY_IS_RIGHT), ...shifted(candidatesForUnknown(setup.experience), 1 - ENTRY_IS_RIGHT)], observations, meter);
}

/** The belief, with the chance that one reading is wrong counted in where it matters: before a verdict, and where something does not fit. */
function weighed(setup: Setup, readings: readonly Reading[]): Weighed {
  const meter = setup.meter ?? DEFAULT_METER, observations = observe(readings, meter), believed = measuredBeliefs(setup, readings);
  const far = misfits(believed[0]!, observations, meter), odd = far.some((f) => f > FAR);
  if (observations.length < 2 || observations.length > MOST_WEIGHED || !(odd || settled(marginals(believed)))) return { believed, slips: observations.map(() => 0) };
  const everything = [...(setup.expect ? candidatesForEntry(setup.expect, setup.experience) : candidatesForUnknown(setup.experience)), ...rareLike(believed[0]!, setup)];
  // Every device there is takes a while to look through: that is done without the reading that fits worst. Without any other, the device stands as identified.
  const worst = odd ? far.indexOf(Math.max(...far)) : -1, { family, pinOf } = believed[0]!.candidate;
  const likely = everything.filter((c) => c.family === family && `${c.pinOf}` === `${pinOf}`);
  return weighSlips((i) => (i === worst || likely.length === 0 ? everything : likely), observations, meter, believed);
}

/** What is rare takes part where it is what the readings speak for. */
function rareLike({ candidate }: Believed, setup: Setup): readonly Candidate[] {
  return candidate.code === "connector-damp" ? dampFor(setup) : candidate.tap ? tappedFor(setup) : [];
}

/**
 * What the readings taken so far say of the device and its wiring, and which to take next.
 * Readings in any order give the same belief; the proposed next check also depends on the state that the
 * last one left the machine in. Method: Bayes' rule over circuit models whose unknowns are integrated over
 * jointly; next check by expected information per effort with look-ahead.
 */
export function assess(setup: Setup, readings: readonly Reading[]): Assessment {
  const problem = validate(setup, readings);
  if (problem) return { state: "invalid-input", ...problem };
  const meter = setup.meter ?? DEFAULT_METER, { believed, slips } = weighed(setup, readings), overLimit = overLimitOf(readings);
  const ranked = overLimit ? [] : rankChecks(setup, readings, believed, meter), worth = ranked.filter((r) => r.gainBits / r.effort >= WORTH_WHILE);
  const others = othersFor(setup, readings, believed, worth.length === 0), m = besideOthers(marginals(hinted(believed, readings)), others);
  // What was only looked at is no ground to end a check.
  const done = worth.length === 0 || settled(besideOthers(marginals(believed), others)) || others.some(({ p }) => p >= SETTLED);
  const standing = {
    ...m, others, overLimit, done, inseparable: done && m.openFindings.length > 1 && worth.length === 0,
    next: ranked.slice(0, MOST_NEXT).map((r) => nextCheck(r, setup)),
  };
  const suspects = otherwise(others) ? [] : contradictions(believed[0]!, readings, meter, slips);
  if (suspects.length > 0) return { state: "contradictory", suspects, ...standing };
  return { state: readings.length === 0 ? "needs-reading" : "ranked", ...standing };
}

/**
 * Devices that are none of the three kinds, beside what is believed of the three: looked at before a verdict (`last`: no reading is worth
 * taking), and where the three do not explain the readings well. One reading says nothing of them.
 */
function othersFor(setup: Setup, readings: readonly Reading[], believed: readonly Believed[], last: boolean): readonly OtherChance[] {
  const best = believed[0]!, meter = setup.meter ?? DEFAULT_METER, observations = observe(readings, meter);
  if (observations.length < 2 || !(last || settled(marginals(believed)) || explainsBadly(best, observations, meter))) return [];
  // With so many readings none was weighed as wrong: the one that fits worst may cost the three kinds no more than a slip does.
  const relief = observations.length > MOST_WEIGHED ? slipRelief(misfits(best, observations, meter)) : 0;
  return othersBeside(best.logWeight - ln(best.p) + relief, observations, setup.expect ? 1 - ENTRY_IS_RIGHT : 1).filter(({ p }) => p >= LEAST_OTHER);
}

const sumOf = (others: readonly OtherChance[]) => others.reduce((sum, { p }) => sum + p, 0);
/** Whether the readings speak for something that is none of the three kinds. */
const otherwise = (others: readonly OtherChance[]) => sumOf(others) > 0.5;

function besideOthers(m: Marginals, others: readonly OtherChance[]): Marginals {
  const left = 1 - sumOf(others);
  return { ...m, kinds: m.kinds.map(({ kind, p }) => ({ kind, p: p * left })) };
}

function settled(m: Marginals): boolean {
  return m.faults[0]!.p >= SETTLED && m.kinds[0]!.p >= SETTLED && m.pins[0]!.p >= SETTLED;
}

function nextCheck(r: PlannedTest, setup: Setup): NextCheck {
  return { check: r.test, why: whyText(ALL_CHECKS[CHECK_INDEX.get(r.test)!]!, setup.pins), gainBits: r.gainBits, effort: r.effort };
}
