import { parseCheck, type ReadingValue } from "@/lib/diagnosis";
import { formatQuantity } from "@/lib/units";
import { checkTitle } from "./check-words";

/** The three cavity labels in pin order. */
export type Labels = readonly [string, string, string];

/** A check of a stored record in one line; a code that the vocabulary no longer has is shown as it is. */
export function checkName(code: string, labels: Labels): string {
  const spec = parseCheck(code);
  return spec ? checkTitle(spec, labels) : code;
}

/**
 * A reading with its unit as the meter showed it, four digits at most; words as they are ("none" as "no signal").
 * With a limit of error, no digit that lies below it.
 */
export function readingWords(code: string, value: ReadingValue, limit: number | null = null): string {
  const unit = parseCheck(code)?.unit;
  if (typeof value === "string") return value === "none" ? "no signal" : value;
  if (!unit || unit === "word") return String(value);
  return formatQuantity(value, unit, limit ? { limit } : {});
}
