import type { Labels } from "@/lib/checks/check-name";
import { checkName, readingWords } from "@/lib/checks/check-name";
import { bearing, BEARING_WORDS, expectedWords, limitWords, type Bearing } from "@/lib/checks/evidence-words";
import { ifFinding } from "@/lib/checks/finding-words";
import type { EvidenceRow, Fault } from "@/lib/diagnosis";

const SHAPES: Readonly<Record<Bearing, string>> = {
  "fits-both": "M4 12H20", "against-sound": "M12 3 21 20H3Z", "against-finding": "M4 4H20V20H4Z", "against-both": "M5 5 19 19M19 5 5 19",
};

/** Shape and word, so that no row is told apart by colour. */
function BearingMark({ kind }: { kind: Bearing }) {
  return (
    <span className="inline-flex items-start gap-2">
      <svg viewBox="0 0 24 24" aria-hidden="true" className="mt-1 size-4 shrink-0 fill-none stroke-ink [stroke-width:3]"><path d={SHAPES[kind]} /></svg>
      {BEARING_WORDS[kind]}
    </span>
  );
}

interface Cell { readonly label: string; readonly text: React.ReactNode; readonly strong?: boolean }

function cellsOf(row: EvidenceRow, findingTitle: string | null): readonly Cell[] {
  return [
    { label: "Reading", text: readingWords(row.check, row.value), strong: true },
    { label: "If sound", text: expectedWords(row.ifSound) },
    ...(findingTitle ? [{ label: `If ${findingTitle}`, text: expectedWords(row.ifFinding) }] : []),
    { label: "Limit of error", text: limitWords(row) },
    ...(findingTitle ? [{ label: "Bearing", text: <BearingMark kind={bearing(row)} /> }] : []),
  ];
}

interface EvidenceTableProps {
  readonly rows: readonly EvidenceRow[];
  readonly labels: Labels;
  /** What the readings are set against; null when only "sound" is left. */
  readonly finding: Fault | null;
}

/** Every reading with what it should be if all is sound, if the finding holds, and what the meter may be out by. */
export function EvidenceTable({ rows, labels, finding }: EvidenceTableProps) {
  if (rows.length === 0) return <p>No reading was taken.</p>;
  const title = finding ? ifFinding(finding, labels) : null;
  const [first] = rows;
  return (
    <div>
      {first ? <DeskHeader labels={cellsOf(first, title).map((cell) => cell.label)} /> : null}
      <ol className="grid">{rows.map((row) => <EvidenceItem key={row.check} row={row} labels={labels} title={title} />)}</ol>
    </div>
  );
}

function EvidenceItem({ row, labels, title }: { row: EvidenceRow; labels: Labels; title: string | null }) {
  return (
    <li className="grid gap-1 border-t border-quiet py-3 first:border-t-2 first:border-rule lg:grid-cols-[minmax(0,1fr)_minmax(0,3fr)] lg:gap-6">
      <h3 className="font-bold">{checkName(row.check, labels)}</h3>
      <dl className="grid grid-cols-2 gap-x-4 gap-y-2 sm:grid-cols-3 lg:grid-cols-[1fr_1.3fr_1.3fr_0.8fr_1.1fr]">
        {cellsOf(row, title).map((cell) => (
          <div key={cell.label} className="min-w-0">
            <dt className="text-quiet lg:sr-only">{cell.label}</dt>
            <dd className={cell.label === "Bearing" ? "" : `font-mono ${cell.strong ? "font-bold text-copper" : ""}`}>{cell.text}</dd>
          </div>
        ))}
      </dl>
    </li>
  );
}

/** On a desk the terms stand once, at the top; each row still carries its own for screen readers. */
function DeskHeader({ labels }: { labels: readonly string[] }) {
  return (
    <div aria-hidden="true" className="hidden gap-6 pb-2 font-bold lg:grid lg:grid-cols-[minmax(0,1fr)_minmax(0,3fr)]">
      <span>Check</span>
      <div className="grid grid-cols-[1fr_1.3fr_1.3fr_0.8fr_1.1fr] gap-x-4">{labels.map((label) => <span key={label} className="self-end">{label}</span>)}</div>
    </div>
  );
}
