import { faultId, type Assessment, type Explanation, type Fault, type FaultChance, type NextCheck, type Standing } from "@/lib/diagnosis";
import { adviceFor, cautionsFor } from "./advice";
import type { Labels } from "./check-name";
import { refusalOf, shortRefusal, type Refusal } from "./refusal";
import { refusalSentence, refusalSteps } from "./refusal-advice";
import type { FindingAdvice, Verdict } from "./verdict";
import { shortVerdict, SURE, verdictSentence } from "./verdict-sentence";

/** More findings than this are listed with their chances but get no advice of their own. */
const MAX_ADVICE = 4;
const MAX_TELL_APART = 3;
/** More open findings than this are listed with their chances, but their evidence is not kept. */
const MAX_EXPLAINED = 6;
/** A rival below this chance is not set against "sound" in the evidence table. */
const RIVAL_FLOOR = 0.0005;

export interface VerdictInput {
  readonly labels: Labels;
  readonly assessment: Exclude<Assessment, { state: "invalid-input" }>;
  /** Evidence for each of `explainedFindings(assessment)`, and what carries the verdict. */
  readonly explanation: Explanation;
  /** Checks of the whole vocabulary, skipped ones too, that would tell the open findings apart; best first. */
  readonly tellApart: readonly Pick<NextCheck, "check" | "why">[];
  /** The same for the kinds that are left; null where one is settled. */
  readonly tellKindsApart: readonly Pick<NextCheck, "check" | "why">[] | null;
  readonly engineVersion: string;
}

/** The finding that the evidence is set against "sound": the best that is not "none"; null when none is worth the comparison. */
export function evidenceFindingOf(standing: Pick<Standing, "faults">): Fault | null {
  const best = standing.faults.find((fault) => fault.code !== "none" && fault.p >= RIVAL_FLOOR);
  if (!best) return null;
  return bare(best);
}

const bare = ({ code, pins }: Fault): Fault => (pins ? { code, pins } : { code });

/** The findings whose evidence is kept with the verdict: those still open, the best that is not "none", and "none"; likeliest first. */
export function explainedFindings(standing: Pick<Standing, "faults" | "openFindings">): readonly Fault[] {
  const rival = evidenceFindingOf(standing);
  const wanted = new Map([...standing.openFindings.slice(0, MAX_EXPLAINED).map(bare), ...(rival ? [rival] : []), { code: "none" } as const].map((fault) => [faultId(fault), fault]));
  const place = (fault: Fault) => { const at = standing.faults.findIndex((f) => faultId(f) === faultId(fault)); return at < 0 ? Infinity : at; };
  return [...wanted.values()].sort((a, b) => place(a) - place(b));
}

const told = (checks: readonly Pick<NextCheck, "check" | "why">[]) => checks.slice(0, MAX_TELL_APART).map(({ check, why }) => ({ check, why }));

function adviceOf(open: readonly FaultChance[], labels: Labels): FindingAdvice[] {
  return open.slice(0, MAX_ADVICE).map((finding) => ({ finding, ...adviceFor(finding, labels) }));
}

/** A verdict that names no finding: pins, findings and evidence all hold on the condition that it is one of the three kinds. */
function refused(assessment: VerdictInput["assessment"], refusal: Refusal, labels: Labels, engineVersion: string): Verdict {
  return {
    sentence: refusalSentence(assessment, labels), short: shortRefusal(refusal), state: assessment.state, kinds: assessment.kinds, others: assessment.others, refusal: { ...refusal, next: refusalSteps(refusal) },
    pins: [], faults: [], openFindings: [], inseparable: false, contradictory: false, suspects: [], tellApart: [], tellKindsApart: null,
    evidence: [], evidenceFinding: null, explained: [], carrying: null, advice: [], cautions: cautionsFor(null), engineVersion,
  };
}

/**
 * Turns an assessment into what is shown, printed and stored. Pure: no clock, no chance.
 * A contradictory set of readings gets no advice on repairs, only the readings to take again.
 */
export function buildVerdict({ labels, assessment, explanation, tellApart, tellKindsApart, engineVersion }: VerdictInput): Verdict {
  const refusal = refusalOf(assessment);
  if (refusal) return refused(assessment, refusal, labels, engineVersion);
  const contradictory = assessment.state === "contradictory";
  const suspects = contradictory ? assessment.suspects : [];
  const open = assessment.openFindings;
  const settledKind = assessment.kinds[0] && assessment.kinds[0].p >= SURE ? assessment.kinds[0].kind : null;
  // By the whole vocabulary: a check that could not be made here would still tell them apart elsewhere.
  const inseparable = open.length > 1 && tellApart.length === 0;
  const evidenceFinding = evidenceFindingOf(assessment), shown = faultId(evidenceFinding ?? { code: "none" });
  return {
    sentence: verdictSentence({ ...assessment, inseparable, kindsInseparable: tellKindsApart?.length === 0 }, labels, contradictory ? suspects : null),
    short: shortVerdict(open, labels, contradictory),
    state: assessment.state,
    kinds: assessment.kinds,
    others: assessment.others,
    refusal: null,
    pins: assessment.pins,
    faults: assessment.faults,
    openFindings: open,
    inseparable,
    contradictory,
    suspects,
    tellApart: open.length > 1 ? told(tellApart) : [],
    tellKindsApart: tellKindsApart && told(tellKindsApart),
    evidence: explanation.evidence.find(({ finding }) => faultId(finding) === shown)?.rows ?? [],
    evidenceFinding,
    explained: explanation.evidence,
    carrying: explanation.carrying,
    advice: contradictory ? [] : adviceOf(open, labels),
    cautions: cautionsFor(settledKind),
    engineVersion,
  };
}
