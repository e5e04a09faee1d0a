import { tellingWords } from "@/lib/checks/carrying-words";
import { checkName, type Labels } from "@/lib/checks/check-name";
import { expectedWords } from "@/lib/checks/evidence-words";
import type { TellingCheck } from "@/lib/diagnosis";

interface TellingListProps {
  readonly checks: readonly TellingCheck[];
  /** What is told apart, in words, in the order of each check's `reads`. */
  readonly names: readonly string[];
  readonly labels: Labels;
}

/** The readings that would tell possibilities apart, with what each of them would read; or that nothing will. */
export function TellingList({ checks, names, labels }: TellingListProps) {
  if (checks.length === 0) return <p className="font-bold">Nothing that a meter can do will tell these apart.</p>;
  return (
    <ol className="grid">
      {checks.map((check) => (
        <li key={check.check} className="grid gap-1 border-t border-quiet py-3 first:border-t-2 first:border-rule">
          <h3 className="leading-snug font-bold">{checkName(check.check, labels)}</h3>
          <p className="text-quiet">It {tellingWords(check)}.</p>
          <dl className="grid gap-x-8 gap-y-2 sm:grid-cols-2">
            {check.reads.map((read, index) => (
              <div key={names[index]} className="min-w-0"><dt>If {names[index]}</dt><dd className="font-mono text-lg font-bold text-copper">{expectedWords(read)}</dd></div>
            ))}
          </dl>
        </li>
      ))}
    </ol>
  );
}
