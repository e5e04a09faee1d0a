import type { ReactNode } from "react";
import { chanceText } from "@/components/ui";
import { carryingSentence } from "@/lib/checks/carrying-words";
import { checkName } from "@/lib/checks/check-name";
import type { CheckView } from "@/lib/checks/check-view";
import type { ConfirmationView } from "@/lib/checks/confirmation-view";
import { momentWords } from "@/lib/checks/date-words";
import { findingHeading, KIND_TITLES } from "@/lib/checks/finding-words";
import { alikeKindsWords } from "@/lib/checks/kinds-apart-words";
import { OTHER_SHORT } from "@/lib/checks/refusal";
import { effectiveReadings } from "@/lib/checks/run-state";
import type { Verdict } from "@/lib/checks/verdict";
import { settledPins } from "@/lib/checks/verdict-sentence";
import { OutcomeWords } from "../outcome/outcome-words";
import { AdviceList } from "../verdict/advice-list";
import { PinsTable } from "../verdict/pins-table";
import { PlainReadings, RefusalSteps } from "../verdict/refusal-parts";
import { WiringSketch } from "../verdict/wiring-sketch";
import { ReportReadings, ReportSkips } from "./report-readings";

interface ReportProps {
  readonly check: CheckView;
  readonly verdict: Verdict;
  /** What it turned out to be, where that is recorded. */
  readonly outcome?: ConfirmationView | null;
}

function Part({ title, children }: { readonly title: string; readonly children: ReactNode }) {
  return (
    <section className="mt-6 border-t-2 border-ink pt-2 print:mt-4">
      <h2 className="mb-2 text-xl font-bold print:text-lg">{title}</h2>
      {children}
    </section>
  );
}

function headFacts({ check, verdict }: ReportProps): readonly (readonly [string, string])[] {
  const { setup, machine, entry } = check;
  return [
    ["Machine", machine ? `${machine.fleetNumber} ${machine.name}` : "not attached"],
    ["Checked by", check.person.name],
    ["Started", momentWords(check.startedAt)],
    ["Finished", check.finishedAt ? momentWords(check.finishedAt) : "not finished"],
    ["Meter", check.meterName ?? "a common 6000-count meter, assumed"],
    ["Entry", entry ? `${entry.name}, version ${entry.version}` : "unknown device"],
    ["Cavities", setup.cavityLabels.join(", ")],
    ["Connector", setup.connector ? `${setup.connector.name}, ${setup.connector.gender}` : "not noted"],
    ["Wire colours", setup.wireColours ? setup.wireColours.map((colour) => colour ?? "not noted").join(", ") : "not noted"],
    ...(setup.senses ? [["Senses", setup.senses] as const] : []),
    ...(setup.batteryVolts === undefined ? [] : [["Battery, nominal", `${setup.batteryVolts} V`] as const]),
    ...(check.recheckOf ? [["Re-check of", check.recheckOf] as const] : []),
    ["Check", check.id],
    ["Engine", `version ${verdict.engineVersion}`],
  ];
}

function Head(props: ReportProps) {
  return (
    <header>
      <p className="text-quiet">Plant workshop · Pinwright</p>
      <h1 className="text-3xl font-bold print:text-2xl">{props.check.recheckOf ? "Re-check of a three-wire device" : "Check of a three-wire device"}</h1>
      <dl className="mt-4 grid gap-x-6 gap-y-2 sm:grid-cols-2 print:grid-cols-3 print:gap-y-1">
        {headFacts(props).map(([label, value]) => (
          <div key={label} className="min-w-0">
            <dt className="text-quiet">{label}</dt>
            <dd className="break-words">{value}</dd>
          </div>
        ))}
      </dl>
      {props.check.setup.note ? <p className="mt-3"><strong>Note.</strong> {props.check.setup.note}</p> : null}
    </header>
  );
}

function Chances({ check, verdict }: ReportProps) {
  const labels = check.setup.cavityLabels;
  const findings = verdict.faults.filter((fault, index) => index === 0 || fault.p >= 0.01);
  return (
    <>
      <Kinds verdict={verdict} />
      <p className="mt-1"><strong>Finding:</strong> {findings.map((fault) => `${findingHeading(fault, labels)} ${chanceText(fault.p)}`).join("; ")}.</p>
    </>
  );
}

/** The three kinds, and what else it may be from a chance of 1 % on. */
function Kinds({ verdict }: { readonly verdict: Verdict }) {
  const others = verdict.others.filter(({ p }) => p >= 0.01).map(({ device, p }) => `${OTHER_SHORT[device]} ${chanceText(p)}`);
  return <p><strong>Kind:</strong> {[...others, ...verdict.kinds.map(({ kind, p }) => `${KIND_TITLES[kind]} ${chanceText(p)}`)].join("; ")}.</p>;
}

