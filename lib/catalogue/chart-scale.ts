/** A linear axis: round ticks that enclose the data, and where a number falls on it. */
export interface Scale { readonly low: number; readonly high: number; readonly ticks: readonly number[] }

const STEPS = [1, 2, 2.5, 5, 10] as const;

/**
 * Round ticks around a span.
 * @param count about how many intervals are wanted, at least 1
 */
export function scaleOf(low: number, high: number, count: number): Scale {
  const size = high > low ? high - low : Math.max(1, Math.abs(high));
  const rough = size / count;
  const power = 10 ** Math.floor(Math.log10(rough));
  const step = power * (STEPS.find((s) => s * power >= rough * 0.999) ?? 10);
  const first = Math.floor(low / step + 1e-9);
  const last = Math.max(first + 1, Math.ceil(high / step - 1e-9));
  const ticks = Array.from({ length: last - first + 1 }, (_, i) => Number(((first + i) * step).toPrecision(12)));
  return { low: ticks[0] ?? low, high: ticks.at(-1) ?? high, ticks };
}

/** Share of the axis, 0 at its low end and 1 at its high end; outside that for numbers beyond the ends. */
export function shareOf(scale: Scale, value: number): number {
  return (value - scale.low) / (scale.high - scale.low);
}
