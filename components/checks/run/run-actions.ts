import type { CheckSpec, ReadingValue } from "@/lib/diagnosis";
import type { RunStep, SkipReason } from "@/lib/checks/run";
import { effectiveSteps, readingSteps, undoable } from "@/lib/checks/run-state";
import type { SettledState } from "@/lib/checks/run-transition";
import { UNIT_CHOICES } from "@/lib/checks/typed-reading";
import type { Draft } from "@/lib/offline/draft";
import { parseCheck } from "@/lib/diagnosis";
import type { NewStep } from "./use-run";

type Standing = ReturnType<typeof effectiveSteps>[number];

interface Parts {
  readonly steps: readonly RunStep[];
  readonly add: (steps: readonly NewStep[]) => Promise<void>;
  readonly changeDraft: (part: Partial<Draft>) => void;
}

/** The field filled with what was typed for this reading before, so that a slip is put right and not typed anew. */
function typedBefore(step: Standing | undefined): Draft["typed"] {
  if (step?.type !== "reading") return null;
  const spec = parseCheck(step.check);
  return spec && spec.unit !== "word" ? { check: step.check, text: step.typed, unit: UNIT_CHOICES[spec.unit][0] ?? "" } : null;
}

/** Everything a technician can do to a run; each resolves once the phone has kept it. */
export function runActions({ steps, add, changeDraft }: Parts) {
  const standingReading = (check: string) => readingSteps(steps).find((step) => step.check === check);
  const done = () => changeDraft({ chosen: null, typed: null });
  return {
    /** Takes a reading; one that stands for the same check is taken back with it. */
    async read(spec: CheckSpec, value: ReadingValue, typed: string): Promise<void> {
      const before = standingReading(spec.code);
      await add([...(before ? [{ type: "retract", step: before.id } as const] : []), { type: "reading", check: spec.code, value, typed }]);
      done();
    },
    async skip(spec: CheckSpec, reason: SkipReason): Promise<void> {
      await add([{ type: "skip", check: spec.code, reason }]);
      done();
    },
    async confirmState(end: SettledState): Promise<void> {
      await add([{ type: "state", ...end }]);
    },
    /** Takes the last reading or skip back and shows its screen again. */
    async undo(): Promise<void> {
      const last = undoable(steps);
      if (!last) return;
      await add([{ type: "retract", step: last.id }]);
      changeDraft({ chosen: last.check, typed: typedBefore(last) });
    },
    async retract(step: Standing): Promise<void> {
      await add([{ type: "retract", step: step.id }]);
    },
    /** Shows a check's screen out of turn; what stands for it stays until a new reading is entered. */
    choose(check: string): void {
      changeDraft({ chosen: check, typed: typedBefore(standingReading(check)) });
    },
  };
}

export type RunActions = ReturnType<typeof runActions>;
