import Link from "next/link";
import type { KeyboardEventHandler, Ref } from "react";
import type { SearchHit } from "@/lib/catalogue/search-result";
import { KindMark } from "./kind-mark";
import { PinStrip } from "./pin-strip";

/** One entry: its name is the link, and the link covers the whole row for a thumb. */
function ResultRow({ hit }: { readonly hit: SearchHit }) {
  return (
    <li className="relative grid gap-x-6 gap-y-3 border-b-2 border-rule px-2 py-4 hover:bg-[var(--hover)] has-[a:focus-visible]:bg-[var(--hover)] sm:grid-cols-[1fr_auto] sm:items-center">
      <div className="min-w-0">
        <h3 className="text-xl leading-snug font-bold">
          <Link href={`/catalogue/${hit.slug}`} data-result className="underline decoration-2 underline-offset-4 after:absolute after:inset-0 focus-visible:outline-none focus-visible:after:outline-3 focus-visible:after:outline-bench">{hit.name}</Link>
        </h3>
        <p className="mt-1">{hit.maker} <span className="font-mono">{hit.partNumbers.map((part, i) => <span key={part}>{i > 0 ? ", " : ""}<span className="whitespace-nowrap">{part}</span></span>)}</span></p>
        <p className="mt-1 flex flex-wrap items-center gap-x-4 gap-y-1">
          <KindMark kind={hit.kind} />
          <span>{hit.senses}</span>
          <span className="whitespace-nowrap">{hit.supply}</span>
          <span>{hit.connector} ({hit.gender})</span>
        </p>
      </div>
      <div><PinStrip pins={hit.pins} /></div>
    </li>
  );
}

interface ResultListProps {
  readonly hits: readonly SearchHit[];
  readonly busy: boolean;
  readonly ref: Ref<HTMLOListElement>;
  readonly onKeyDown: KeyboardEventHandler;
}

/** The entries found, best first. */
export function ResultList({ hits, busy, ref, onKeyDown }: ResultListProps) {
  return (
    <ol ref={ref} onKeyDown={onKeyDown} aria-label="Entries found" aria-busy={busy} className={`border-t-2 border-rule ${busy ? "opacity-70" : ""}`}>
      {hits.map((hit) => <ResultRow key={hit.slug} hit={hit} />)}
    </ol>
  );
}
