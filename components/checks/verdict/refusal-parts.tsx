import { checkName, readingWords } from "@/lib/checks/check-name";
import type { CheckView } from "@/lib/checks/check-view";
import type { Verdict } from "@/lib/checks/verdict";
import { readingSteps } from "@/lib/checks/run-state";

/** What to do where the check names no finding, in order. */
export function RefusalSteps({ refusal }: { readonly refusal: NonNullable<Verdict["refusal"]> }) {
  return <ol className="list-decimal space-y-1.5 pl-7 marker:font-mono">{refusal.next.map((line) => <li key={line}>{line}</li>)}</ol>;
}

/** The readings in the order taken; nothing is expected of them, because no finding is named. */
export function PlainReadings({ check }: { readonly check: CheckView }) {
  return (
    <dl className="grid gap-x-6 gap-y-2 sm:grid-cols-[minmax(0,1fr)_auto]">
      {readingSteps(check.steps).map(({ check: code, value }) => (
        <div key={code} className="border-t border-quiet pt-2 sm:contents">
          <dt>{checkName(code, check.setup.cavityLabels)}</dt>
          <dd className="font-mono font-bold sm:text-right">{readingWords(code, value)}</dd>
        </div>
      ))}
    </dl>
  );
}
