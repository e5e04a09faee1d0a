import type { ReactNode } from "react";

/**
 * A chance as people may read it: whole percent, and never a false 0 or 100.
 * @param chance probability, 0..1
 */
export function chanceText(chance: number): string {
  if (chance > 0.99 && chance <= 1) return "> 99 %";
  if (chance < 0.01) return "< 1 %";
  return `${Math.round(chance * 100)} %`;
}

interface ChanceBarProps {
  readonly label: ReactNode;
  /** Probability, 0..1. */
  readonly chance: number;
  readonly note?: ReactNode;
}

/** One possibility with its chance, in words and as a bar. */
export function ChanceBar({ label, chance, note }: ChanceBarProps) {
  const share = Math.min(1, Math.max(0, chance));
  return (
    <div className="grid gap-1">
      <div className="flex items-baseline justify-between gap-3">
        <span className="font-bold">{label}</span>
        <span className="font-mono whitespace-nowrap">{chanceText(share)}</span>
      </div>
      <svg aria-hidden="true" viewBox="0 0 100 4" preserveAspectRatio="none" className="h-3 w-full border border-rule bg-sheet text-bench">
        <rect width={share * 100} height="4" fill="currentColor" />
      </svg>
      {note ? <p className="text-quiet">{note}</p> : null}
    </div>
  );
}
