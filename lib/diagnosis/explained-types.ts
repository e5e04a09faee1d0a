import type { Fault, Kind, NextCheck, PinAssignment, ReadingValue, SymbolValue } from "./types";

/** What a hypothesis predicts for one check: a band of numbers, or words with their chances. */
export interface Prediction {
  readonly check: string;
  /** Middle and limits of the number expected (95 %), or null when a word is expected. */
  readonly number: { readonly low: number; readonly middle: number; readonly high: number } | null;
  readonly words: readonly { readonly word: SymbolValue; readonly p: number }[];
}

/** How one reading moved the chances: factor > 1 speaks for, < 1 against (relative to the mean of all still possible). */
export interface ReadingEffect {
  readonly check: string;
  readonly value: ReadingValue;
  readonly kinds: readonly { readonly kind: Kind; readonly factor: number }[];
  readonly faults: readonly { readonly fault: Fault; readonly factor: number }[];
}

export interface EvidenceRow {
  readonly check: string;
  readonly value: ReadingValue;
  readonly ifSound: Prediction;
  readonly ifFinding: Prediction;
  /** Meter's limit of error at this value, in the check's unit; null for words. */
  readonly limit: number | null;
  /** Reading less the middle expected if the finding is true, in units of `limit`; null for words, and where a word is expected. */
  readonly offLimits: number | null;
  /** The same if all were sound. */
  readonly offIfSound: number | null;
  /** Chance of the finding with this reading over its chance without it, the others alike; 1e-6 to 1e6. Null in records of before it was kept. */
  readonly factor: number | null;
  /** Chance of the finding, 0..1, had this reading not been taken. Null in records of before it was kept. */
  readonly without: number | null;
}

/** Readings that by themselves lead to the same verdict as all of them. */
export interface Carrying {
  /** Codes of the checks, in the order of the vocabulary. */
  readonly checks: readonly string[];
  /** True: no smaller set does. False: none of these can be left out, but a smaller set may exist. */
  readonly smallest: boolean;
}

/** Part of a hypothesis, or a whole one: everything that agrees with what is stated belongs to it. */
export interface Possibility { readonly kind?: Kind; readonly pins?: PinAssignment; readonly fault?: Fault }

/** A check that would tell possibilities apart, with what each of them expects of it, in the order they were given. */
export interface TellingCheck extends NextCheck { readonly reads: readonly Prediction[] }
