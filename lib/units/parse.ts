import { cleanText } from "./clean";
import { readDigits } from "./number";
import { refuse, type Refusal } from "./refuse";
import { readSuffix } from "./suffix";
import { measuredUnit, type Unit } from "./units";
import { readWord, wordFits } from "./words";

/** SI value (a share from 0 to 1 for "ratio"), a word of the meter, or a named refusal with what to enter instead. */
export type ParsedQuantity = { readonly ok: true; readonly value: number | "OL" | "none" } | Refusal;

const MAX_LENGTH = 40;
const MAX_SIZE = 1e12;

interface Parts { readonly negative: boolean; readonly digits: string; readonly power: number; readonly suffix: string }

/** "4k7" as parts people also write "4.7k": the letter stands in the decimal sign's place (IEC 60062). */
function letterAsPoint(text: string): Parts | null {
  const [, sign, whole = "", letter = "", fraction = "", rest = ""] = /^([+-]?) ?(\d*)([RrΩVvkKMmGμu])(\d+) ?(\D*)$/.exec(text) ?? [];
  if (sign === undefined || (whole === "" && !/[RrΩVv]/.test(letter))) return null;
  return { negative: sign === "-", digits: `${whole || "0"}.${fraction}`, power: 0, suffix: letter + rest };
}

function numberFirst(text: string): Parts | null {
  const [, sign, digits = "", exponent = "0", suffix = ""] = /^([+-]?) ?([\d.,' ]*[\d.,])(?:e([+-]?\d{1,3})(?!\d))? ?([^\d.,' ].*)?$/i.exec(text) ?? [];
  return sign === undefined ? null : { negative: sign === "-", digits, power: Number(exponent), suffix: suffix.trim() };
}

/** Number times a power of ten. */
function scaled(digits: string, power: number): number {
  // The decimal exponent goes into the text: 4.7e3 is exact where 4.7 * 1000 need not be.
  return Number(`${digits.endsWith(".") ? `${digits}0` : digits}e${power}`);
}

function inUnit(parts: Parts, unit: Unit, typed: string): ParsedQuantity {
  const suffix = readSuffix(parts.suffix, unit);
  if (!suffix.ok) return refuse(suffix.problem, unit, typed);
  const number = readDigits(parts.digits);
  if (!number.ok) return refuse(number.problem, unit, number.problem === "thousands-ambiguous" ? parts.digits.trim() : typed);
  const measured = measuredUnit(unit);
  const size = scaled(number.digits, parts.power + suffix.power - (suffix.percent ? 2 : 0));
  if (size > MAX_SIZE) return refuse("out-of-range", unit, typed);
  if (measured === "ratio") return share(size, suffix.percent, parts, typed);
  if (measured === "hertz" && size === 0) return { ok: true, value: "none" };
  if (measured === "hertz" && parts.negative) return refuse("out-of-range", unit, typed);
  return { ok: true, value: parts.negative && size !== 0 ? -size : size };
}

/** A duty meter shows percent, so a bare number above one is percent; from 0 to 1 nobody can tell. */
function share(size: number, percent: boolean, parts: Parts, typed: string): ParsedQuantity {
  if (!percent && size > 0 && size <= 1) return refuse("percent-ambiguous", "ratio", parts.digits.trim());
  const value = percent || size === 0 ? size : scaled(String(size), -2);
  return value > 1 || (parts.negative && value !== 0) ? refuse("out-of-range", "ratio", typed) : { ok: true, value };
}

/**
 * Reads a value as people type, paste or dictate it: "4k7", "4,7 k", "4.7 kΩ", "0.47M", "-12mV", "27.3 %", "OL", "none".
 *
 * @param unit the unit the value must have; SI result for measured units, unchanged scale for engineering ones.
 * @returns the value; or a refusal with a stable code and a sentence. Never throws. Zero hertz is "none": a meter
 *   that finds no edges shows either.
 */
export function parseQuantity(text: string, unit: Unit): ParsedQuantity {
  if (text.length > MAX_LENGTH) return refuse("too-long", unit, text);
  const typed = cleanText(text);
  if (typed === "") return refuse("empty", unit, typed);
  const word = readWord(typed);
  if (word) return wordFits(word, measuredUnit(unit)) ? { ok: true, value: word } : refuse("word-not-for-unit", unit, typed);
  const parts = letterAsPoint(typed) ?? numberFirst(typed);
  return parts ? inUnit(parts, unit, typed) : refuse("not-a-number", unit, typed);
}
