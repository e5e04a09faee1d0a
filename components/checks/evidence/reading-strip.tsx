import type { Prediction } from "@/lib/diagnosis";

const WIDTH = 100, PAD = 4;
/** From this ratio of its ends a strip of ohms or hertz is drawn by ratios, as a meter's ranges go. */
const DECADE = 10;

/** Places in the strip, 0 to WIDTH, of a value between the two ends; straight, or by ratios where all is far above zero. */
function scaleFor(values: readonly number[]): (value: number) => number {
  const least = Math.min(...values), most = Math.max(...values);
  const byRatio = least > 0 && most > DECADE * least;
  const at = (value: number) => (byRatio ? Math.log(value) : value);
  const span = at(most) - at(least) || 1;
  return (value) => PAD + (at(value) - at(least)) / span * (WIDTH - 2 * PAD);
}

interface ReadingStripProps { readonly value: number; readonly expected: NonNullable<Prediction["number"]>; readonly agrees: boolean }

/** Where the reading stands beside the range that was expected: a straw band, and a mark whose shape says whether it agrees. Says nothing that the sentence beside it does not. */
export function ReadingStrip({ value, expected: { low, high }, agrees }: ReadingStripProps) {
  const x = scaleFor([value, low, high]), from = x(low), wide = Math.max(2, x(high) - from), at = x(value);
  return (
    <svg aria-hidden="true" viewBox={`0 0 ${WIDTH} 12`} className="h-9 w-full max-w-72 [print-color-adjust:exact]">
      <path d={`M0 8H${WIDTH}`} className="stroke-ink" strokeWidth={0.6} />
      <rect x={from - (wide === 2 ? 1 : 0)} y={5} width={wide} height={6} className="fill-straw stroke-ink" strokeWidth={0.6} />
      {agrees
        ? <path d={`M${at} 0V12`} className="stroke-copper" strokeWidth={1.4} />
        : <path d={`M${at} 4V12M${at - 2.2} 0L${at + 2.2} 4M${at + 2.2} 0L${at - 2.2} 4`} className="fill-none stroke-copper" strokeWidth={1.2} />}
    </svg>
  );
}
