import type { Carrying, TellingCheck } from "@/lib/diagnosis";

const NUMBERS = ["no", "one", "two", "three", "four", "five", "six", "seven", "eight", "nine", "ten", "eleven", "twelve"] as const;

/** Small numbers in words, as a sentence has them. */
const numberWords = (n: number): string => NUMBERS[n] ?? String(n);

/**
 * What the readings that carry a verdict are, in one sentence, e.g. "These three of the eleven readings alone carry the verdict;
 * no fewer do." Where a smaller set was not looked for to the end, it only says that none of them can be left out.
 * @param total readings taken, from 1
 */
export function carryingSentence({ checks, smallest }: Carrying, total: number): string {
  const count = checks.length;
  if (count === total) return total === 1 ? "The verdict rests on this one reading." : `The verdict needs every one of its ${numberWords(total)} readings.`;
  if (count === 1) return `This one of the ${numberWords(total)} readings alone carries the verdict.`;
  return `These ${numberWords(count)} of the ${numberWords(total)} readings alone carry the verdict; ${smallest ? "no fewer do" : "none of them can be left out"}.`;
}

/** From so many of the one bit that is open between two: settles it; helps. Below, it only leans one way. */
export const SETTLES = 0.7;
const HELPS = 0.3;

/** How much a check would do to tell two things apart, in words. */
export function tellingWords({ gainBits }: Pick<TellingCheck, "gainBits">): string {
  if (gainBits >= SETTLES) return "would settle it";
  return gainBits >= HELPS ? "would help" : "would help a little";
}
