import { Button, Notice } from "@/components/ui";
import type { Assessment } from "@/lib/diagnosis";
import { checkWords, type Labels } from "@/lib/checks/check-words";

interface ContradictionBannerProps {
  readonly assessment: Extract<Assessment, { state: "contradictory" }>;
  readonly labels: Labels;
  readonly onAgain: (check: string) => void;
}

/** The readings do not go together: says which one to take again, with a button that leads there. */
export function ContradictionBanner({ assessment, labels, onAgain }: ContradictionBannerProps) {
  const suspect = assessment.suspects[0];
  return (
    <div data-lead-in>
      <Notice tone="ask" title="These readings contradict each other" live="polite">
        {suspect ? (
          <div className="grid gap-2">
            <p>Take this one again: <strong>{checkWords(suspect.check, labels)}</strong>. {suspect.why}</p>
            <Button size="glove" onClick={() => onAgain(suspect.check)}>Take it again</Button>
          </div>
        ) : <p>Take the last readings again; something was measured at another place or in another state than it says.</p>}
      </Notice>
    </div>
  );
}
