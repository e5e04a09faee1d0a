import { checkName, readingWords, type Labels } from "@/lib/checks/check-name";
import { evidencePhrases, expectedWords, fits, limitWords, movement } from "@/lib/checks/evidence-words";
import { findingClause } from "@/lib/checks/finding-words";
import type { EvidenceRow, Fault, PinAssignment } from "@/lib/diagnosis";
import { MovementMark } from "./movement-mark";
import { ReadingStrip } from "./reading-strip";

interface EvidenceListProps {
  readonly rows: readonly EvidenceRow[];
  readonly finding: Fault;
  readonly labels: Labels;
  /** Only where the pins are settled; then their roles are named. */
  readonly pins: PinAssignment | null;
}

/** The evidence for and against one finding, a reading an item: what was read, what it should have been, how far off, and what that did. */
export function EvidenceList({ rows, finding, labels, pins }: EvidenceListProps) {
  if (rows.length === 0) return <p>No reading was taken.</p>;
  return (
    <div>
      <p className="mb-3 max-w-prose">If {findingClause(finding, labels, pins)}, given the other readings each time:</p>
      <ol className="grid">{rows.map((row) => <Item key={row.check} row={row} labels={labels} sound={finding.code !== "none"} />)}</ol>
    </div>
  );
}

function Item({ row, labels, sound }: { readonly row: EvidenceRow; readonly labels: Labels; readonly sound: boolean }) {
  const [expected, moved] = evidencePhrases(row);
  const number = typeof row.value === "number" ? row.ifFinding.number : null;
  return (
    <li className="grid gap-x-8 gap-y-1 border-t border-quiet py-4 first:border-t-2 first:border-rule lg:grid-cols-[minmax(0,2fr)_minmax(0,3fr)] print:break-inside-avoid">
      <div>
        <h3 className="leading-snug font-bold">{checkName(row.check, labels)}</h3>
        <p className="font-mono"><span className="text-2xl font-bold text-copper">{readingWords(row.check, row.value)}</span> {row.limit === null ? null : <span className="whitespace-nowrap text-quiet">{limitWords(row)}</span>}</p>
      </div>
      <div className="grid gap-1">
        <p>{expected}</p>
        {number && typeof row.value === "number" ? <ReadingStrip value={row.value} expected={number} agrees={fits(row.ifFinding, row.value, row.limit)} /> : null}
        {moved ? <p className={`flex gap-2 ${movement(row) === "neither" ? "" : "font-bold"}`}><MovementMark kind={movement(row)} /><span>{moved}</span></p> : null}
        {sound ? <p className="text-quiet">If all is sound: {expectedWords(row.ifSound)}.</p> : null}
      </div>
    </li>
  );
}
