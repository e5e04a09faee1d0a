import type { ReactNode } from "react";
import { barScale, shareWords, shiftWords, type ChanceRow } from "@/lib/checks/chance-rows";
import { ShiftBars, ShiftKey } from "./shift-bars";

const GRID = "lg:grid lg:grid-cols-[minmax(0,3fr)_minmax(0,3.5fr)_minmax(0,5.5fr)] lg:gap-6";

/** The last holds words. */
const DESK_CELLS = "lg:grid-cols-[1fr_1.15fr_1fr_1.6fr]";

/** Up, down or level: the shape beside the word. */
function ShiftMark({ row }: { readonly row: ChanceRow }) {
  const shape = row.now > row.published ? "M12 4 21 20H3Z" : row.now < row.published ? "M12 20 3 4H21Z" : "M3 12H21";
  return <svg viewBox="0 0 24 24" aria-hidden="true" className="mr-1.5 inline size-3.5 fill-none stroke-current [stroke-width:3]"><path d={shape} /></svg>;
}

interface Cell { readonly label: string; readonly value: ReactNode; readonly strong?: boolean }

const cellsOf = (row: ChanceRow): readonly Cell[] => [
  { label: "Published", value: <>{shareWords(row.published)} <sup className="font-read text-base leading-none">{row.source}<span className="sr-only"> is its source</span></sup></> },
  { label: "Own checks", value: row.own },
  { label: "Now", value: shareWords(row.now), strong: true },
  { label: "Shift", value: <span className="font-read"><ShiftMark row={row} />{shiftWords(row)}</span> },
];

function ChanceItem({ row, scale }: { readonly row: ChanceRow; readonly scale: number }) {
  return (
    <li className={`grid gap-1.5 border-t border-quiet py-3 first:border-t-2 first:border-rule lg:py-2 ${GRID}`}>
      <h3 className="font-bold">{row.title}</h3>
      <ShiftBars published={row.published} now={row.now} scale={scale} />
      <dl className={`grid grid-cols-3 gap-x-4 gap-y-1 ${DESK_CELLS}`}>
        {cellsOf(row).map(({ label, value, strong }) => (
          <div key={label} className={label === "Shift" ? "col-span-3 lg:col-span-1" : ""}>
            <dt className={`text-quiet lg:sr-only ${label === "Shift" ? "sr-only" : ""}`}>{label}</dt>
            <dd className={`font-mono ${strong ? "font-bold" : ""}`}>{value}</dd>
          </div>
        ))}
      </dl>
    </li>
  );
}

/** On a desk the terms stand once, at the top; each row still carries its own for screen readers. */
function DeskHeader({ first }: { readonly first: string }) {
  return (
    <div aria-hidden="true" className={`hidden pb-2 font-bold ${GRID}`}>
      <span>{first}</span><span />
      <div className={`grid gap-x-4 ${DESK_CELLS}`}>{["Published", "Own checks", "Now", "Shift"].map((label) => <span key={label}>{label}</span>)}</div>
    </div>
  );
}

/** Findings or kinds before the first reading: published share, own count, the chance now and how far it was moved. */
export function ChanceList({ rows, first }: { readonly rows: readonly ChanceRow[]; readonly first: string }) {
  const scale = barScale(rows);
  return (
    <>
      <ShiftKey scale={scale} />
      <DeskHeader first={first} />
      <ol className="grid">{rows.map((row) => <ChanceItem key={row.code} row={row} scale={scale} />)}</ol>
    </>
  );
}
