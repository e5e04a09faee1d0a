import type { ReactNode } from "react";
import { Notice, Sheet } from "@/components/ui";
import { checkName, type Labels } from "@/lib/checks/check-name";
import type { CheckView } from "@/lib/checks/check-view";
import { findingHeading } from "@/lib/checks/finding-words";
import { alikeKindsWords } from "@/lib/checks/kinds-apart-words";
import { isDangerous } from "@/lib/checks/refusal";
import type { Verdict } from "@/lib/checks/verdict";
import { settledPins } from "@/lib/checks/verdict-sentence";
import { AdviceList } from "./advice-list";
import { FindingChances, KindChances, MarkLetter } from "./chances";
import { EvidenceSection } from "./evidence-section";
import { PinsTable } from "./pins-table";
import { PlainReadings, RefusalSteps } from "./refusal-parts";
import { VerdictFace } from "./verdict-face";
import { WiringSketch } from "./wiring-sketch";

interface VerdictViewProps {
  readonly check: CheckView;
  /** Buttons that belong to the verdict: report, re-check, attach, back. */
  readonly actions?: ReactNode;
  /** Id of the finding whose evidence is shown; the likeliest one's when absent. */
  readonly finding?: string;
  /** "What would tell two apart", from the page. */
  readonly apart?: ReactNode;
}

function tone(verdict: Verdict): "sound" | "stop" | "plain" {
  const [only, second] = verdict.openFindings;
  if (verdict.refusal) return isDangerous(verdict.refusal) ? "stop" : "plain";
  if (verdict.contradictory || !only || second) return "plain";
  return only.code === "none" ? "sound" : "stop";
}

const STATE_WORDS = { sound: "Sound", stop: "Finding", plain: "Not settled" } as const;

function Sentence({ verdict }: { verdict: Verdict }) {
  const kind = tone(verdict);
  return (
    <Sheet tone={kind}>
      <p className="flex items-center gap-2 pr-4 font-bold">
        <svg viewBox="0 0 24 24" aria-hidden="true" className="size-6 fill-none stroke-ink [stroke-width:2.5]">
          {kind === "sound" ? <path d="M3 3h18v18H3ZM7 12l4 4 6-8" /> : kind === "stop" ? <path d="M8 2h8l6 6v8l-6 6H8l-6-6V8ZM12 6v8M12 16v2" /> : <path d="M12 3 22 21H2ZM12 10v5M12 17v1.5" />}
        </svg>
        {verdict.refusal ? (kind === "stop" ? "Stop" : "Another device") : verdict.contradictory ? "Contradictory" : STATE_WORDS[kind]}
      </p>
      <p className="balanced mt-2 max-w-[34ch] text-2xl leading-snug font-bold sm:max-w-[52ch] sm:text-3xl">{verdict.sentence}</p>
    </Sheet>
  );
}

function Place({ verdict, check }: { verdict: Verdict; check: CheckView }) {
  const labels = check.setup.cavityLabels;
  const open = verdict.openFindings.filter((fault) => fault.code !== "none");
  const nothing = verdict.contradictory ? "Nothing is marked until the readings agree." : "Sound: nothing to mark.";
  return (
    <Sheet title={open.length === 0 ? "Wiring" : "Where it is"}>
      <WiringSketch labels={labels} pins={settledPins(verdict.pins)} findings={verdict.openFindings} wireColours={check.setup.wireColours} />
      <ul className="mt-3 grid gap-2">
        {verdict.openFindings.slice(0, 6).map((fault, index) => (
          <li key={findingHeading(fault, labels)}>
            {fault.code === "none" ? nothing : <><MarkLetter index={index} /> {findingHeading(fault, labels)}</>}
          </li>
        ))}
      </ul>
    </Sheet>
  );
}

function TellApart({ verdict, labels }: { verdict: Verdict; labels: Labels }) {
  if (verdict.contradictory) {
    return (
      <Notice tone="ask" title="Take these readings again">
        <ul className="list-disc pl-6">{verdict.suspects.map((s) => <li key={s.check}><strong>{checkName(s.check, labels)}.</strong> {s.why}</li>)}</ul>
      </Notice>
    );
  }
  if (verdict.openFindings.length < 2) return null;
  if (verdict.tellApart.length === 0) {
    return (
      <Notice tone="ask" title="No reading with a meter will tell the rest apart">
        <p>They read alike at every check. Go on with the steps below, the likeliest first, and check again after each.</p>
      </Notice>
    );
  }
  return (
    <Notice tone="ask" title="What would tell the rest apart">
      <TellingOrder checks={verdict.tellApart} labels={labels} />
    </Notice>
  );
}

