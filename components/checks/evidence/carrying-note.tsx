import { carryingSentence } from "@/lib/checks/carrying-words";
import { checkName, readingWords, type Labels } from "@/lib/checks/check-name";
import type { Carrying, Reading } from "@/lib/diagnosis";

interface CarryingNoteProps { readonly carrying: Carrying; readonly readings: readonly Reading[]; readonly labels: Labels }

/** The fewest readings that lead to the same verdict: how many, and which. */
export function CarryingNote({ carrying, readings, labels }: CarryingNoteProps) {
  const kept = readings.filter(([check]) => carrying.checks.includes(check));
  return (
    <div>
      <p className="font-bold">{carryingSentence(carrying, readings.length)}</p>
      {kept.length < readings.length ? (
        <ul className="mt-2 grid gap-1">
          {kept.map(([check, value]) => <li key={check} className="flex flex-wrap justify-between gap-x-4 border-t border-quiet py-1"><span>{checkName(check, labels)}</span> <strong className="font-mono">{readingWords(check, value)}</strong></li>)}
        </ul>
      ) : null}
    </div>
  );
}
