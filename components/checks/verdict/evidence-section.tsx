import type { Route } from "next";
import Link from "next/link";
import { chanceText, Sheet } from "@/components/ui";
import type { Labels } from "@/lib/checks/check-name";
import type { CheckView } from "@/lib/checks/check-view";
import { findingHeading } from "@/lib/checks/finding-words";
import { effectiveReadings } from "@/lib/checks/run-state";
import type { Explained, Verdict } from "@/lib/checks/verdict";
import { settledPins } from "@/lib/checks/verdict-sentence";
import { faultId } from "@/lib/diagnosis";
import { CarryingNote, EvidenceList } from "../evidence";

interface EvidenceSectionProps {
  readonly check: CheckView;
  readonly verdict: Verdict;
  /** Id of the finding asked for in the address; any other shows the verdict's own. */
  readonly finding: string | undefined;
}

/** The verdict's reasons: the readings that carry it, and for any finding that is still possible each reading's say. Needs no script. */
export function EvidenceSection({ check, verdict, finding }: EvidenceSectionProps) {
  const labels: Labels = check.setup.cavityLabels, readings = effectiveReadings(check.steps);
  const shown = verdict.explained.find((one) => faultId(one.finding) === finding) ?? verdict.explained[0];
  return (
    <Sheet title="Evidence" id="evidence">
      {verdict.carrying ? <div className="mb-6 max-w-3xl"><CarryingNote carrying={verdict.carrying} readings={readings} labels={labels} /></div> : null}
      {verdict.explained.length > 1 && shown ? <FindingLinks check={check} verdict={verdict} shown={shown} labels={labels} /> : null}
      {shown ? <EvidenceList rows={shown.rows} finding={shown.finding} labels={labels} pins={settledPins(verdict.pins)} /> : <p>No reading was taken.</p>}
    </Sheet>
  );
}

function FindingLinks({ check, verdict, shown, labels }: { readonly check: CheckView; readonly verdict: Verdict; readonly shown: Explained; readonly labels: Labels }) {
  const chance = (id: string) => verdict.faults.find((fault) => faultId(fault) === id)?.p ?? 0;
  return (
    <nav aria-label="Evidence for a finding" className="mb-5 grid gap-2 print:hidden">
      <p>Show the evidence for and against:</p>
      <ul className="flex flex-wrap gap-2">
        {verdict.explained.map(({ finding }) => {
          const id = faultId(finding), current = finding === shown.finding;
          return (
            <li key={id}>
              <Link href={`/checks/${check.id}?finding=${encodeURIComponent(id)}#evidence` as Route} scroll={false} aria-current={current ? "true" : undefined} className={`tag-cut place px-4 py-2 text-left ${current ? "place-current" : "button-plain"}`}>
                <span>{findingHeading(finding, labels)}, <span className="font-mono whitespace-nowrap">{chanceText(chance(id))}</span></span>
              </Link>
            </li>
          );
        })}
      </ul>
    </nav>
  );
}
