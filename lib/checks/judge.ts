import { assess, drain, explainSteps, tellApart, vocabulary, type Assessment, type Explanation } from "@/lib/diagnosis";
import { AppError } from "@/lib/errors";
import { buildVerdict, explainedFindings } from "./build-verdict";
import { inSlices } from "./in-slices";
import { refusalOf } from "./refusal";
import type { Run } from "./run";
import { effectiveReadings, engineSetup } from "./run-state";
import type { Verdict } from "./verdict";
import { openKinds } from "./verdict-sentence";

/** Kept with each verdict; goes up whenever the same readings could be judged differently, or more is kept of the reasons. */
export const ENGINE_VERSION = "3";

export interface Judgement { readonly assessment: Exclude<Assessment, { state: "invalid-input" }>; readonly verdict: Verdict }

const NO_EXPLANATION: Explanation = { evidence: [], carrying: null };

function* judgeSteps(run: Pick<Run, "setup" | "steps">): Generator<void, Judgement> {
  const setup = engineSetup(run, vocabulary());
  const readings = effectiveReadings(run.steps);
  if (readings.length === 0) throw new AppError("no-readings", "Take at least one reading before you finish.", 409);
  const assessment = assess(setup, readings);
  if (assessment.state === "invalid-input") throw new AppError(assessment.code, assessment.message, 422, assessment.where);
  yield;
  // Reasons are reasons for findings of the three kinds: a refusal has none.
  const refused = refusalOf(assessment) !== null, explanation = refused ? NO_EXPLANATION : yield* explainSteps(setup, readings, explainedFindings(assessment));
  const open = assessment.openFindings, kinds = openKinds(assessment.kinds), anywhere = { ...setup, excluded: undefined };
  const verdict = buildVerdict({
    labels: run.setup.cavityLabels, assessment, engineVersion: ENGINE_VERSION, explanation,
    tellApart: open.length > 1 && !refused ? tellApart(anywhere, readings, open) : [],
    tellKindsApart: assessment.state !== "contradictory" && kinds.length > 1 && !refused ? tellApart(anywhere, readings, kinds.map(({ kind }) => ({ kind }))) : null,
  });
  return { assessment, verdict };
}

/**
 * The engine's verdict on a run: the same setup and readings as the phone makes of the same steps. Pure.
 * @throws AppError no-readings (409) without one; the engine's own code (422) when it cannot use them
 */
export function judge(run: Pick<Run, "setup" | "steps">): Judgement {
  return drain(judgeSteps(run));
}

/** The same, letting others have their turn after each step: a long check takes many beliefs, and a server answers everybody. */
export function judgeInSlices(run: Pick<Run, "setup" | "steps">): Promise<Judgement> {
  return inSlices(judgeSteps(run));
}
