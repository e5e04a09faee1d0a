import Link from "next/link";
import type { Route } from "next";
import type { ReactNode } from "react";
import { ButtonLink, chanceText } from "@/components/ui";
import { chanceWords } from "@/lib/checks/chance-words";
import type { CheckRow } from "@/lib/checks/check-view";
import { momentWords } from "@/lib/checks/date-words";
import { kindTitle } from "@/lib/checks/finding-words";
import { ConfirmedMark } from "../outcome/confirmed-mark";
import { SURE } from "@/lib/checks/verdict-sentence";

const SHAPES = { sound: "M3 3h18v18H3ZM7 12l4 4 6-8", finding: "M8 2h8l6 6v8l-6 6H8l-6-6V8ZM12 6v8M12 16v2", open: "M12 3 22 21H2ZM12 10v5M12 17v1.5", running: "M12 3a9 9 0 1 0 .01 0M12 7v5l4 3", abandoned: "M3 3h18v18H3ZM8 8l8 8M16 8l-8 8" } as const;

function shapeOf(row: CheckRow): keyof typeof SHAPES {
  if (row.state !== "finished") return row.state;
  if (row.findingChance === null || row.findingChance < SURE) return "open";
  return row.findingCode === "none" ? "sound" : "finding";
}

function headline(row: CheckRow): string {
  if (row.state !== "finished") return "Abandoned, no verdict";
  return row.sentence ?? "Nothing settled.";
}

interface LineProps { readonly facts: readonly ReactNode[]; readonly className?: string }

/** Facts in a row; a point stands between two of them and never begins a line. */
function Line({ facts, className = "" }: LineProps) {
  const shown = facts.filter((fact) => fact !== null);
  return (
    <ul className={className}>
      {shown.map((fact, index) => <li key={index} className="inline">{fact}{index < shown.length - 1 ? <span aria-hidden="true">{"\u00a0\u00b7 "}</span> : null}</li>)}
    </ul>
  );
}

/** What it was made on, then how sure it is, by whom and when. */
function Facts({ row }: { row: CheckRow }) {
  const { machine, entryName, kind, findingChance } = row;
  return (
    <>
      <Line facts={[machine ? `${machine.fleetNumber} ${machine.name}` : null, entryName ?? "Unknown device", kind ? kindTitle(kind) : null]} />
      <Line
        className="text-quiet"
        facts={[
          findingChance === null ? null : <span key="chance">{chanceWords(findingChance)}, <span className="font-mono whitespace-nowrap">{chanceText(findingChance)}</span></span>,
          row.recheckOf ? "re-check" : null, row.person.name, <span key="when" className="whitespace-nowrap">{momentWords(row.finishedAt ?? row.startedAt)}</span>,
        ]}
      />
    </>
  );
}

function LogItem({ row }: { row: CheckRow }) {
  const href = `/checks/${row.id}` as Route;
  return (
    <li className="grid grid-cols-[1.75rem_1fr] gap-x-3 border-t border-quiet py-3 first:border-t-2 first:border-rule">
      <svg viewBox="0 0 24 24" aria-hidden="true" className="mt-2 size-7 fill-none stroke-ink [stroke-width:2.25]"><path d={SHAPES[shapeOf(row)]} /></svg>
      <div className="min-w-0">
        {row.state === "running"
          ? <p className="flex flex-wrap items-center justify-between gap-3"><span className="text-lg font-bold">Running</span><ButtonLink href={href} tone="main">Carry on</ButtonLink></p>
          : <Link href={href} className="link inline-flex min-h-touch max-w-prose items-center text-lg leading-snug font-bold">{headline(row)}</Link>}
        {row.confirmed ? <ConfirmedMark finding={row.confirmed} /> : null}
        <Facts row={row} />
      </div>
    </li>
  );
}

/** The log, newest first. Each row: a shape with its word, the verdict in a few words, and who, where and when. */
export function LogList({ rows }: { rows: readonly CheckRow[] }) {
  return <ol className="grid">{rows.map((row) => <LogItem key={row.id} row={row} />)}</ol>;
}
