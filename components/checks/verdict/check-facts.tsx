import type { Route } from "next";
import Link from "next/link";
import type { ReactNode } from "react";
import type { CheckView } from "@/lib/checks/check-view";
import { momentWords } from "@/lib/checks/date-words";
import { ownChecks } from "@/lib/checks/experience";

interface Fact { readonly label: string; readonly value: ReactNode }

/** The chances that a check began with, in words. */
function beginning(own: number): string {
  if (own === 0) return "published chances";
  return `published chances and ${own === 1 ? "1 own check" : `${own} own checks`}`;
}

function factsOf(check: CheckView): readonly Fact[] {
  const { machine, entry, setup } = check;
  return [
    { label: "Machine", value: machine ? <Link className="link" href={`/machines/${machine.id}` as Route}>{machine.fleetNumber} {machine.name}</Link> : "not attached" },
    { label: "Entry", value: entry ? <><Link className="link" href={`/catalogue/${entry.slug}` as Route}>{entry.name}</Link>, version {entry.version}</> : "unknown device" },
    { label: "Checked by", value: check.person.name },
    { label: "Finished", value: check.finishedAt ? momentWords(check.finishedAt) : "not finished" },
    { label: "Meter", value: check.meterName ?? "a common 6000-count meter, assumed" },
    { label: "Began with", value: <Link className="link" href="/checks/chances">{beginning(ownChecks(setup.experience))}</Link> },
    ...(setup.senses ? [{ label: "Senses", value: setup.senses }] : []),
    ...(check.recheckOf ? [{ label: "Re-check of", value: <Link className="link" href={`/checks/${check.recheckOf}` as Route}>the first run</Link> }] : []),
    ...(setup.note ? [{ label: "Note", value: setup.note }] : []),
  ];
}

/** What was checked, by whom, when, with what. */
export function CheckFacts({ check }: { readonly check: CheckView }) {
  return (
    <dl className="grid gap-x-6 gap-y-3 sm:grid-cols-2 lg:grid-cols-3 print:grid-cols-3">
      {factsOf(check).map((fact) => (
        <div key={fact.label} className="min-w-0">
          <dt className="text-quiet">{fact.label}</dt>
          <dd className="font-bold">{fact.value}</dd>
        </div>
      ))}
    </dl>
  );
}
