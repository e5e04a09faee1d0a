import { checkName, readingWords } from "@/lib/checks/check-name";
import type { CheckView } from "@/lib/checks/check-view";
import { evidencePhrases, expectedWords, limitWords, movement } from "@/lib/checks/evidence-words";
import { ifFinding } from "@/lib/checks/finding-words";
import { readingSteps, skipSteps } from "@/lib/checks/run-state";
import type { SkipReason } from "@/lib/checks/run";
import type { Verdict } from "@/lib/checks/verdict";
import type { Labels } from "@/lib/checks/check-name";
import { settledPins } from "@/lib/checks/verdict-sentence";
import type { EvidenceRow, Fault } from "@/lib/diagnosis";
import { EvidenceList, MovementMark } from "../evidence";

const REASONS: Readonly<Record<SkipReason, string>> = {
  "cannot-reach": "cannot be reached", "not-safe-here": "not safe here", "no-function-on-meter": "the meter has no such function",
  "cannot-part-connector": "the connector cannot be parted", "cannot-move-actuator": "the actuator cannot be moved", other: "another reason",
};

const SOUND: Fault = { code: "none" };
const TH = "px-1.5 py-1 text-left align-bottom font-bold first:pl-0";
const TD = "px-1.5 py-1.5 align-top first:pl-0";

/** Readings in the order taken, with limits of error, what was expected of each, how far off it was and what that did, as the verdict shows them. */
export function ReportReadings({ check, verdict }: { readonly check: CheckView; readonly verdict: Verdict }) {
  const labels = check.setup.cavityLabels;
  const order = new Map(readingSteps(check.steps).map((step, index) => [step.check, index]));
  const rows = [...verdict.evidence].sort((a, b) => (order.get(a.check) ?? 0) - (order.get(b.check) ?? 0));
  const finding = verdict.evidenceFinding ?? SOUND;
  return (
    <>
      {/* The columns do not fit a phone: there each reading stands by itself, as on the verdict. */}
      <div className="sm:hidden print:hidden"><EvidenceList rows={rows} labels={labels} finding={finding} pins={settledPins(verdict.pins)} /></div>
      <ReadingsTable rows={rows} labels={labels} finding={finding} />
    </>
  );
}

interface ReadingsTableProps { readonly rows: readonly EvidenceRow[]; readonly labels: Labels; readonly finding: Fault }

/** The readings as they are printed. */
function ReadingsTable({ rows, labels, finding }: ReadingsTableProps) {
  const beside = finding.code !== "none";
  return (
    <div role="region" aria-label="Readings and evidence" tabIndex={0} className="hidden overflow-x-auto sm:block print:block print:overflow-visible">
      <table className="w-full min-w-[44rem] border-collapse print:min-w-0 print:text-[9.5pt]">
        <thead>
          <tr className="border-b-2 border-ink">
            <th scope="col" className={TH}>Reading</th><th scope="col" className={TH}>Taken</th><th scope="col" className={TH}>If {ifFinding(finding, labels)}</th>
            {beside ? <th scope="col" className={TH}>If all is sound</th> : null}
          </tr>
        </thead>
        <tbody>{rows.map((row) => <ReadingRow key={row.check} row={row} labels={labels} beside={beside} />)}</tbody>
      </table>
    </div>
  );
}

function ReadingRow({ row, labels, beside }: { readonly row: EvidenceRow; readonly labels: Labels; readonly beside: boolean }) {
  const [expected, moved] = evidencePhrases(row);
  return (
    <tr className="break-inside-avoid border-b border-quiet">
      <th scope="row" className={`${TD} w-[26%] text-left font-normal`}>{checkName(row.check, labels)}</th>
      <td className={`${TD} font-mono`}><span className="font-bold whitespace-nowrap">{readingWords(row.check, row.value)}</span>{row.limit === null ? null : <span className="block whitespace-nowrap text-quiet">{limitWords(row)}</span>}</td>
      <td className={TD}>{expected}{moved ? <span className={`mt-0.5 flex gap-1.5 ${movement(row) === "neither" ? "" : "font-bold"}`}><MovementMark kind={movement(row)} /><span>{moved}</span></span> : null}</td>
      {beside ? <td className={`${TD} w-[18%] font-mono`}>{expectedWords(row.ifSound)}</td> : null}
    </tr>
  );
}

/** Checks that could not be made, with the reasons given; nothing when all asked for were made. */
export function ReportSkips({ check }: { readonly check: CheckView }) {
  const skips = skipSteps(check.steps);
  if (skips.length === 0) return null;
  return (
    <>
      <h3 className="mt-4 font-bold">Not taken</h3>
      <ul className="list-disc pl-6">
        {skips.map((step) => <li key={step.id}>{checkName(step.check, check.setup.cavityLabels)}: {REASONS[step.reason]}{step.note ? ` (${step.note})` : ""}.</li>)}
      </ul>
    </>
  );
}
