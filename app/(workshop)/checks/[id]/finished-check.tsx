import { ApartSection, AttachMachine, CheckFacts, VerdictButtons, VerdictView } from "@/components/checks/verdict";
import { ButtonLink, EmptyState, PageHeading, Sheet } from "@/components/ui";
import { hasPermission, type Person } from "@/lib/auth/permissions";
import type { CheckView } from "@/lib/checks/check-view";
import { machineChoices } from "@/lib/checks/log-choices";
import { chosenPair, possibilityChoices } from "@/lib/checks/possibilities";
import { tellTwoApart } from "@/lib/checks/tell-two-apart";
import { Outcome, OutcomeOfVerdict } from "./outcome";
import { attachMachineAction, recheckAction } from "./verdict-actions";

/** What the address asks to be shown of a verdict; anything unknown is passed over. */
export interface Asked { readonly finding?: string; readonly one?: string; readonly other?: string }

interface FinishedCheckProps {
  readonly check: CheckView;
  /** Already authorised to read this check by the page. */
  readonly person: Person;
  readonly asked: Asked;
}

/** A finished check, read-only: its verdict, and what can be done after it. */
export async function FinishedCheck({ check, person, asked }: FinishedCheckProps) {
  if (!check.verdict) return <Abandoned check={check} />;
  const mayRun = hasPermission(person, "check:run");
  const mayAttach = mayRun && (check.person.id === person.id || hasPermission(person, "machine:edit"));
  const machines = mayAttach ? await machineChoices(person) : [], { confirmations } = check;
  const comparable = check.recheckOf !== null || check.rechecks.length > 0;
  return (
    <>
      <PageHeading title={check.recheckOf ? "Verdict of the re-check" : "Verdict"} />
      <VerdictView
        check={check} finding={asked.finding} apart={<TwoApart check={check} asked={asked} />}
        actions={<><VerdictButtons checkId={check.id} mayRun={mayRun} comparable={comparable} recheck={recheckAction} /><OutcomeOfVerdict check={check} person={person} confirmations={confirmations} /></>}
      />
      <div className="mt-6 grid grid-cols-1 gap-6">
        <Outcome check={check} verdict={check.verdict} person={person} confirmations={confirmations} />
        <Sheet title="This check">
          <CheckFacts check={check} />
          {mayAttach ? <div className="mt-5"><AttachMachine checkId={check.id} machines={machines} current={check.machine?.id ?? null} attach={attachMachineAction} /></div> : null}
        </Sheet>
      </div>
    </>
  );
}

/** The two possibilities that the address names, set apart by the engine now; what the verdict says of them does not change. */
function TwoApart({ check, asked }: { readonly check: CheckView; readonly asked: Asked }) {
  if (!check.verdict || check.verdict.contradictory) return null;
  const choices = possibilityChoices(check.verdict, check.setup.cavityLabels), pair = chosenPair(choices, [asked.one, asked.other]);
  return <ApartSection checkId={check.id} choices={choices} apart={pair ? { pair, checks: tellTwoApart(check, pair) } : null} finding={asked.finding} labels={check.setup.cavityLabels} />;
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
