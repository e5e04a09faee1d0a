import type { CheckSpec, ReadingValue } from "@/lib/diagnosis";
import { parseQuantity } from "@/lib/units";
import { stepProblem } from "./step-rules";

export type TypedReading =
  | { readonly ok: true; readonly value: ReadingValue; readonly typed: string }
  | { readonly ok: false; readonly message: string };

/** Units of the selector beside the keypad, the one that a fresh field starts with first. */
export const UNIT_CHOICES: Readonly<Record<CheckSpec["unit"], readonly string[]>> = {
  ohm: ["\u03a9", "k\u03a9", "M\u03a9"], volt: ["V", "mV"], hertz: ["Hz", "kHz"], ratio: ["%"], word: [],
};

/** True when the text is a bare number, so that the selected unit goes with it; "4k7" and "OL" bring their own. */
export function isBareNumber(text: string): boolean {
  return /^[+\-\u2212]?[\d.,' ]+$/.test(text.trim());
}

/**
 * Reads what was typed for a check, with the selected unit where the text has none of its own.
 * @returns the SI value (duty as a share 0..1) or a sentence that says what to enter instead.
 */
export function readTyped(spec: CheckSpec, text: string, unit: string): TypedReading {
  if (spec.unit === "word") return { ok: false, message: `Choose one of: ${spec.words.join(", ")}.` };
  const typed = isBareNumber(text) && unit ? `${text.trim()} ${unit}` : text.trim();
  const parsed = parseQuantity(typed, spec.unit);
  if (!parsed.ok) return { ok: false, message: parsed.message };
  const problem = stepProblem({ id: "", at: "", type: "reading", check: spec.code, value: parsed.value, typed });
  return problem ? { ok: false, message: problem.message } : { ok: true, value: parsed.value, typed };
}
