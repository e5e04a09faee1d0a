import type { Route } from "next";
import { ButtonLink, Sheet } from "@/components/ui";
import { checkName, readingWords, type Labels } from "@/lib/checks/check-name";
import type { CheckView } from "@/lib/checks/check-view";
import type { Change, CompareRow } from "@/lib/checks/compare-rows";
import { momentWords } from "@/lib/checks/date-words";
import { expectedWords, fits } from "@/lib/checks/evidence-words";

const CHANGES: Readonly<Record<Change, { readonly word: string; readonly shape: string }>> = {
  changed: { word: "Changed", shape: "M12 3 21 12 12 21 3 12Z" },
  same: { word: "Same, within limits of error", shape: "M4 9H20M4 15H20" },
  "only-one": { word: "Taken once only", shape: "M4 12H10M14 12H20" },
};

function Run({ title, check }: { readonly title: string; readonly check: CheckView }) {
  return (
    <Sheet title={title} actions={<ButtonLink href={`/checks/${check.id}` as Route}>Open</ButtonLink>}>
      <p className="text-quiet">{check.person.name}, {momentWords(check.finishedAt ?? check.startedAt)}</p>
      <p className="mt-2 text-xl leading-snug font-bold">{check.verdict?.sentence ?? "Still running: no verdict yet."}</p>
    </Sheet>
  );
}

function ChangeMark({ change }: { readonly change: Change }) {
  const { word, shape } = CHANGES[change];
  return (
    <p className={`inline-flex items-start gap-2 self-start justify-self-start ${change === "changed" ? "bg-straw px-2 font-bold text-on-straw" : ""}`}>
      <svg viewBox="0 0 24 24" aria-hidden="true" className="mt-1 size-4 shrink-0 fill-none stroke-current [stroke-width:3]"><path d={shape} /></svg>
      {word}
    </p>
  );
}

function Sound({ row }: { readonly row: CompareRow }) {
  if (!row.ifSound) return <dd>not predicted</dd>;
  const fit = row.after === null ? null : fits(row.ifSound, row.after, row.afterLimit);
  return (
    <dd>
      <span className="font-mono">{expectedWords(row.ifSound)}</span>
      {fit === true ? <span className="block">it fits</span> : null}
      {fit === false ? <span className="block font-bold"><span aria-hidden="true">▲ </span>it does not fit</span> : null}
    </dd>
  );
}

function Reading({ row, labels }: { readonly row: CompareRow; readonly labels: Labels }) {
  const shown = (value: CompareRow["before"]) => (value === null ? "not taken" : readingWords(row.check, value));
  return (
    <li className="grid gap-2 border-t border-quiet py-3 first:border-t-2 first:border-rule lg:grid-cols-[minmax(0,1.3fr)_minmax(0,3fr)] lg:gap-6 print:break-inside-avoid">
      <h3 className="font-bold">{checkName(row.check, labels)}</h3>
      <div className="grid gap-2 sm:grid-cols-[minmax(0,3fr)_minmax(0,1fr)] sm:gap-6">
        <dl className="grid grid-cols-2 gap-x-4 gap-y-2 sm:grid-cols-[1fr_1fr_1.6fr]">
          <div><dt className="text-quiet">Before</dt><dd className="font-mono font-bold">{shown(row.before)}</dd></div>
          <div><dt className="text-quiet">After</dt><dd className="font-mono font-bold text-copper">{shown(row.after)}</dd></div>
          <div className="col-span-2 sm:col-span-1"><dt className="text-quiet">If sound</dt><Sound row={row} /></div>
        </dl>
        <ChangeMark change={row.change} />
      </div>
    </li>
  );
}

function changedWords(changed: number, both: number): string {
  if (both === 0) return "No reading was taken in both runs yet.";
  if (changed === 0) return `No reading changed by more than the meter may be out; ${both === 1 ? "1 was" : `${both} were`} taken in both runs.`;
  return `${changed} of ${both} readings taken in both runs changed by more than the meter may be out.`;
}

interface CompareViewProps { readonly first: CheckView; readonly second: CheckView; readonly rows: readonly CompareRow[] }

/** Two runs side by side: the verdicts, then each reading before and after with what it should be if all is sound. */
export function CompareView({ first, second, rows }: CompareViewProps) {
  const changed = rows.filter((row) => row.change === "changed").length;
  const both = rows.filter((row) => row.change !== "only-one").length;
  return (
    <div className="grid gap-6">
      <div className="grid items-start gap-6 md:grid-cols-2">
        <Run title="First run" check={first} />
        <Run title="Re-check" check={second} />
      </div>
      <Sheet title="Readings">
        <p className="mb-3">{changedWords(changed, both)}</p>
        <ol className="grid">{rows.map((row) => <Reading key={row.check} row={row} labels={first.setup.cavityLabels} />)}</ol>
      </Sheet>
    </div>
  );
}