function TellingOrder({ checks, labels }: { checks: Verdict["tellApart"]; labels: Labels }) {
  return <ol className="list-decimal space-y-1.5 pl-6">{checks.map((next) => <li key={next.check}><strong>{checkName(next.check, labels)}.</strong> {next.why}</li>)}</ol>;
}

/** What would tell the kind of device, where the readings leave it open. */
function KindApart({ verdict, labels }: { verdict: Verdict; labels: Labels }) {
  const { tellKindsApart: checks, openFindings } = verdict;
  if (!checks) return null;
  if (checks.length === 0) return <Notice tone="ask" title="No reading with a meter will tell the kind of device"><p>{alikeKindsWords(openFindings)}</p></Notice>;
  return <Notice tone="ask" title="What would tell the kind of device"><TellingOrder checks={checks} labels={labels} /></Notice>;
}

/** The verdict of a finished check, read-only. Server-rendered; the buttons come from the page. */
export function VerdictView({ check, actions, finding, apart }: VerdictViewProps) {
  const { verdict } = check;
  const labels: Labels = check.setup.cavityLabels;
  if (!verdict) return <Notice tone="plain" title="This check has no verdict yet." />;
  if (verdict.refusal) return <RefusalView check={check} verdict={verdict} refusal={verdict.refusal} actions={actions} />;
  return (
    <div className="grid gap-6">
      <Sentence verdict={verdict} />
      {actions}
      <TellApart verdict={verdict} labels={labels} />
      <KindApart verdict={verdict} labels={labels} />
      <div className="grid gap-6 lg:grid-cols-2">
        <Place verdict={verdict} check={check} />
        <Sheet title="Pins of the device">
          <PinsTable verdict={verdict} setup={check.setup} />
          {check.setup.connector ? <div className="mt-5"><VerdictFace shape={check.setup.connector} labels={labels} pins={settledPins(verdict.pins)} findings={verdict.openFindings} /></div> : null}
        </Sheet>
      </div>
      <Cautions lines={verdict.cautions} />
      {verdict.advice.length > 0 ? (
        <div className="grid gap-6 lg:grid-cols-2">
          <Sheet title="What to do next"><ReadFirst verdict={verdict} /><AdviceList advice={verdict.advice} labels={labels} part="next" /></Sheet>
          <Sheet title="How to prove the repair"><AdviceList advice={verdict.advice} labels={labels} part="prove" /></Sheet>
        </div>
      ) : null}
      <div className="grid gap-6 lg:grid-cols-2">
        <Sheet title="Findings and their chances"><FindingChances verdict={verdict} labels={labels} /></Sheet>
        <Sheet title="Kind of device"><KindChances verdict={verdict} /></Sheet>
      </div>
      <EvidenceSection check={check} verdict={verdict} finding={finding} />
      {apart}
    </div>
  );
}

interface RefusalViewProps extends Pick<VerdictViewProps, "check" | "actions"> { readonly verdict: Verdict; readonly refusal: NonNullable<Verdict["refusal"]> }

/** A device that is none of the three, or a reading above the limits: what to do, without pins, findings and evidence. */
function RefusalView({ check, verdict, refusal, actions }: RefusalViewProps) {
  return (
    <div className="grid gap-6">
      <Sentence verdict={verdict} />
      {actions}
      <Cautions lines={verdict.cautions} />
      <div className="grid items-start gap-6 lg:grid-cols-2">
        <Sheet title="What to do next"><RefusalSteps refusal={refusal} /></Sheet>
        {refusal.device ? <Sheet title="Kind of device"><KindChances verdict={verdict} /></Sheet> : null}
      </div>
      <Sheet title="Readings" id="evidence"><PlainReadings check={check} /></Sheet>
    </div>
  );
}

/** Nothing is taken apart for a finding that a reading could still rule out. */
function ReadFirst({ verdict }: { verdict: Verdict }) {
  if (verdict.tellApart.length === 0) return null;
  return <p className="mb-4 font-bold">First take the readings that tell these apart, in a re-check. Then go on with the finding that is left.</p>;
}

function Cautions({ lines }: { lines: readonly string[] }) {
  return (
    <Notice tone="stop" title="Before you touch anything">
      <ul className="list-disc space-y-1 pl-6">{lines.map((line) => <li key={line}>{line}</li>)}</ul>
    </Notice>
  );
}
