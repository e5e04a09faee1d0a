import { beliefs } from "../assess";
import { parseCheck } from "../checks";
import { faultId, type Candidate } from "../circuit/candidate";
import { PARAMETER_COUNT } from "../circuit/parameters";
import { CHECK_INDEX } from "../circuit/predict";
import { candidatesForEntry, candidatesForUnknown } from "../inference/candidates";
import { evidenceOf, fitCandidate } from "../inference/fit";
import { observe } from "../inference/observe";
import { outlookOf } from "../inference/outlook";
import { believe, type Believed } from "../inference/posterior";
import { DEFAULT_METER, meterLimit } from "../meter";
import type { EvidenceRow, Fault, Prediction, Reading, Setup } from "../types";
import { factorOf } from "./effects";
import { drain, leavingOut } from "./leaving-out";
import { predictionOf } from "./prediction";

const START = new Float64Array(PARAMETER_COUNT);
/** From this chance on a finding is shown as the kind and pins that make it likeliest; below it, as the verdict's own. */
const POSSIBLE = 0.01;

const having = (id: string) => (c: Candidate) => faultId(c.hypothesis.fault) === id;

/** Chance of a finding, 0..1. */
function chanceOf(believed: readonly Believed[], id: string): number {
  return believed.reduce((sum, b) => (faultId(b.candidate.hypothesis.fault) === id ? sum + b.p : sum), 0);
}

/**
 * The candidate that stands for a finding: while it is possible, its likeliest build; else, of the likeliest kind and
 * pins that can have it, the build that fits best. Null when this device cannot have it.
 */
function standIn(setup: Setup, readings: readonly Reading[], all: readonly Believed[], fault: Fault): Candidate | null {
  const meter = setup.meter ?? DEFAULT_METER, top = all[0]!.candidate, has = having(faultId(fault));
  const likeliest = all.find((b) => has(b.candidate));
  if (likeliest && chanceOf(all, faultId(fault)) >= POSSIBLE) return likeliest.candidate;
  const alike = (c: Candidate) => c.hypothesis.kind === top.hypothesis.kind && `${c.pinOf}` === `${top.pinOf}`;
  const byEntry = setup.expect ? candidatesForEntry(setup.expect, setup.experience).filter(has).filter(alike) : [];
  const any = byEntry.length > 0 ? [] : candidatesForUnknown(setup.experience).filter(has), near = any.filter(alike);
  const list = byEntry.length > 0 ? byEntry : near.length > 0 ? near : any;
  return list.length === 0 ? null : believe(list, observe(readings, meter), meter)[0]!.candidate;
}

/** What a candidate, fitted to these readings, expects of a check. */
function expectedOf(candidate: Candidate, setup: Setup, readings: readonly Reading[], check: string): Prediction {
  const meter = setup.meter ?? DEFAULT_METER, fit = fitCandidate(candidate, evidenceOf(observe(readings, meter), meter), START);
  return predictionOf([{ p: 1, outlook: outlookOf({ candidate, fit, logWeight: fit.logEvidence, p: 1 }, meter) }], CHECK_INDEX.get(check)!);
}

/**
 * What a check should read if a finding were true, given the other readings (that check's own reading left out).
 * Returns null for an unknown check or a finding that this device cannot have.
 */
export function predict(setup: Setup, readings: readonly Reading[], fault: Fault, check: string): Prediction | null {
  const candidate = parseCheck(check) && standIn(setup, readings, beliefs(setup, readings), fault);
  return candidate ? expectedOf(candidate, setup, readings.filter(([c]) => c !== check), check) : null;
}

/** Signed distance of a reading from the middle expected, in limits of error; null where either is a word, or the meter has no limit there. */
function distance(value: Reading[1], expected: Prediction, limit: number | null): number | null {
  return typeof value === "number" && expected.number && limit !== null && limit > 0 ? (value - expected.number.middle) / limit : null;
}

/** The same as `evidence`, in steps of at most one belief each. */
export function* evidenceSteps(setup: Setup, readings: readonly Reading[], fault: Fault): Generator<void, EvidenceRow[]> {
  const { all, without } = yield* leavingOut(setup, readings), meter = setup.meter ?? DEFAULT_METER, id = faultId(fault);
  const sound = standIn(setup, readings, all, { code: "none" }), found = standIn(setup, readings, all, fault), chance = chanceOf(all, id);
  if (!sound || !found) return [];
  return readings.map(([check, value], i) => {
    const others = readings.filter((_, k) => k !== i);
    const ifSound = expectedOf(sound, setup, others, check), ifFinding = found === sound ? ifSound : expectedOf(found, setup, others, check);
    const limit = typeof value === "number" ? meterLimit(parseCheck(check)!, value, meter) : null, left = chanceOf(without[i]!, id);
    return {
      check, value, ifSound, ifFinding, limit, offLimits: distance(value, ifFinding, limit), offIfSound: distance(value, ifSound, limit),
      factor: factorOf(chance, left), without: Math.min(1, left),
    };
  });
}

/**
 * The evidence for and against one finding: each reading beside what it should have been if all were sound and if the finding
 * is true (the other readings given), how far off it is in limits of error (JCGM 100:2008 4.3.7 half-widths), and by how
 * much it moved the chance of the finding. Empty when this device cannot have the finding.
 */
export function evidence(setup: Setup, readings: readonly Reading[], fault: Fault): EvidenceRow[] {
  return drain(evidenceSteps(setup, readings, fault));
}
