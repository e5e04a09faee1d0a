import type { CheckSpec, MachineState, Reading, Setup } from "@/lib/diagnosis";
import { tidyExperience } from "./experience";
import type { Run, RunStep, SkipReason } from "./run";

export type ReadingStep = Extract<RunStep, { type: "reading" }>;
export type SkipStep = Extract<RunStep, { type: "skip" }>;
export type StateStep = Extract<RunStep, { type: "state" }>;

/** A machine as a technician meets it: connectors mated, and nobody has said whether the power is on. */
export const AS_FOUND: MachineState = { deviceParted: false, controllerParted: false, powerOn: null };
const UNKNOWN: MachineState = { deviceParted: null, controllerParted: null, powerOn: null };

/** Steps once each, in the order they were made (ids are ULIDs, so text order is time order). */
export function orderedSteps(steps: readonly RunStep[]): readonly RunStep[] {
  const byId = new Map(steps.map((step) => [step.id, step]));
  return [...byId.values()].sort((a, b) => (a.id < b.id ? -1 : 1));
}

/** Ids taken back. Read from the newest down, so that a retract that was itself taken back has no effect. */
function retractedIds(ordered: readonly RunStep[]): ReadonlySet<string> {
  const gone = new Set<string>();
  for (const step of [...ordered].reverse()) {
    if (step.type === "retract" && !gone.has(step.id)) gone.add(step.step);
  }
  return gone;
}

/** What stands of a run: readings, skips and states that were not taken back, oldest first. */
export function effectiveSteps(steps: readonly RunStep[]): readonly (ReadingStep | SkipStep | StateStep)[] {
  const ordered = orderedSteps(steps);
  const gone = retractedIds(ordered);
  return ordered.filter((step): step is ReadingStep | SkipStep | StateStep => step.type !== "retract" && !gone.has(step.id));
}

/** Standing reading steps, oldest first; where a check was read twice the later one stands. */
export function readingSteps(steps: readonly RunStep[]): readonly ReadingStep[] {
  const latest = new Map<string, ReadingStep>();
  for (const step of effectiveSteps(steps)) {
    if (step.type !== "reading") continue;
    latest.delete(step.check);
    latest.set(step.check, step);
  }
  return [...latest.values()];
}

/** The readings as the engine takes them. */
export function effectiveReadings(steps: readonly RunStep[]): readonly Reading[] {
  return readingSteps(steps).map((step) => [step.check, step.value] as const);
}

/** Standing skips; a check that was read after all is no longer skipped. */
export function skipSteps(steps: readonly RunStep[]): readonly SkipStep[] {
  const read = new Set(readingSteps(steps).map((step) => step.check));
  return effectiveSteps(steps).filter((step): step is SkipStep => step.type === "skip" && !read.has(step.check));
}

/**
 * The machine's state as last confirmed. Taking a confirmation back makes everything unknown: what was
 * believed before it is no safer, so the next state screen asks for all of it again.
 */
export function machineState(steps: readonly RunStep[]): MachineState {
  const ordered = orderedSteps(steps);
  const gone = retractedIds(ordered);
  const states = new Set(ordered.filter((step) => step.type === "state").map((step) => step.id));
  for (const step of [...ordered].reverse()) {
    if (gone.has(step.id) && step.type === "retract") continue;
    if (step.type === "retract" && states.has(step.step)) return UNKNOWN;
    if (step.type === "state") return { deviceParted: step.deviceParted, controllerParted: step.controllerParted, powerOn: step.powerOn };
  }
  return AS_FOUND;
}

/** Does the obstacle that stopped one check stop another as well? */
function sharesObstacle(reason: SkipReason, skipped: CheckSpec, other: CheckSpec): boolean {
  switch (reason) {
    case "no-function-on-meter": return other.meter === skipped.meter;
    case "cannot-move-actuator": return other.position === "full" || other.position === "half" || other.meter === "watch";
    case "cannot-part-connector":
      return skipped.state.controllerParted === true ? other.state.controllerParted === true : other.state.deviceParted === true;
    case "cannot-reach": case "not-safe-here": case "other": return false;
  }
}

/** Codes of the checks that cannot be done here: each skipped one, and those that its reason rules out with it. */
export function excludedChecks(steps: readonly RunStep[], vocabulary: readonly CheckSpec[]): readonly string[] {
  const byCode = new Map(vocabulary.map((spec) => [spec.code, spec]));
  const read = new Set(readingSteps(steps).map((step) => step.check));
  const excluded = new Set<string>();
  for (const skip of skipSteps(steps)) {
    excluded.add(skip.check);
    const skipped = byCode.get(skip.check);
    if (!skipped) continue;
    for (const other of vocabulary) if (sharesObstacle(skip.reason, skipped, other)) excluded.add(other.code);
  }
  return vocabulary.map((spec) => spec.code).filter((code) => excluded.has(code) && !read.has(code));
}

/** The engine's setup of a run; phone and server must both come by it this way, or their verdicts may differ. */
export function engineSetup(run: Pick<Run, "setup" | "steps">, vocabulary: readonly CheckSpec[]): Setup {
  const { cavityLabels, expect, meter } = run.setup;
  const excluded = excludedChecks(run.steps, vocabulary);
  const experience = tidyExperience(run.setup.experience);
  return { pins: cavityLabels, ...(expect ? { expect } : {}), ...(meter ? { meter } : {}), ...(experience ? { experience } : {}), ...(excluded.length > 0 ? { excluded } : {}) };
}

/**
 * The step that "undo" takes back: the last standing reading or skip. A confirmed state is passed over,
 * because pressing a key does not switch the machine's power back; null when nothing is left to undo.
 */
export function undoable(steps: readonly RunStep[]): ReadingStep | SkipStep | null {
  const candidates = effectiveSteps(steps).filter((step): step is ReadingStep | SkipStep => step.type !== "state");
  return candidates.at(-1) ?? null;
}
