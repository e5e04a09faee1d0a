import { ALL_CHECKS } from "./checks";
import { CHECK_INDEX } from "./circuit/predict";
import { candidatesForDoubtedEntry, candidatesForEntry, candidatesForUnknown } from "./inference/candidates";
import { rankChecks } from "./inference/choose";
import { contradictions, FAR, fitsBadly, misfits } from "./inference/contradiction";
import { observe, type Observation } from "./inference/observe";
import { PartFits } from "./inference/part-fits";
import { believeWith, type Believed } from "./inference/posterior";
import { weighSlips, type Weighed } from "./inference/slips";
import { marginals, type Marginals } from "./inference/standing";
import { DEFAULT_METER } from "./meter";
import type { PlannedTest } from "./planning";
import type { Assessment, NextCheck, Reading, Setup } from "./types";
import { validate } from "./validate";
import { whyText } from "./words";

/** Belief in a finding, a kind and pins at which the question counts as answered. */
const SETTLED = 0.985;
/** Bits per unit of effort below which a further check is not worth a technician's while. */
const WORTH_WHILE = 0.012;
const MOST_NEXT = 5;
/** Readings up to which each is weighed as wrong: more of them hold one another up, and take longer. */
const MOST_WEIGHED = 16;

/** Belief over everything that may be true of the machine, all readings taken as right, likeliest first. */
export function beliefs(setup: Setup, readings: readonly Reading[]): Believed[] {
  const meter = setup.meter ?? DEFAULT_METER, observations = observe(readings, meter);
  return believedFrom(setup, observations, new PartFits(observations, meter));
}

function believedFrom(setup: Setup, observations: readonly Observation[], fits: PartFits): Believed[] {
  if (!setup.expect) return believeWith(fits, candidatesForUnknown(setup.experience));
  const byEntry = believeWith(fits, candidatesForEntry(setup.expect, setup.experience));
  if (!fitsBadly(byEntry[0]!, observations, fits.meter)) return byEntry;
  // The entry cannot explain the readings: another device may be fitted, or its pins may differ.
  return believeWith(fits, candidatesForDoubtedEntry(setup.expect, setup.experience));
}

/** What is to be said and asked, with the chance counted in that one reading is wrong. */
interface Judgement { readonly weighed: Weighed; readonly ranked: readonly PlannedTest[]; readonly answered: boolean }

/** The readings taken as right as long as the question is open; before a verdict, and where something does not fit, each in turn is weighed as wrong. */
function judge(setup: Setup, readings: readonly Reading[]): Judgement {
  const meter = setup.meter ?? DEFAULT_METER, observations = observe(readings, meter), fits = new PartFits(observations, meter);
  const believed = believedFrom(setup, observations, fits), plain = marginals(believed);
  const odd = misfits(believed[0]!, observations, meter).some((f) => f > FAR);
  const ranked = odd ? [] : rankChecks(setup, readings, believed, meter), closing = odd || plain.faults[0]!.p >= SETTLED || !ranked.some(worthWhile);
  if (readings.length === 0 || readings.length > MOST_WEIGHED || !closing) {
    return { weighed: { believed, wary: believed, slips: observations.map(() => 0) }, ranked: odd ? rankChecks(setup, readings, believed, meter) : ranked, answered: settled(plain) };
  }
  const everything = setup.expect ? candidatesForEntry(setup.expect, setup.experience) : candidatesForUnknown(setup.experience);
  const weighed = weighSlips(everything, fits, observations, meter, believed);
  return { weighed, ranked: rankChecks(setup, readings, weighed.wary, meter), answered: settled(marginals(weighed.believed)) && settled(marginals(weighed.wary)) };
}

const worthWhile = (r: PlannedTest) => r.gainBits / r.effort >= WORTH_WHILE;

/**
 * What the readings taken so far say of the device and its wiring, and which to take next.
 * Readings in any order give the same belief; the proposed next check also depends on the state that the
 * last one left the machine in. Method: Bayes' rule over circuit models whose unknowns are integrated over
 * jointly; next check by expected information per effort with look-ahead.
 */
export function assess(setup: Setup, readings: readonly Reading[]): Assessment {
  const problem = validate(setup, readings);
  if (problem) return { state: "invalid-input", ...problem };
  const { weighed: { believed, slips }, ranked, answered } = judge(setup, readings), m = marginals(believed);
  const worth = ranked.some(worthWhile), done = answered || !worth;
  const standing = {
    ...m, done, inseparable: done && m.openFindings.length > 1 && !worth,
    next: ranked.slice(0, MOST_NEXT).map((r) => nextCheck(r, setup)),
  };
  const suspects = contradictions(believed[0]!, readings, setup.meter ?? DEFAULT_METER, slips);
  if (suspects.length > 0) return { state: "contradictory", suspects, ...standing };
  return { state: readings.length === 0 ? "needs-reading" : "ranked", ...standing };
}

function settled(m: Marginals): boolean {
  return m.faults[0]!.p >= SETTLED && m.kinds[0]!.p >= SETTLED && m.pins[0]!.p >= SETTLED;
}

function nextCheck(r: PlannedTest, setup: Setup): NextCheck {
  return { check: r.test, why: whyText(ALL_CHECKS[CHECK_INDEX.get(r.test)!]!, setup.pins), gainBits: r.gainBits, effort: r.effort };
}
