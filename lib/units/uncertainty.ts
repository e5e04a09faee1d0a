/** A maker's limits for a display: percent of the reading plus counts of the last digit. */
export interface DisplayLimit { readonly percent: number; readonly counts: number; readonly resolution: number }

/** Limit of error at a reading, in the reading's unit. */
export function limitOfError(limit: DisplayLimit, reading: number): number {
  return (Math.abs(reading) * limit.percent) / 100 + limit.counts * limit.resolution;
}

export type Shape = "rectangular" | "triangular";

/** Standard uncertainty of limits ±a taken as equally likely between them, or peaked in the middle (JCGM 100:2008, 4.3.7 and 4.3.9). */
export function standardUncertainty(halfWidth: number, shape: Shape = "rectangular"): number {
  return halfWidth / Math.sqrt(shape === "rectangular" ? 3 : 6);
}

/** One input of a budget: its standard uncertainty and how far the result moves with it. */
export interface Contribution { readonly u: number; readonly sensitivity?: number }

/**
 * Combined standard uncertainty (JCGM 100:2008, 5.1.2; 5.2.2 with correlations).
 * @param correlation coefficient of inputs i and j, -1..1; independent when absent.
 */
export function combinedUncertainty(inputs: readonly Contribution[], correlation: (i: number, j: number) => number = () => 0): number {
  const parts = inputs.map(({ u, sensitivity = 1 }) => u * sensitivity);
  let variance = 0;
  parts.forEach((a, i) => parts.forEach((b, j) => { variance += a * b * (i === j ? 1 : correlation(i, j)); }));
  return Math.sqrt(Math.max(0, variance));
}

/** Coverage factor for 95 % when one rectangular contribution dominates (EA-4/02, example S9): 0.95 of the half-width. */
export const DOMINANT_RECTANGULAR_K = 0.95 * Math.sqrt(3);
