import type { Route } from "next";
import Link from "next/link";
import { OutcomeBoard, OutcomeLine, outcomeGroups } from "@/components/checks/outcome";
import { hasPermission, type Person } from "@/lib/auth/permissions";
import type { CheckView } from "@/lib/checks/check-view";
import type { ConfirmationView } from "@/lib/checks/confirmation-view";
import type { Verdict } from "@/lib/checks/verdict";
import { SURE } from "@/lib/checks/verdict-sentence";
import { withdrawAction } from "../withdraw-action";
import { confirmAction } from "./outcome-actions";

interface OutcomeProps {
  readonly check: CheckView;
  readonly verdict: Verdict;
  /** Already authorised to read this check by the page. */
  readonly person: Person;
  readonly confirmations: readonly ConfirmationView[];
}

const mayConfirm = (check: CheckView, person: Person) => check.recheckOf === null
  && hasPermission(person, "check:confirm") && (check.person.id === person.id || hasPermission(person, "check:confirm-any"));

/** The kind, where an entry names it or the verdict holds it for a fact. */
function settledKind({ check, verdict }: Pick<OutcomeProps, "check" | "verdict">): string {
  const [best] = verdict.kinds;
  return check.setup.expect?.kind ?? (best && best.p >= SURE && !verdict.contradictory ? best.kind : "");
}

function Instead({ check }: { readonly check: CheckView }) {
  if (!check.recheckOf) return <p>Nothing is recorded yet. Whoever made the check records it after the repair, or an editor or trainer.</p>;
  return <p>A re-check proves the repair. <Link href={`/checks/${check.recheckOf}#outcome` as Route} className="link">Record what it was on the first run.</Link></p>;
}

/** Beside the verdict's buttons: what it turned out to be, in a line. */
export function OutcomeOfVerdict({ check, person, confirmations }: Pick<OutcomeProps, "check" | "person" | "confirmations">) {
  return <OutcomeLine inForce={confirmations.find((one) => !one.withdrawn) ?? null} mayConfirm={mayConfirm(check, person)} />;
}

/** What the check turned out to be, with its form for those who may record it. */
export function Outcome({ check, verdict, person, confirmations }: OutcomeProps) {
  return (
    <OutcomeBoard
      checkId={check.id} confirmations={confirmations} mayConfirm={mayConfirm(check, person)}
      groups={outcomeGroups(verdict, check.setup.cavityLabels)} kind={settledKind({ check, verdict })}
      confirm={confirmAction} withdraw={withdrawAction} instead={<Instead check={check} />}
    />
  );
}
