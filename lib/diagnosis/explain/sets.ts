/** All sets of that many places out of 0 to count - 1, in order: [0, 1], [0, 2], ... */
export function* setsOfSize(count: number, size: number, from = 0): Generator<readonly number[]> {
  if (size === 0) { yield []; return; }
  for (let first = from; first <= count - size; first++) for (const rest of setsOfSize(count, size - 1, first + 1)) yield [first, ...rest];
}

/** How many sets of 1 to `most` members there are among that many: the sum of the binomial coefficients. */
export function countUpTo(count: number, most: number): number {
  let sum = 0, ofSize = 1;
  for (let size = 1; size <= Math.min(most, count); size++) {
    ofSize = ofSize * (count - size + 1) / size;
    sum += ofSize;
  }
  return sum;
}
