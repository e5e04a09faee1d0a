import { assess, evidence, tellApart, vocabulary, type Assessment } from "@/lib/diagnosis";
import { AppError } from "@/lib/errors";
import { buildVerdict, evidenceFindingOf } from "./build-verdict";
import type { Run } from "./run";
import { effectiveReadings, engineSetup } from "./run-state";
import type { Verdict } from "./verdict";

/** Kept with each verdict; goes up whenever the same readings could be judged differently. */
const ENGINE_VERSION = "1";

export interface Judgement { readonly assessment: Exclude<Assessment, { state: "invalid-input" }>; readonly verdict: Verdict }

/**
 * The engine's verdict on a run: the same setup and readings as the phone makes of the same steps. Pure.
 * @throws AppError no-readings (409) without one; the engine's own code (422) when it cannot use them
 */
export function judge(run: Pick<Run, "setup" | "steps">): Judgement {
  const setup = engineSetup(run, vocabulary());
  const readings = effectiveReadings(run.steps);
  if (readings.length === 0) throw new AppError("no-readings", "Take at least one reading before you finish.", 409);
  const assessment = assess(setup, readings);
  if (assessment.state === "invalid-input") throw new AppError(assessment.code, assessment.message, 422, assessment.where);
  const open = assessment.openFindings;
  const verdict = buildVerdict({
    labels: run.setup.cavityLabels, assessment, engineVersion: ENGINE_VERSION,
    evidence: evidence(setup, readings, evidenceFindingOf(assessment) ?? { code: "none" }),
    tellApart: open.length > 1 ? tellApart({ ...setup, excluded: undefined }, readings, open) : [],
  });
  return { assessment, verdict };
}
