import type { MeasuredUnit } from "./units";

const OVER_RANGE = /^(o\.?l\.?|0\.?l\.?|\.ol|over ?load|over ?range|open( line| loop| circuit)?|∞|inf(inity)?)$/i;
const NO_READING = /^(none|no (reading|signal|value|frequency|duty)|nothing|-{2,6}|-( -){1,5})$/i;

/** "OL" or "none" as the meter or the technician spells it, else null. */
export function readWord(text: string): "OL" | "none" | null {
  if (OVER_RANGE.test(text)) return "OL";
  return NO_READING.test(text) ? "none" : null;
}

/** Only ohms go over range to OL; only frequency and duty show nothing at all. */
export function wordFits(word: "OL" | "none", unit: MeasuredUnit | null): boolean {
  return word === "OL" ? unit === "ohm" : unit === "hertz" || unit === "ratio";
}
