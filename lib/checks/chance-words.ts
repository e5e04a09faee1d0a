/** From this chance up the word applies; common speech, chosen so that "almost sure" is right at least 19 times in 20. */
const WORDS = [
  [0.95, "almost sure"], [0.7, "likely"], [0.3, "quite possible"], [0.05, "possible"], [0.01, "unlikely"],
] as const satisfies readonly (readonly [number, string])[];

/**
 * A chance in words, never surer than the evidence.
 * @param chance probability, 0..1
 */
export function chanceWords(chance: number): string {
  return WORDS.find(([from]) => chance >= from)?.[1] ?? "almost ruled out";
}
