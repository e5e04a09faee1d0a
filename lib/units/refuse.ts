import { MEASURED, measuredUnit, type Unit } from "./units";

export type RefusalCode =
  | "empty" | "too-long" | "not-a-number" | "thousands-ambiguous" | "percent-ambiguous"
  | "wrong-unit" | "wrong-prefix" | "prefix-ambiguous" | "word-not-for-unit" | "out-of-range";

/** Why a text is no value of the unit, with a sentence that says what to enter instead. */
export interface Refusal { readonly ok: false; readonly code: RefusalCode; readonly message: string }

/** "ohms" or, for an engineering unit, its own symbol. */
function nameOf(unit: Unit): string {
  const measured = measuredUnit(unit);
  return measured ? MEASURED[measured].name : unit;
}

function exampleOf(unit: Unit): string {
  const measured = measuredUnit(unit);
  return measured ? MEASURED[measured].example : `112 ${unit}`;
}

const BOUNDS: Readonly<Record<string, string>> & { readonly other: string } = {
  ratio: "is not between 0 % and 100 %",
  hertz: "is not a frequency a meter can show",
  other: "is too large",
};

const SENTENCES: Readonly<Record<RefusalCode, (unit: Unit, typed: string) => string>> = {
  empty: (unit) => `Enter the value in ${nameOf(unit)}, for example ${exampleOf(unit)}.`,
  "too-long": (unit) => `That is too long for one value. Enter a number in ${nameOf(unit)}, for example ${exampleOf(unit)}.`,
  "not-a-number": (unit, typed) => `"${typed}" cannot be read as a value in ${nameOf(unit)}. Enter for example ${exampleOf(unit)}.`,
  "thousands-ambiguous": (unit, typed) =>
    `"${typed}" can mean ${typed.replace(",", ".")} or ${typed.replace(",", "")}. Enter the decimal sign as a point, and thousands without a comma.`,
  "percent-ambiguous": (_unit, typed) =>
    `"${typed}" can mean percent or a share of one. Enter it with the percent sign, for example ${typed} % or ${shareAsPercent(typed)} %.`,
  "wrong-unit": (unit, typed) => `"${typed}" has another unit: this value is in ${nameOf(unit)}. ${measuredUnit(unit) ? "Check the meter's function, then enter" : "Enter"} for example ${exampleOf(unit)}.`,
  "prefix-ambiguous": (_unit, typed) => `"${typed}" can mean milliohms or megohms. Enter it with its unit, as mΩ or MΩ.`,
  "wrong-prefix": (unit, typed) => `The prefix in "${typed}" is not used for ${nameOf(unit)}. Check capital and small letters, then enter for example ${exampleOf(unit)}.`,
  "word-not-for-unit": (unit, typed) => `"${typed}" is not a reading in ${nameOf(unit)}. Enter what the meter shows, for example ${exampleOf(unit)}.`,
  "out-of-range": (unit, typed) => `"${typed}" ${BOUNDS[measuredUnit(unit) ?? "other"] ?? BOUNDS.other}. Enter for example ${exampleOf(unit)}.`,
};

function shareAsPercent(typed: string): string {
  return String(Number((Number(typed.replace(",", ".")) * 100).toPrecision(12)));
}

/** Builds the refusal for what was typed; long texts are cut in the sentence, never in the field. */
export function refuse(code: RefusalCode, unit: Unit, typed: string): Refusal {
  const shown = typed.length > 24 ? `${typed.slice(0, 23)}…` : typed;
  return { ok: false, code, message: SENTENCES[code](unit, shown) };
}
