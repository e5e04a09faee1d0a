import { assess, carryingSteps, effectsSteps, evidenceSteps, tellApart, type Reading, type Setup } from "@/lib/diagnosis";
import { inSlices } from "@/lib/checks/in-slices";
import type { EngineAnswer, EngineJob, EngineRequest, EngineResults } from "./engine-messages";

type Result = EngineResults[keyof EngineResults];

/** The job in steps of at most one belief each, so that a new reading never waits for an explanation. */
function* stepsOf(job: EngineJob, setup: Setup, readings: readonly Reading[]): Generator<void, Result> {
  switch (job.task) {
    case "assess": return assess(setup, readings);
    case "effects": return yield* effectsSteps(setup, readings);
    case "evidence": return yield* evidenceSteps(setup, readings, job.finding);
    case "carrying": return yield* carryingSteps(setup, readings);
    case "apart": return tellApart(setup, readings, job.among);
  }
}

/** The readings that were assessed last: whoever explains older ones may stop. */
let latest = "";

/** Answers one request. Never throws; a defect of the engine is an answer too. */
export async function answerTo({ id, job, setup, readings }: EngineRequest): Promise<EngineAnswer> {
  const name = JSON.stringify([setup, readings]);
  if (job.task === "assess") latest = name;
  const begunWith = latest, begun = performance.now();
  try {
    // An explanation may be asked for before the readings that it explains are assessed: only a change after that ends it.
    let done = false, result: Result = null;
    const steps = stepsOf(job, setup, readings);
    await inSlices((function* (): Generator<void, void> { result = yield* steps; done = true; })(), () => latest === begunWith || latest === name);
    // For the browser's own recorder and for `npm run bench`: how long it took, in ms, with how many readings.
    performance.measure(`engine ${job.task}`, { start: begun, detail: readings.length });
    return done ? { id, state: "answered", result } : { id, state: "failed", message: "newer readings came in" };
  } catch (error) {
    return { id, state: "failed", message: String(error) };
  }
}
