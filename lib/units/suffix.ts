import { MEASURED, measuredUnit, unitGroup, type MeasuredUnit, type Unit } from "./units";

export type SuffixProblem = "not-a-number" | "wrong-unit" | "wrong-prefix" | "prefix-ambiguous";

export type Suffix =
  | { readonly ok: true; readonly power: number; readonly percent: boolean }
  | { readonly ok: false; readonly problem: SuffixProblem };

const plain = { ok: true, power: 0, percent: false } as const;

/** Every way to split "kΩ" into prefix and unit, with and without a space between. */
function splits(text: string): readonly (readonly [prefix: string, rest: string])[] {
  const letters = ["", "G", "M", "K", "k", "c", "m", "u", "μ", "n", "p", "giga", "mega", "meg", "kilo", "milli", "micro", "nano", "pico"];
  return letters
    .filter((prefix) => (prefix.length > 1 ? text.toLowerCase() : text).startsWith(prefix))
    .map((prefix) => [prefix, text.slice(prefix.length).trim()] as const);
}

function measuredSuffix(text: string, unit: MeasuredUnit): Suffix {
  const { prefixes } = MEASURED[unit];
  let problem: SuffixProblem = "not-a-number";
  // A hand-held meter shows megohms as M and phones write small letters: a lone "m" may be either.
  if (unit === "ohm" && text === "m") return { ok: false, problem: "prefix-ambiguous" };
  // Without a unit "m" is a prefix; only lengths read it as their unit.
  const alone = unit === "metre" ? undefined : prefixes.get(text);
  if (alone !== undefined) return { ...plain, power: alone };
  for (const [prefix, rest] of splits(text)) {
    const group = unitGroup(rest);
    const power = prefix === "" ? 0 : prefixes.get(prefix);
    const named = group === unit || (rest === "" && prefix !== "" && unit !== "metre");
    if (named && power !== undefined) return { ok: true, power, percent: unit === "ratio" };
    if (named) problem = "wrong-prefix";
    else if (group !== null && problem === "not-a-number") problem = "wrong-unit";
  }
  return { ok: false, problem };
}

function engineeringSuffix(text: string, unit: string): Suffix {
  const same = text.toLowerCase() === unit.toLowerCase() || (unitGroup(text) !== null && unitGroup(text) === unitGroup(unit));
  if (same) return plain;
  const known = splits(text).some(([, rest]) => unitGroup(rest) !== null);
  return { ok: false, problem: known ? "wrong-unit" : "not-a-number" };
}

/**
 * Reads what stands behind the digits: nothing, a prefix, a unit, or both. The case of the prefix
 * counts (m is milli, M mega), the case of the unit does not.
 */
export function readSuffix(text: string, unit: Unit): Suffix {
  if (text === "") return plain;
  const measured = measuredUnit(unit);
  return measured ? measuredSuffix(text, measured) : engineeringSuffix(text, unit);
}
