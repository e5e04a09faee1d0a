import { ButtonLink } from "@/components/ui";
import type { ConfirmationView } from "@/lib/checks/confirmation-view";
import { findingHeading } from "@/lib/checks/finding-words";

interface OutcomeLineProps {
  readonly inForce: ConfirmationView | null;
  /** May this person record what it was? */
  readonly mayConfirm: boolean;
}

/** Beside the verdict: what it turned out to be, or where to record it. */
export function OutcomeLine({ inForce, mayConfirm }: OutcomeLineProps) {
  if (!inForce && !mayConfirm) return null;
  if (!inForce) return <div className="print:hidden"><ButtonLink href="#outcome">Record what it turned out to be</ButtonLink></div>;
  return (
    <p>
      Turned out to be: <a href="#outcome" className="link inline-flex min-h-touch items-center font-bold">{findingHeading(inForce.finding, inForce.labels)}</a>
    </p>
  );
}
