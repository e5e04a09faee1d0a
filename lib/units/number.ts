/** Why a run of digits is not one number. */
export type NumberProblem = "not-a-number" | "thousands-ambiguous";

export type NumberResult = { readonly ok: true; readonly digits: string } | { readonly ok: false; readonly problem: NumberProblem };

const fail = (problem: NumberProblem): NumberResult => ({ ok: false, problem });
const done = (digits: string): NumberResult => ({ ok: true, digits });

/** True for "1 200", "12'345'678": first group of one to three digits, then groups of exactly three. */
function grouped(parts: readonly string[]): boolean {
  return parts.length > 1 && /^\d{1,3}$/.test(parts[0] ?? "") && parts.slice(1).every((part) => /^\d{3}$/.test(part));
}

/** Commas and points only: decides which one is the decimal sign. */
function separated(text: string): NumberResult {
  const commas = text.split(",");
  const points = text.split(".");
  if (commas.length > 1 && points.length > 1) {
    const decimal = text.lastIndexOf(",") > text.lastIndexOf(".") ? "," : ".";
    const [whole = "", fraction = "", ...more] = text.split(decimal);
    const groups = whole.split(decimal === "," ? "." : ",");
    return more.length === 0 && grouped(groups) && /^\d+$/.test(fraction) ? done(`${groups.join("")}.${fraction}`) : fail("not-a-number");
  }
  if (commas.length > 2 || points.length > 2) {
    const groups = commas.length > 2 ? commas : points;
    return grouped(groups) ? done(groups.join("")) : fail("not-a-number");
  }
  // "4,700" is 4.7 to one reader and 4700 to the next. A point stays decimal: meters show 4.700.
  if (commas.length === 2 && grouped(commas) && !/^0/.test(text)) return fail("thousands-ambiguous");
  const plain = text.replace(",", ".");
  return /^(\d+\.?\d*|\.\d+)$/.test(plain) ? done(plain) : fail("not-a-number");
}

/**
 * Reads unsigned digits with decimal comma or point and optional grouping by space, apostrophe,
 * comma or point. One comma before exactly three digits is refused as ambiguous.
 */
export function readDigits(text: string): NumberResult {
  const trimmed = text.trim();
  if (!/[ ']/.test(trimmed)) return separated(trimmed);
  const [, whole = "", fraction = ""] = /^([^.,]*)([.,]\d+)?$/.exec(trimmed) ?? [];
  const parts = whole.split(/[ ']/);
  return grouped(parts) ? done(parts.join("") + fraction.replace(",", ".")) : fail("not-a-number");
}
