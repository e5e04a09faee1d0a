/** Low and high state of a two-level waveform, in the samples' unit. */
export interface StateLevels { readonly low: number; readonly high: number }

/** Levels a share of the amplitude above the low state. */
export interface ReferenceLevels { readonly proximal: number; readonly mid: number; readonly distal: number }

function fullest(counts: readonly number[], from: number, to: number): number {
  let best = from;
  for (let bin = from; bin <= to; bin += 1) if ((counts[bin] ?? 0) > (counts[best] ?? 0)) best = bin;
  return best;
}

function histogram(samples: readonly number[], low: number, width: number, bins: number): number[] {
  const counts = new Array<number>(bins).fill(0);
  for (const sample of samples) {
    const bin = Math.min(bins - 1, Math.floor((sample - low) / width));
    counts[bin] = (counts[bin] ?? 0) + 1;
  }
  return counts;
}

/**
 * State levels by the histogram's modes (method of IEEE 181): bins between the extremes, split half way, the fullest bin of each half.
 * @param bins number of bins; the levels are known to half a bin.
 * @returns null for fewer than two samples or no swing at all.
 */
export function stateLevels(samples: readonly number[], bins = 100): StateLevels | null {
  const low = samples.reduce((least, sample) => Math.min(least, sample), Infinity);
  const high = samples.reduce((most, sample) => Math.max(most, sample), -Infinity);
  if (samples.length < 2 || !(high > low) || !Number.isFinite(high - low)) return null;
  const width = (high - low) / bins;
  const counts = histogram(samples, low, width, bins);
  const half = Math.floor((bins - 1) / 2);
  const centre = (bin: number) => low + width * (bin + 0.5);
  return { low: centre(fullest(counts, 0, half)), high: centre(fullest(counts, half + 1, bins - 1)) };
}

/** The 10, 50 and 90 % reference levels of IEEE 181. */
export function referenceLevels({ low, high }: StateLevels): ReferenceLevels {
  const at = (share: number) => low + share * (high - low);
  return { proximal: at(0.1), mid: at(0.5), distal: at(0.9) };
}
