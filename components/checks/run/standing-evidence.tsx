"use client";

import { useState } from "react";
import { Button, Field, Select } from "@/components/ui";
import { faultId, type Assessment } from "@/lib/diagnosis";
import type { Labels } from "@/lib/checks/check-words";
import { findingHeading } from "@/lib/checks/finding-words";
import { chosenPair, plainAnswer, possibilityChoices, possibleFindings, type PossibilityChoice } from "@/lib/checks/possibilities";
import { settledPins } from "@/lib/checks/verdict-sentence";

import { CarryingNote, EvidenceList, TellingList } from "../evidence";
import { useExplained, type EngineState, type Explained } from "./use-engine";

type Standing = Exclude<Assessment, { state: "invalid-input" }>;

interface StandingEvidenceProps { readonly engine: EngineState; readonly standing: Standing; readonly labels: Labels }

/** What an explanation looks like before it is there; nothing once it is. */
function Waiting({ explained }: { readonly explained: Explained<unknown> }) {
  if (explained.state === "working") return <p role="status">Working it out …</p>;
  return explained.state === "failed" ? <p role="status">It could not be worked out.</p> : null;
}

/** The reasons behind the standing, each worked out on this phone and only when asked for. */
export function StandingEvidence(props: StandingEvidenceProps) {
  if (props.engine.readings.length === 0) return null;
  return (
    <>
      <FindingEvidence {...props} />
      <Carried {...props} />
      <TwoApart {...props} />
    </>
  );
}

function FindingEvidence({ engine, standing, labels }: StandingEvidenceProps) {
  const [id, setId] = useState<string | null>(null);
  const findings = possibleFindings(standing), finding = findings.find((one) => faultId(one) === id) ?? null;
  const rows = useExplained(finding ? { task: "evidence", finding } as const : null, engine.setup, engine.readings);
  return (
    <section className="grid grid-cols-1 gap-3">
      <h2 className="text-xl font-bold">Evidence for one finding</h2>
      <div className="grid grid-cols-2 gap-2">
        {findings.map((one) => {
          const own = faultId(one), pressed = own === id;
          return <Button key={own} size="glove" aria-pressed={pressed} onClick={() => setId(pressed ? null : own)} className="px-3 text-base! leading-tight">{findingHeading(one, labels)}</Button>;
        })}
      </div>
      <Waiting explained={rows} />
      {rows.state === "ready" && finding ? <EvidenceList rows={rows.value} finding={finding} labels={labels} pins={settledPins(standing.pins)} /> : null}
    </section>
  );
}

function Carried({ engine, labels }: StandingEvidenceProps) {
  const [asked, setAsked] = useState(false);
  const carrying = useExplained(asked ? { task: "carrying" } as const : null, engine.setup, engine.readings);
  return (
    <section className="grid grid-cols-1 gap-3">
      <h2 className="text-xl font-bold">Which readings carry it</h2>
      {asked ? null : <Button size="glove" onClick={() => setAsked(true)}>Find the fewest that are enough</Button>}
      <Waiting explained={carrying} />
      {carrying.state === "ready" && carrying.value ? <CarryingNote carrying={carrying.value} readings={engine.readings} labels={labels} /> : null}
      {carrying.state === "ready" && !carrying.value ? <p>Nothing is settled yet that readings could carry.</p> : null}
    </section>
  );
}

function TwoApart({ engine, standing, labels }: StandingEvidenceProps) {
  const choices = possibilityChoices(standing, labels);
  const [ids, setIds] = useState<readonly [string, string]>(["", ""]);
  const pair = chosenPair(choices, ids);
  const apart = useExplained(pair ? { task: "apart", among: pair.map(({ possibility }) => possibility) } as const : null, engine.setup, engine.readings);
  if (choices.length < 2) return null;
  const option = ({ id, label }: PossibilityChoice) => <option key={id} value={id}>{label}</option>;
  const select = (label: string, at: 0 | 1) => (
    <Field label={label}>
      <Select className="min-h-glove text-lg!" value={ids[at]} onChange={({ target }) => setIds(at === 0 ? [target.value, ids[1]] : [ids[0], target.value])}>
        <option value="">Choose one</option>
        {choices.map(option)}
      </Select>
    </Field>
  );
  return (
    <section className="grid grid-cols-1 gap-3">
      <h2 className="text-xl font-bold">What would tell two apart</h2>
      {select("This", 0)}
      {select("or this", 1)}
      <Waiting explained={apart} />
      {apart.state === "ready" && pair ? <TellingList checks={plainAnswer(apart.value)} names={pair.map(({ clause }) => clause)} labels={labels} /> : null}
    </section>
  );
}
