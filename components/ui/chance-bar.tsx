import type { ReactNode } from "react";

/**
 * A chance as people may read it: whole percent, and never a false 0 or 100.
 * @param chance probability, 0..1
 */
export function chanceText(chance: number): string {
  if (chance > 0.99 && chance <= 1) return ">\u00a099\u00a0%";
  if (chance < 0.01) return "<\u00a01\u00a0%";
  return `${Math.round(chance * 100)}\u00a0%`;
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
    <div>
      <p className="leading-snug font-bold">{label}</p>
      <p className="flex items-center gap-2"><ChanceFigure chance={share} note={note} /></p>
    </div>
  );
}

/** Bar, words and percent on one line; the columns of several lines stand under each other. */
export function ChanceFigure({ chance, note }: Pick<ChanceBarProps, "chance" | "note">) {
  return (
    <>
      <svg aria-hidden="true" viewBox="0 0 100 4" preserveAspectRatio="none" className="h-2.5 w-0 min-w-0 flex-1 border border-rule bg-sheet text-bench">
        <rect width={chance * 100} height="4" fill="currentColor" />
      </svg>
      {note ? <span className="w-29 text-right leading-tight whitespace-nowrap text-quiet">{note}</span> : null}
      <span className="w-13 text-right font-mono leading-tight font-bold whitespace-nowrap">{chanceText(chance)}</span>
    </>
  );
}
