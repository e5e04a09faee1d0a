import Link from "next/link";
import type { Route } from "next";
import { ButtonLink, chanceText } from "@/components/ui";
import type { CheckRow } from "@/lib/checks/check-view";
import { momentWords } from "@/lib/checks/date-words";
import { findingTitle, kindTitle } from "@/lib/checks/finding-words";

const SHAPES = { sound: "M3 3h18v18H3ZM7 12l4 4 6-8", finding: "M8 2h8l6 6v8l-6 6H8l-6-6V8ZM12 6v8M12 16v2", running: "M12 3a9 9 0 1 0 .01 0M12 7v5l4 3", abandoned: "M3 3h18v18H3ZM8 8l8 8M16 8l-8 8" } as const;

function shapeOf(row: CheckRow): keyof typeof SHAPES {
  if (row.state !== "finished") return row.state;
  return row.findingCode === "none" ? "sound" : "finding";
}

function headline(row: CheckRow): string {
  if (row.state === "running") return "Running";
  if (row.state === "abandoned") return "Abandoned";
  if (row.findingCode === null || row.findingChance === null) return "Not settled";
  return `${findingTitle(row.findingCode)}, ${chanceText(row.findingChance)}`;
}

function Facts({ row }: { row: CheckRow }) {
  const facts = [
    row.kind ? kindTitle(row.kind) : null,
    row.machine ? `${row.machine.fleetNumber} ${row.machine.name}` : "no machine",
    row.entryName ?? "unknown device", row.person.name, momentWords(row.finishedAt ?? row.startedAt),
    row.recheckOf ? "re-check" : null,
  ].filter((fact) => fact !== null);
  return (
    <ul className="mt-1 flex flex-wrap gap-x-2 text-quiet">
      {facts.map((fact, index) => <li key={fact} className="flex gap-2">{index > 0 ? <span aria-hidden="true">·</span> : null}{fact}</li>)}
    </ul>
  );
}

function LogItem({ row }: { row: CheckRow }) {
  const href = `/checks/${row.id}` as Route;
  return (
    <li className="grid grid-cols-[1.75rem_1fr] gap-x-3 border-t border-quiet py-4 first:border-t-2 first:border-rule">
      <svg viewBox="0 0 24 24" aria-hidden="true" className="mt-0.5 size-7 fill-none stroke-ink [stroke-width:2.25]"><path d={SHAPES[shapeOf(row)]} /></svg>
      <div className="min-w-0">
        <p className="font-bold">{headline(row)}</p>
        <Link href={href} className="link inline-flex min-h-touch max-w-prose items-center py-1 text-lg leading-snug">
          {row.sentence ?? (row.state === "running" ? "Carry on with this check" : "No verdict was reached")}
        </Link>
        <Facts row={row} />
        {row.state === "running" ? <ButtonLink href={href} tone="main" className="mt-3">Carry on</ButtonLink> : null}
      </div>
    </li>
  );
}

/** The log, newest first. Each row: a shape with its word, the verdict's sentence, and who, where and when. */
export function LogList({ rows }: { rows: readonly CheckRow[] }) {
  return <ol className="grid">{rows.map((row) => <LogItem key={row.id} row={row} />)}</ol>;
}
