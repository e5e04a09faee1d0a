import { AttachMachine, CheckFacts, VerdictButtons, VerdictView } from "@/components/checks/verdict";
import { ButtonLink, EmptyState, PageHeading, Sheet } from "@/components/ui";
import { hasPermission, type Person } from "@/lib/auth/permissions";
import type { CheckView } from "@/lib/checks/check-view";
import { machineChoices } from "@/lib/checks/log-choices";
import { attachMachineAction, recheckAction } from "./verdict-actions";

interface FinishedCheckProps {
  readonly check: CheckView;
  /** Already authorised to read this check by the page. */
  readonly person: Person;
}

/** A finished check, read-only: its verdict, and what can be done after it. */
export async function FinishedCheck({ check, person }: FinishedCheckProps) {
  if (!check.verdict) return <Abandoned check={check} />;
  const mayRun = hasPermission(person, "check:run");
  const mayAttach = mayRun && (check.person.id === person.id || hasPermission(person, "machine:edit"));
  const machines = mayAttach ? await machineChoices(person) : [];
  const comparable = check.recheckOf !== null || check.rechecks.length > 0;
  return (
    <>
      <PageHeading title={check.recheckOf ? "Verdict of the re-check" : "Verdict"} />
      <VerdictView check={check} actions={<VerdictButtons checkId={check.id} mayRun={mayRun} comparable={comparable} recheck={recheckAction} />} />
      <div className="mt-6">
        <Sheet title="This check">
          <CheckFacts check={check} />
          {mayAttach ? <div className="mt-5"><AttachMachine checkId={check.id} machines={machines} current={check.machine?.id ?? null} attach={attachMachineAction} /></div> : null}
        </Sheet>
      </div>
    </>
  );
}

function Abandoned({ check }: { readonly check: CheckView }) {
  return (
    <>
      <PageHeading title="Abandoned check" />
      <EmptyState title="No verdict was reached" action={<ButtonLink href="/checks" tone="main">Back to the log</ButtonLink>}>Its readings stay on record. Start a new check to go on.</EmptyState>
      <div className="mt-6"><Sheet title="This check"><CheckFacts check={check} /></Sheet></div>
    </>
  );
}
