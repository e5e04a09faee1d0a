import type { Assessment } from "@/lib/diagnosis";
import { ChanceFigure, chanceText } from "@/components/ui";
import { chanceWords } from "@/lib/checks/chance-words";
import type { Labels } from "@/lib/checks/check-words";
import { findingHeading, kindTitle } from "@/lib/checks/finding-words";
import { ABOVE_LIMITS, OTHER_SHORT, refusalOf } from "@/lib/checks/refusal";

interface LineProps { readonly name: string; readonly chance: number }

/** Name in full, then a bar with the chance in words and percent. */
function Line({ name, chance }: LineProps) {
  return (
    <span className="block">
      <span className="block leading-tight font-bold">{name}</span>
      <span className="flex items-center gap-2 leading-tight"><ChanceFigure chance={chance} note={chanceWords(chance)} /></span>
    </span>
  );
}

/** Stands where the finding would: nothing is worth believing while the readings do not go together. */
function Contradiction() {
  return <span className="block bg-straw px-1.5 py-0.5 leading-tight font-bold text-on-straw"><span aria-hidden="true">▲ </span>The readings contradict each other</span>;
}

/** The kind in force, or what it is instead of the three. */
function leading({ kinds, others }: Pick<Extract<Assessment, { kinds: unknown }>, "kinds" | "others">): LineProps | null {
  const [kind, other] = [kinds[0], others[0]];
  if (other && other.p > (kind?.p ?? 0)) return { name: `Not one of the three: ${OTHER_SHORT[other.device]}`, chance: other.p };
  return kind ? { name: kindTitle(kind.kind), chance: kind.p } : null;
}

/** Nothing is worth believing above the limits. */
function Stopped() {
  return <span className="block bg-stop px-1.5 py-1 leading-tight font-bold text-on-stop"><span aria-hidden="true">■ </span>{ABOVE_LIMITS}</span>;
}

/** The standing in one sentence, for the live region. */
export function standingSentence(assessment: Assessment | null, labels: Labels): string {
  if (!assessment || assessment.state === "invalid-input") return "";
  if (assessment.overLimit) return ABOVE_LIMITS;
  const kind = leading(assessment), fault = refusalOf(assessment) ? undefined : assessment.faults[0];
  const parts = [
    kind ? `${kind.name} ${chanceWords(kind.chance)}, ${chanceText(kind.chance)}` : null,
    fault ? `${findingHeading(fault, labels)} ${chanceWords(fault.p)}, ${chanceText(fault.p)}` : null,
  ].filter((part) => part !== null);
  return parts.length > 0 ? `Standing: ${parts.join("; ")}.` : "";
}

interface StandingStripProps {
  readonly assessment: Assessment | null;
  readonly working: boolean;
  readonly labels: Labels;
  readonly open: boolean;
  readonly onToggle: () => void;
}

/** What is believed so far, always in sight; pressing it opens all of it. */
export function StandingStrip({ assessment, working, labels, open, onToggle }: StandingStripProps) {
  const standing = assessment && assessment.state !== "invalid-input" ? assessment : null;
  const kind = standing ? leading(standing) : null, refusal = standing ? refusalOf(standing) : null, fault = refusal ? undefined : standing?.faults[0];
  const contradictory = standing?.state === "contradictory";
  return (
    <button
      type="button" aria-expanded={open} aria-controls="standing-details" onClick={onToggle}
      className="grid min-h-glove w-full cursor-pointer grid-cols-[minmax(0,1fr)_auto] items-center gap-3 border-b-2 border-rule bg-paper py-1.5 text-left hover:bg-(--hover)"
    >
      <span className="grid min-w-0 grid-cols-1 gap-1">
        {standing?.overLimit ? <Stopped /> : kind ? <Line {...kind} /> : <span className="font-bold">Standing</span>}
        {contradictory ? <Contradiction /> : refusal ? <span>{refusal.device ? "No finding is named for it." : "Take no more readings."}</span> : fault ? <Line name={findingHeading(fault, labels)} chance={fault.p} /> : <span>{working ? "Working it out …" : "Nothing is believed yet"}</span>}
      </span>
      <span className="flex w-12 flex-col items-center text-base font-bold">
        <svg aria-hidden="true" viewBox="0 0 24 14" className={`w-6 ${open ? "rotate-180" : ""}`} fill="none" stroke="currentColor" strokeWidth={3}><path d="M2 2l10 10L22 2" /></svg>
        {open ? "Less" : "All"}
      </span>
    </button>
  );
}
