import { parseCheck } from "../checks";
import { faultId, type Candidate } from "../circuit/candidate";
import { CHECK_INDEX } from "../circuit/predict";
import { everyCandidateForEntry, everyCandidateForUnknown } from "../inference/candidates";
import { isHint } from "../hints";
import { contradictions } from "../inference/contradiction";
import { observe } from "../inference/observe";
import { outlookOf } from "../inference/outlook";
import { believe, type Believed } from "../inference/posterior";
import { DEFAULT_METER, meterLimit } from "../meter";
import type { EvidenceRow, Fault, Prediction, Reading, Setup } from "../types";
import { factorOf } from "./effects";
import { believedOf, drain, leavingOut, type LeavingOut } from "./leaving-out";
import { predictionOf, type Piece } from "./prediction";

/** From this chance on a finding is shown as the kind and pins that make it likeliest; below it, as the verdict's own. */
const POSSIBLE = 0.01;
/** Share of a finding, 0..1, that may be left out of what it expects, and most ways of building it that are looked into. */
const LEFT_OUT = 0.02, MOST_PIECES = 4;

const isOf = (id: string) => (c: Candidate) => faultId(c.hypothesis.fault) === id;

/** Chance of a finding, 0..1. */
function chanceOf(believed: readonly Believed[], id: string): number {
  return Math.min(1, believed.reduce((sum, b) => (faultId(b.candidate.hypothesis.fault) === id ? sum + b.p : sum), 0));
}

/**
 * The candidates that stand for a finding: of one kind and one set of pins, in every build. While the finding is possible these
 * are its likeliest; else those of the likeliest hypothesis that can have it. Empty when this device cannot have it.
 */
function standIns(setup: Setup, all: readonly Believed[], fault: Fault): readonly Candidate[] {
  const id = faultId(fault), has = isOf(id), likeliest = all.find((b) => has(b.candidate));
  const model = (likeliest && chanceOf(all, id) >= POSSIBLE ? likeliest : all[0]!).candidate;
  const alike = (c: Candidate) => c.hypothesis.kind === model.hypothesis.kind && `${c.pinOf}` === `${model.pinOf}`;
  const byEntry = setup.expect ? everyCandidateForEntry(setup.expect, setup.experience).filter(has).filter(alike) : [];
  if (byEntry.length > 0) return byEntry;
  const having = everyCandidateForUnknown(setup.experience).filter(has), near = having.filter(alike);
  return near.length > 0 ? near : having;
}

/** What the candidates of a finding expect of a check, given the other readings: in the builds which these make likely. */
function expectedOf(candidates: readonly Candidate[], setup: Setup, others: readonly Reading[], check: string): Prediction {
  const meter = setup.meter ?? DEFAULT_METER, pieces: Piece[] = [];
  let held = 0;
  for (const b of believe(candidates, observe(others, meter), meter)) {
    if (pieces.length >= MOST_PIECES || held > 1 - LEFT_OUT) break;
    pieces.push({ p: b.p, outlook: outlookOf(b, meter, parseCheck(check)!.optional) });
    held += b.p;
  }
  return predictionOf(pieces, CHECK_INDEX.get(check)!);
}

/**
 * What a check should read if a finding were true, given the other readings (that check's own reading left out).
 * Returns null for an unknown check or a finding that this device cannot have.
 */
export function predict(setup: Setup, readings: readonly Reading[], fault: Fault, check: string): Prediction | null {
  const candidates = parseCheck(check) && !isHint(check) ? standIns(setup, believedOf(setup, readings), fault) : [];
  return candidates.length === 0 ? null : expectedOf(candidates, setup, readings.filter(([c]) => c !== check), check);
}

/** Signed distance of a reading from the middle expected, in limits of error; null where either is a word, or the meter has no limit there. */
function distance(value: Reading[1], expected: Prediction, limit: number | null): number | null {
  return typeof value === "number" && expected.number && limit !== null && limit > 0 ? (value - expected.number.middle) / limit : null;
}

/** Belief with all readings and with each left out; of readings that contradict each other only the former, for what they move means nothing. */
function* weighed(setup: Setup, readings: readonly Reading[]): Generator<void, { all: readonly Believed[]; without: LeavingOut["without"] | null }> {
  const all = believedOf(setup, readings);
  if (contradictions(all[0]!, readings, setup.meter ?? DEFAULT_METER).length > 0) return { all, without: null };
  return yield* leavingOut(setup, readings);
}

/** The same as `evidence`, in steps of at most one belief each. */
export function* evidenceSteps(setup: Setup, readings: readonly Reading[], fault: Fault): Generator<void, EvidenceRow[]> {
  const meter = setup.meter ?? DEFAULT_METER, id = faultId(fault), { all, without } = yield* weighed(setup, readings);
  const sound = standIns(setup, all, { code: "none" }), found = standIns(setup, all, fault), chance = chanceOf(all, id), rows: EvidenceRow[] = [];
  if (sound.length === 0 || found.length === 0) return [];
  for (const [i, [check, value]] of readings.entries()) {
    yield;
    if (isHint(check)) continue;
    const others = readings.filter((_, k) => k !== i);
    const ifSound = expectedOf(sound, setup, others, check), ifFinding = fault.code === "none" ? ifSound : expectedOf(found, setup, others, check);
    const limit = typeof value === "number" ? meterLimit(parseCheck(check)!, value, meter) : null;
    const left = without ? chanceOf(without[i]!, id) : null;
    rows.push({
      check, value, ifSound, ifFinding, limit, offLimits: distance(value, ifFinding, limit), offIfSound: distance(value, ifSound, limit),
      factor: left === null ? null : factorOf(chance, left), without: left,
    });
  }
  return rows;
}

/**
 * The evidence for and against one finding: each reading beside what it should have been if all were sound and if the finding
 * is true (the other readings given), how far off it is in limits of error (JCGM 100:2008 4.3.7 half-widths), and by how
 * much it moved the chance of the finding. Empty when this device cannot have the finding; no factors where readings contradict each other.
 */
export function evidence(setup: Setup, readings: readonly Reading[], fault: Fault): EvidenceRow[] {
  return drain(evidenceSteps(setup, readings, fault));
}