function Open({ check, verdict }: ReportProps) {
  const labels = check.setup.cavityLabels;
  if (verdict.contradictory) {
    return <Part title="Readings to take again"><ul className="list-disc pl-6">{verdict.suspects.map((s) => <li key={s.check}>{checkName(s.check, labels)}. {s.why}</li>)}</ul></Part>;
  }
  if (verdict.openFindings.length < 2) return null;
  return (
    <Part title="What would tell the rest apart">
      {verdict.tellApart.length === 0
        ? <p>No reading with a meter will tell the rest apart.</p>
        : <Telling checks={verdict.tellApart} check={check} />}
    </Part>
  );
}

function Telling({ checks, check }: { readonly checks: Verdict["tellApart"]; readonly check: CheckView }) {
  return <ol className="list-decimal pl-6">{checks.map((next) => <li key={next.check}>{checkName(next.check, check.setup.cavityLabels)}. {next.why}</li>)}</ol>;
}

function KindOpen({ check, verdict }: ReportProps) {
  const { tellKindsApart: checks, openFindings } = verdict;
  if (!checks) return null;
  return (
    <Part title="What would tell the kind of device">
      {checks.length === 0 ? <p>No reading with a meter. {alikeKindsWords(openFindings)}</p> : <Telling checks={checks} check={check} />}
    </Part>
  );
}

/** Which readings carry the verdict, after the sentence that says how many; nothing where all of them do. */
function carriedNames(check: CheckView, { carrying }: Verdict): string {
  if (!carrying || carrying.checks.length === effectiveReadings(check.steps).length) return "";
  return ` ${carrying.checks.map((code) => checkName(code, check.setup.cavityLabels)).join("; ")}.`;
}

/** Chances, drawing and pins. */
function Concluded({ check, verdict }: ReportProps) {
  return (
    <>
      <Chances check={check} verdict={verdict} />
      <div className="mt-4 grid items-start gap-6 sm:grid-cols-2 print:grid-cols-2">
        <WiringSketch labels={check.setup.cavityLabels} pins={settledPins(verdict.pins)} findings={verdict.openFindings} wireColours={check.setup.wireColours} />
        <PinsTable verdict={verdict} setup={check.setup} captionHidden={false} />
      </div>
    </>
  );
}

/** The whole record of a finished check for the work order: one column, A4, readable in black and white. */
export function CheckReport({ check, verdict, outcome }: ReportProps) {
  const labels = check.setup.cavityLabels;
  return (
    <article className="mx-auto max-w-[50rem] print:text-[10.5pt]">
      <Head check={check} verdict={verdict} />
      <Part title="Verdict">
        <p className="mb-3 text-xl leading-snug font-bold print:text-lg">{verdict.sentence}</p>
        {verdict.refusal ? verdict.refusal.device && <Kinds verdict={verdict} /> : <Concluded check={check} verdict={verdict} />}
      </Part>
      <Open check={check} verdict={verdict} />
      <KindOpen check={check} verdict={verdict} />
      <Part title="Readings and evidence">
        {verdict.carrying ? <p className="mb-3"><strong>{carryingSentence(verdict.carrying, effectiveReadings(check.steps).length)}</strong>{carriedNames(check, verdict)}</p> : null}
        {verdict.refusal ? <PlainReadings check={check} /> : <ReportReadings check={check} verdict={verdict} />}
        <ReportSkips check={check} />
      </Part>
      {verdict.refusal ? <Part title="What to do next"><RefusalSteps refusal={verdict.refusal} /></Part> : null}
      {verdict.advice.length > 0 ? (
        <>
          <Part title="What to do next"><AdviceList advice={verdict.advice} labels={labels} part="next" /></Part>
          <Part title="How to prove the repair"><AdviceList advice={verdict.advice} labels={labels} part="prove" /></Part>
        </>
      ) : null}
      {outcome ? <Part title="What it turned out to be"><OutcomeWords one={outcome} /></Part> : null}
      <Part title="Cautions"><ul className="list-disc pl-6">{verdict.cautions.map((line) => <li key={line}>{line}</li>)}</ul></Part>
      <Signature />
    </article>
  );
}

function Signature() {
  return (
    <div className="mt-10 hidden grid-cols-3 gap-6 print:grid">
      {["Work order", "Date", "Signed"].map((label) => <p key={label} className="border-t border-ink pt-1">{label}</p>)}
    </div>
  );
}
