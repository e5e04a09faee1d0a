import { exp, ln, norm, square } from "../numerics";
import { scale, type Observation } from "../inference/observe";
import type { CheckSpec, SymbolValue } from "../types";

/** One thing that a meter may show of a check, with its chance: a word, a number near one, or any number between two (SI units). */
export type Part =
  | { readonly p: number; readonly word: SymbolValue }
  | { readonly p: number; readonly at: number; readonly sd: number }
  | { readonly p: number; readonly from: number; readonly to: number };
export type Expected = readonly Part[];

export const word = (p: number, shown: SymbolValue): Part => ({ p, word: shown });
export const near = (p: number, at: number, sd: number): Part => ({ p, at, sd });
export const between = (p: number, from: number, to: number): Part => ({ p, from, to });

/**
 * Least log-chance of a word that is not expected, as for the three kinds (inference/observe.ts), and log-density of a number that
 * is not. These models are so wide that a number beyond all of them contradicts them: with less, one mistyped reading of a usual device,
 * which costs the three kinds up to a hundred, would be laid at their door.
 */
const WORD_FLOOR = -11, STRAY_NUMBER = -60;
const LOG_ROOT_TWO_PI = 0.5 * ln(2 * Math.PI);

/** Width of a spread at a number on the comparison scale: relative for ohms and hertz. */
const spreadAt = (spec: CheckSpec, at: number, sd: number) => (spec.unit === "ohm" ? sd / (at + 2) : spec.unit === "hertz" ? sd / at : sd);

function density(o: Observation, part: Part): number {
  if ("word" in part) return 0;
  if ("at" in part) {
    const sd = norm(o.sd, spreadAt(o.spec, part.at, part.sd));
    return part.p * exp(-0.5 * square((o.scaled - scale(o.spec, part.at)) / sd) - LOG_ROOT_TWO_PI) / sd;
  }
  const low = scale(o.spec, part.from), high = scale(o.spec, part.to);
  return o.scaled < low - 2 * o.sd || o.scaled > high + 2 * o.sd ? 0 : part.p / (high - low);
}

/** Log-chance (for numbers, log-density on the comparison scale) of what was read. */
export function logChance(o: Observation, expected: Expected): number {
  let sum = 0;
  for (const part of expected) sum += o.word === null ? density(o, part) : "word" in part && part.word === o.word ? part.p : 0;
  return sum > 0 ? Math.max(ln(sum), o.word === null ? STRAY_NUMBER : WORD_FLOOR) : o.word === null ? STRAY_NUMBER : WORD_FLOOR;
}
