import type { ReactNode } from "react";
import { ChanceBar } from "@/components/ui";
import type { Assessment, ReadingEffect } from "@/lib/diagnosis";
import { chanceWords } from "@/lib/checks/chance-words";
import { readingWords } from "@/lib/checks/check-name";
import { checkWords, type Labels } from "@/lib/checks/check-words";
import { findingHeading, kindTitle } from "@/lib/checks/finding-words";
import { OTHER_SHORT } from "@/lib/checks/refusal";
import type { Explained } from "./use-engine";

/** Below this chance a possibility is counted, not listed. */
const LISTED = 0.005;
const MOST = 8;
/** A reading that changes a chance by less than this factor, up or down, is not said to speak for or against it. */
const SPEAKS = 1.5;

type Standing = Exclude<Assessment, { state: "invalid-input" }>;

function Possibilities({ title, rows }: { readonly title: string; readonly rows: readonly { readonly name: string; readonly p: number }[] }) {
  const shown = rows.filter((row) => row.p >= LISTED).slice(0, MOST);
  const rest = rows.length - shown.length;
  return (
    <section className="grid content-start gap-3">
      <h2 className="text-xl font-bold">{title}</h2>
      {shown.map((row) => <ChanceBar key={row.name} label={row.name} chance={row.p} note={chanceWords(row.p)} />)}
      {rest > 0 ? <p className="text-quiet">{rest === 1 ? "1 more, less likely." : `${rest} more, each less likely.`}</p> : null}
    </section>
  );
}

interface Factor { readonly name: string; readonly factor: number }

function factorsOf(effect: ReadingEffect, labels: Labels): readonly Factor[] {
  return [
    ...effect.kinds.map(({ kind, factor }) => ({ name: kindTitle(kind), factor })),
    ...effect.faults.map(({ fault, factor }) => ({ name: findingHeading(fault, labels), factor })),
  ];
}

/** The three that it moves most. */
function named(list: readonly Factor[]): string {
  return list.slice(0, 3).map(({ name }) => name).join("; ");
}

function EffectRow({ effect, labels }: { readonly effect: ReadingEffect; readonly labels: Labels }) {
  const factors = factorsOf(effect, labels);
  const forIt = factors.filter(({ factor }) => factor >= SPEAKS).sort((a, b) => b.factor - a.factor);
  const against = factors.filter(({ factor }) => factor <= 1 / SPEAKS).sort((a, b) => a.factor - b.factor);
  return (
    <li className="border-t border-quiet py-2">
      <p>{checkWords(effect.check, labels)}: <strong className="font-mono">{readingWords(effect.check, effect.value, null)}</strong></p>
      {forIt.length > 0 ? <p><span aria-hidden="true">▲ </span><strong>For: </strong>{named(forIt)}</p> : null}
      {against.length > 0 ? <p><span aria-hidden="true">▽ </span><strong>Against: </strong>{named(against)}</p> : null}
      {forIt.length + against.length === 0 ? <p className="text-quiet">Tells none of them apart.</p> : null}
    </li>
  );
}

function Effects({ effects, labels }: { readonly effects: readonly ReadingEffect[]; readonly labels: Labels }) {
  if (effects.length === 0) return <p>Nothing is read yet.</p>;
  return <ol>{effects.map((effect) => <EffectRow key={effect.check} effect={effect} labels={labels} />)}</ol>;
}

/** The three kinds and whatever else it may be, likeliest first. */
function kindRows({ kinds, others }: Standing) {
  return [...kinds.map(({ kind, p }) => ({ name: kindTitle(kind), p })), ...others.map(({ device, p }) => ({ name: `Not one of the three: ${OTHER_SHORT[device]}`, p }))].sort((a, b) => b.p - a.p);
}

interface StandingDetailsProps {
  readonly standing: Standing;
  readonly labels: Labels;
  readonly why: string | null;
  readonly effects: Explained<readonly ReadingEffect[]>;
  /** The evidence for any one finding, and what tells two apart. */
  readonly evidence: ReactNode;
}

/** All that is believed so far: kinds, findings, pins, why this reading, and what each reading speaks for and against. */
export function StandingDetails({ standing, labels, why, effects, evidence }: StandingDetailsProps) {
  const pin = (n: number): string => labels[n - 1] ?? "";
  return (
    <div className="grid gap-6 py-4">
      {why ? <section><h2 className="text-xl font-bold">Why this reading</h2><p>{why}</p></section> : null}
      <Possibilities title="Kind of device" rows={kindRows(standing)} />
      <Possibilities title="Findings" rows={standing.faults.map((fault) => ({ name: findingHeading(fault, labels), p: fault.p }))} />
      <Possibilities title="Pins" rows={standing.pins.map((pins) => ({ name: `+V ${pin(pins.supply)} \u00b7 0V ${pin(pins.ground)} \u00b7 SIG ${pin(pins.signal)}`, p: pins.p }))} />
      <section>
        <h2 className="text-xl font-bold">What each reading says</h2>
        {effects.state === "ready" ? <Effects effects={effects.value} labels={labels} /> : <p>{effects.state === "failed" ? "It could not be worked out." : "Working it out …"}</p>}
      </section>
      {evidence}
    </div>
  );
}
