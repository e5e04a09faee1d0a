import { parseCheck, type Assessment, type CheckSpec, type NextCheck } from "@/lib/diagnosis";
import type { RunStep } from "./run";
import { machineState } from "./run-state";
import { transition, type Transition } from "./run-transition";

export type RunScreen =
  | { readonly type: "thinking" }
  | { readonly type: "state"; readonly spec: CheckSpec; readonly transition: Transition }
  | { readonly type: "reading"; readonly spec: CheckSpec }
  | { readonly type: "enough" }
  | { readonly type: "exhausted" }
  | { readonly type: "invalid"; readonly message: string };

interface ScreenInput {
  readonly steps: readonly RunStep[];
  /** The engine's answer to exactly these steps, or null while it is working. */
  readonly assessment: Assessment | null;
  /** A check picked by hand; goes before the engine's choice. */
  readonly chosen: string | null;
  /** The technician wants more readings although enough is known. */
  readonly carryOn: boolean;
}

function forCheck(spec: CheckSpec, steps: readonly RunStep[]): RunScreen {
  const way = transition(machineState(steps), spec.state);
  return way ? { type: "state", spec, transition: way } : { type: "reading", spec };
}

/** What is shown next. The same steps, answer and choices always give the same screen. */
export function nextScreen({ steps, assessment, chosen, carryOn }: ScreenInput): RunScreen {
  const picked = chosen === null ? null : parseCheck(chosen);
  if (picked) return forCheck(picked, steps);
  if (!assessment) return { type: "thinking" };
  if (assessment.state === "invalid-input") return { type: "invalid", message: assessment.message };
  if (assessment.done && !carryOn && assessment.state !== "contradictory") return { type: "enough" };
  const proposed = assessment.next[0] ? parseCheck(assessment.next[0].check) : null;
  return proposed ? forCheck(proposed, steps) : { type: "exhausted" };
}

/** Why the engine proposes this check, or null when it was picked by hand. */
export function whyChosen(assessment: Assessment | null, check: string): NextCheck | null {
  if (!assessment || assessment.state === "invalid-input") return null;
  return assessment.next.find((next) => next.check === check) ?? null;
}
