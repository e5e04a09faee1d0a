import { ALL_CHECKS } from "../checks";
import { unscale } from "../inference/observe";
import type { Outlook } from "../inference/outlook";
import type { CheckSpec, Prediction, SymbolValue } from "../types";

/** Half-width of the band that holds 95 % of a normal distribution, standard deviations. */
const NINETY_FIVE = 1.96;
/** A word less likely than this is not said to be expected. */
const WORTH_SAYING = 0.02;
/** Share of the possibility that its band has to cover. */
const COVERED = 0.95;

/** One way a possibility may be built, its share of it (0..1) and what it expects. Likeliest first. */
export interface Piece { readonly p: number; readonly outlook: Outlook }

const likely = (list: readonly (readonly [SymbolValue, number])[]) => list.filter(([, p]) => p >= WORTH_SAYING).map(([word, p]) => ({ word, p })).sort((a, b) => b.p - a.p);

/**
 * What one check should read under a possibility: words with their chances, and the band that holds 95 %. Where the
 * possibility can be built in several ways the band spans those that make up 95 % of it; its middle is the likeliest one's.
 */
export function predictionOf(pieces: readonly Piece[], index: number): Prediction {
  const spec = ALL_CHECKS[index]!, check = spec.code, whole = pieces.reduce((sum, { p }) => sum + p, 0);
  const mean = (of: (o: Outlook) => number) => pieces.reduce((sum, { p, outlook }) => sum + p * of(outlook), 0) / whole;
  const word = mean((o) => o.word[index]!), jumps = mean((o) => o.jumps[index]!);
  if (spec.meter === "watch") return { check, number: null, words: likely([["still", word], ["jumps", jumps], ["smooth", 1 - word - jumps]]) };
  if (spec.meter === "grip") return { check, number: null, words: likely([["loose", word], ["grips", 1 - word]]) };
  const words = spec.words.length > 0 ? likely([[spec.words[0]!, word]]) : [];
  return { check, words, number: word > 0.5 ? null : bandOf(spec, index, pieces.filter(({ outlook }) => outlook.word[index]! <= 0.5)) };
}

function bandOf(spec: CheckSpec, index: number, numeric: readonly Piece[]): Prediction["number"] {
  const whole = numeric.reduce((sum, { p }) => sum + p, 0);
  let low = Infinity, high = -Infinity, covered = 0;
  for (const { p, outlook } of numeric) {
    if (covered >= COVERED * whole) break;
    const reach = NINETY_FIVE * outlook.sd[index]!;
    low = Math.min(low, outlook.mean[index]! - reach);
    high = Math.max(high, outlook.mean[index]! + reach);
    covered += p;
  }
  return { low: unscale(spec, low), middle: unscale(spec, numeric[0]!.outlook.mean[index]!), high: unscale(spec, high) };
}
