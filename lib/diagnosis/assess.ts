import { ALL_CHECKS } from "./checks";
import { CHECK_INDEX } from "./circuit/predict";
import { hinted } from "./hints";
import { candidatesDamp, candidatesForDoubtedEntry, candidatesForEntry, candidatesForUnknown, candidatesTapped } from "./inference/candidates";
import { rankChecks } from "./inference/choose";
import { contradictions, FAR, fitsBadly, misfits } from "./inference/contradiction";
import { observe, type Observation } from "./inference/observe";
import { PartFits } from "./inference/part-fits";
import { believeWith, type Believed } from "./inference/posterior";
import { mergeBeliefs, slipRelief, strained } from "./inference/seldom";
import { weighSlips, type Weighed } from "./inference/slips";
import { marginals, type Marginals } from "./inference/standing";
import { DEFAULT_METER } from "./meter";
import { othersBeside } from "./others";
import { overLimitOf } from "./over-limit";
import type { PlannedTest } from "./planning";
import { ENTRY_IS_RIGHT } from "./priors";
import type { Assessment, NextCheck, OtherChance, Reading, Setup } from "./types";
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
  const meter = setup.meter ?? DEFAULT_METER;
  return hinted(measured(setup, new PartFits(observe(readings, meter), meter)), readings);
}

/** The same by what was measured alone. */
function measured(setup: Setup, fits: PartFits): Believed[] {
  const usual = usualBeliefs(setup, fits), badly = explainsBadly(usual[0]!, fits.observations, fits.meter);
  if (!badly && !settled(marginals(usual))) return usual;
  return mergeBeliefs(usual, believeWith(fits, badly ? [...candidatesDamp(setup), ...candidatesTapped(setup)] : candidatesDamp(setup)));
}

const explainsBadly = (b: Believed, observations: readonly Observation[], meter: PartFits["meter"]) => strained(b) || fitsBadly(b, observations, meter);

function usualBeliefs({ expect, experience }: Setup, fits: PartFits): Believed[] {
  if (!expect) return believeWith(fits, candidatesForUnknown(experience));
  const byEntry = believeWith(fits, candidatesForEntry(expect, experience));
  if (!fitsBadly(byEntry[0]!, fits.observations, fits.meter)) return byEntry;
  // The entry cannot explain the readings: another device may be fitted, or its pins may differ.
  return believeWith(fits, candidatesForDoubtedEntry(expect, experience));
}

/** What is to be said and asked, with the chance counted in that one reading is wrong. */
interface Judgement { readonly weighed: Weighed; readonly ranked: readonly PlannedTest[] }

/** The readings taken as right as long as the question is open; before a verdict, and where something does not fit, each in turn is weighed as wrong. */
function judge(setup: Setup, readings: readonly Reading[], fits: PartFits): Judgement {
  const { observations, meter } = fits, believed = measured(setup, fits), plain = { believed, wary: believed, slips: observations.map(() => 0) };
  const odd = misfits(believed[0]!, observations, meter).some((f) => f > FAR), weighable = observations.length > 0 && observations.length <= MOST_WEIGHED;
  const closing = odd || marginals(believed).faults[0]!.p >= SETTLED, ranked = weighable && closing ? null : rankChecks(setup, readings, believed, meter);
  if (ranked && (!weighable || ranked.some(worthWhile))) return { weighed: plain, ranked };
  const weighed = weighSlips(poolFor(setup, believed[0]!), fits, believed);
  return { weighed, ranked: rankChecks(setup, readings, weighed.wary, meter) };
}

const worthWhile = (r: PlannedTest) => r.gainBits / r.effort >= WORTH_WHILE;

/** What is looked through when a reading is weighed as wrong. What is rare takes part where it is what the readings speak for. */
function poolFor(setup: Setup, { candidate }: Believed) {
  const usual = setup.expect ? candidatesForEntry(setup.expect, setup.experience) : candidatesForUnknown(setup.experience);
  const rare = candidate.code === "connector-damp" ? candidatesDamp(setup) : candidate.tap ? candidatesTapped(setup) : [];
  return rare.length > 0 ? [...usual, ...rare] : usual;
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
  const meter = setup.meter ?? DEFAULT_METER, fits = new PartFits(observe(readings, meter), meter), overLimit = overLimitOf(readings);
  const judged = judge(setup, readings, fits), { believed, wary, slips } = judged.weighed, ranked = overLimit ? [] : judged.ranked, worth = ranked.some(worthWhile);
  const others = othersFor(setup, fits, believed), m = besideOthers(marginals(hinted(believed, readings)), others);
  // What was only looked at is no ground to end a check.
  const answered = [believed, wary].every((list) => settled(besideOthers(marginals(list), others)));
  const done = !worth || answered || others.some(({ p }) => p >= SETTLED);
  const standing = {
    ...m, others, overLimit, done, inseparable: done && m.openFindings.length > 1 && !worth,
    next: ranked.slice(0, MOST_NEXT).map((r) => nextCheck(r, setup)),
  };
  const suspects = otherwise(others) ? [] : contradictions(believed[0]!, readings, meter, slips);
  if (suspects.length > 0) return { state: "contradictory", suspects, ...standing };
  return { state: readings.length === 0 ? "needs-reading" : "ranked", ...standing };
}

/** Devices that are none of the three kinds, beside what is believed of the three. One reading says nothing of them. */
function othersFor(setup: Setup, { observations, meter }: PartFits, believed: readonly Believed[]): readonly OtherChance[] {
  const best = believed[0]!;
  if (observations.length < 2) return [];
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
