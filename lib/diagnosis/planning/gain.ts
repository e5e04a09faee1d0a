import type { Compiled } from "./compile";
import { log2 } from "../numerics";

/** Shannon entropy of chances that sum to 1, bits. */
export function entropyBits(chances: ArrayLike<number>): number {
  let bits = 0;
  for (let i = 0; i < chances.length; i += 1) {
    const p = chances[i]!;
    if (p > 0) bits -= p * log2(p);
  }
  return bits;
}

/** Chances of a test's outcomes under the belief, written to `into`. */
export function outcomeChances(c: Compiled, test: number, belief: Float64Array, into: Float64Array): void {
  const count = c.outcomes[test]!;
  into.fill(0, 0, count);
  let at = c.offset[test]!;
  for (let h = 0; h < c.size; h += 1, at += count) {
    const p = belief[h]!;
    if (p === 0) continue;
    for (let o = 0; o < count; o += 1) into[o]! += p * c.chance[at + o]!;
  }
}

/** Expected information of a test about the hypotheses, bits: H(outcome) - H(outcome given the hypothesis). Leaves the outcomes' chances in `scratch`. */
export function gainBits(c: Compiled, test: number, belief: Float64Array, scratch: Float64Array): number {
  outcomeChances(c, test, belief, scratch);
  let bits = 0;
  for (let o = 0; o < c.outcomes[test]!; o += 1) {
    const p = scratch[o]!;
    if (p > 0) bits -= p * log2(p);
  }
  for (let h = 0; h < c.size; h += 1) bits -= belief[h]! * c.noise[test * c.size + h]!;
  return Math.max(0, bits);
}

/** Belief after an outcome of chance `p`, by Bayes' rule, written to `into`. */
export function update(c: Compiled, test: number, outcome: number, p: number, belief: Float64Array, into: Float64Array): void {
  const count = c.outcomes[test]!;
  let at = c.offset[test]! + outcome;
  for (let h = 0; h < c.size; h += 1, at += count) into[h] = (belief[h]! * c.chance[at]!) / p;
}

/** Chance of the likeliest hypothesis. */
export function surest(belief: Float64Array): number {
  let most = 0;
  for (let h = 0; h < belief.length; h += 1) if (belief[h]! > most) most = belief[h]!;
  return most;
}
