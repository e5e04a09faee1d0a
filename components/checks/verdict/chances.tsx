import { ChanceBar } from "@/components/ui";
import type { Labels } from "@/lib/checks/check-name";
import { chanceWords } from "@/lib/checks/chance-words";
import { findingHeading, KIND_TITLES } from "@/lib/checks/finding-words";
import { OTHER_SHORT } from "@/lib/checks/refusal";
import type { Verdict } from "@/lib/checks/verdict";
import { markLetter } from "./wiring-sketch";

/** Below this chance a possibility is counted, not listed. */
const SHOWN_FROM = 0.01;

function Rest({ count }: { count: number }) {
  return count > 0 ? <p className="text-quiet">{count === 1 ? "One more possibility has" : `${count} more possibilities have`} less than 1 % each.</p> : null;
}

/** The kinds with their chances, in words and bars. */
export function KindChances({ verdict: { kinds, others } }: { verdict: Pick<Verdict, "kinds" | "others"> }) {
  const shown = others.filter(({ p }) => p >= SHOWN_FROM);
  return (
    <div className="grid gap-4">
      {shown.map(({ device, p }) => <ChanceBar key={device} label={`Not one of the three: ${OTHER_SHORT[device]}`} chance={p} note={chanceWords(p)} />)}
      {kinds.map(({ kind, p }) => <ChanceBar key={kind} label={KIND_TITLES[kind]} chance={p} note={chanceWords(p)} />)}
    </div>
  );
}

/** The findings with their chances; those that are still open carry the letter of their mark on the drawing. */
export function FindingChances({ verdict, labels }: { verdict: Verdict; labels: Labels }) {
  const shown = verdict.faults.filter((fault, index) => index === 0 || fault.p >= SHOWN_FROM);
  const open = verdict.openFindings.map((fault) => findingHeading(fault, labels));
  return (
    <div className="grid gap-4">
      {shown.map((fault) => {
        const heading = findingHeading(fault, labels);
        const at = open.indexOf(heading);
        const label = at >= 0 && fault.code !== "none" ? <><MarkLetter index={at} /> {heading}</> : heading;
        return <ChanceBar key={heading} label={label} chance={fault.p} note={chanceWords(fault.p)} />;
      })}
      <Rest count={verdict.faults.length - shown.length} />
    </div>
  );
}

/** The letter of a mark on the drawing, as it stands in running text. */
export function MarkLetter({ index }: { index: number }) {
  return <span className="inline-block border-2 border-ink bg-straw px-1.5 font-mono leading-6 text-on-straw [print-color-adjust:exact]">{markLetter(index)}</span>;
}
