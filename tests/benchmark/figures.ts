/** Sum over number; 0 of an empty list. */
export function mean(list: readonly number[]): number {
  return list.length === 0 ? 0 : list.reduce((a, b) => a + b, 0) / list.length;
}

/**
 * Smallest value of the list that at least `share` of the list do not exceed (nearest rank): always a value that was measured.
 * @param share above 0, at most 1; 0.5 is the median
 * @returns 0 of an empty list
 */
export function percentile(list: readonly number[], share: number): number {
  const sorted = [...list].sort((a, b) => a - b);
  return sorted[Math.max(0, Math.ceil(share * sorted.length) - 1)] ?? 0;
}

export interface Point { readonly x: number; readonly y: number }

/** Slope of the least-squares line through the points, in units of y for one of x; 0 where they do not spread in x. */
export function slope(points: readonly Point[]): number {
  const x = mean(points.map((p) => p.x)), y = mean(points.map((p) => p.y));
  const spread = points.reduce((sum, p) => sum + (p.x - x) * (p.x - x), 0);
  return spread === 0 ? 0 : points.reduce((sum, p) => sum + (p.x - x) * (p.y - y), 0) / spread;
}
