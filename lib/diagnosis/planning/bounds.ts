import { log2 } from "../numerics";

/**
 * Expected length of the best prefix code of the given arity over the weights (Huffman 1952): no sequence of tests with that many
 * outcomes can identify hypotheses of these chances in fewer tests on average.
 */
export function huffmanLength(weights: readonly number[], arity = 2): number {
  const total = weights.reduce((sum, weight) => sum + weight, 0);
  const heap = weights.filter((weight) => weight > 0).sort((a, b) => a - b);
  // Padding so that every merge takes a full set, as the code needs for more than two symbols.
  while (heap.length > 1 && (heap.length - 1) % (arity - 1) !== 0) heap.unshift(0);
  let length = 0;
  while (heap.length > 1) {
    const merged = heap.splice(0, arity).reduce((sum, weight) => sum + weight, 0);
    length += merged;
    const at = heap.findIndex((weight) => weight > merged);
    heap.splice(at < 0 ? heap.length : at, 0, merged);
  }
  return total > 0 ? length / total : 0;
}

/** Shannon's bound: entropy (bits) over what one test with that many outcomes can tell at most. */
export function entropyBound(bits: number, outcomes = 2): number {
  return bits / log2(outcomes);
}
