import { parseCheck, type CheckSpec, type ReadingValue } from "@/lib/diagnosis";
import type { RunStep } from "./run";

export interface StepProblem { readonly code: "unknown-check" | "wrong-value" | "out-of-bounds"; readonly message: string }

/**
 * What a hand-held meter may show, SI. A little below zero is offset of the leads or of the display.
 * 60 V d.c. is where this tool stops; 10 GΩ and 1 MHz are beyond any hand-held meter.
 */
const BOUNDS: Readonly<Record<Exclude<CheckSpec["unit"], "word">, { readonly min: number; readonly max: number; readonly words: string }>> = {
  ohm: { min: -1, max: 1e10, words: "Ohms lie between 0 and 10 GΩ; enter OL when the meter shows it." },
  volt: { min: -60, max: 60, words: "Volts lie between −60 and 60. Above 60 V d.c.: stop, not with this tool." },
  hertz: { min: 0, max: 1e6, words: "Frequency lies between 0 and 1 MHz." },
  ratio: { min: 0, max: 1, words: "Duty lies between 0 and 100 %." },
};

/** AC volts are kept beyond 30 V, so that the record shows why the check stopped. */
const AC_BOUNDS = { min: 0, max: 1000, words: "AC volts lie between 0 and 1000." };

function valueProblem(spec: CheckSpec, value: ReadingValue): StepProblem | null {
  if (typeof value === "string") {
    if (spec.words.includes(value)) return null;
    const takes = spec.unit === "word" ? spec.words.join(", ") : ["a number", ...spec.words].join(" or ");
    return { code: "wrong-value", message: `"${value}" is no answer to ${spec.code}; it takes ${takes}.` };
  }
  if (spec.unit === "word") return { code: "wrong-value", message: `${spec.code} takes one of the words ${spec.words.join(", ")}, not a number.` };
  const bounds = spec.meter === "ac-volts" ? AC_BOUNDS : BOUNDS[spec.unit];
  return value >= bounds.min && value <= bounds.max ? null : { code: "out-of-bounds", message: bounds.words };
}

/** What is wrong with a step of a run, or null. The check must be in the vocabulary and the value fit its unit. */
export function stepProblem(step: RunStep): StepProblem | null {
  if (step.type !== "reading" && step.type !== "skip") return null;
  const spec = parseCheck(step.check);
  if (!spec) return { code: "unknown-check", message: `There is no check named "${step.check}".` };
  return step.type === "reading" ? valueProblem(spec, step.value) : null;
}
