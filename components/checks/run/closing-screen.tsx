import { Button } from "@/components/ui";
import type { Assessment } from "@/lib/diagnosis";
import type { Labels } from "@/lib/checks/check-words";
import { chanceWords } from "@/lib/checks/chance-words";
import { findingHeading, kindTitle } from "@/lib/checks/finding-words";
import { isDangerous, refusalOf, shortRefusal, STOP_NOW } from "@/lib/checks/refusal";
import { kindNamed, openKinds } from "@/lib/checks/verdict-sentence";
import { ScreenHeading } from "./screen-heading";

type Standing = Exclude<Assessment, { state: "invalid-input" }>;

function Beliefs({ standing, labels }: { readonly standing: Standing; readonly labels: Labels }) {
  const refusal = refusalOf(standing);
  if (refusal) return <p className="text-lg font-bold">{shortRefusal(refusal)}</p>;
  // Where no kind is likely enough to be named, all that are left are.
  const kinds = kindNamed(standing.kinds) ? standing.kinds.slice(0, 1) : openKinds(standing.kinds);
  const open = standing.openFindings;
  return (
    <ul className="grid gap-1 text-lg">
      {kinds.map(({ kind, p }) => <li key={kind}><strong>{kindTitle(kind)}</strong>: {chanceWords(p)}.</li>)}
      {open.map((fault) => <li key={findingHeading(fault, labels)}><strong>{findingHeading(fault, labels)}</strong>: {chanceWords(fault.p)}.</li>)}
    </ul>
  );
}

interface ClosingScreenProps {
  readonly reason: "enough" | "exhausted";
  readonly standing: Standing;
  readonly labels: Labels;
  readonly onVerdict: () => void;
  readonly onCarryOn: () => void;
}

/** Enough is known, or nothing is left to read: offers the verdict, and never closes the door on more readings. */
export function ClosingScreen({ reason, standing, labels, onVerdict, onCarryOn }: ClosingScreenProps) {
  const enough = reason === "enough";
  const refusal = refusalOf(standing), several = !refusal && standing.openFindings.length > 1;
  return (
    <section className="grid gap-4">
      <ScreenHeading screen={reason}>{refusal && isDangerous(refusal) ? "Stop" : enough ? "Enough is known" : "No reading is left that would tell more"}</ScreenHeading>
      <Beliefs standing={standing} labels={labels} />
      {several && standing.inseparable ? <p>These findings read alike with a meter; the verdict names them all.</p> : null}
      {several && !standing.inseparable ? <p>More readings could still tell these findings apart.</p> : null}
      {refusal && isDangerous(refusal) ? <ul className="list-disc pl-6">{STOP_NOW.map((line) => <li key={line}>{line}</li>)}</ul> : <p>Leave the machine safe: power off, test terminals out, connectors mated.</p>}
      <Button tone="main" size="glove" className="w-full text-2xl" onClick={onVerdict}>See the verdict</Button>
      {enough && !(refusal && isDangerous(refusal)) ? <Button size="glove" className="w-full" onClick={onCarryOn}>Carry on reading</Button> : null}
    </section>
  );
}
