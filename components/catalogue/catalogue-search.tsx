"use client";

import type { KeyboardEventHandler, ReactNode, Ref, SubmitEvent } from "react";
import { Button, ButtonLink, EmptyState, Notice } from "@/components/ui";
import { chosenCount, type SearchChoice, toggled } from "@/lib/catalogue/search-params";
import type { SearchResult } from "@/lib/catalogue/search-result";
import { FacetPanel } from "./facet-panel";
import { ResultList } from "./result-list";
import { ResultPaging } from "./result-paging";
import { ResultCount, ResultRemarks } from "./result-words";
import { useCatalogueSearch } from "./use-catalogue-search";
import { useResultKeys } from "./use-result-keys";

interface CatalogueSearchProps { readonly initial: SearchResult; readonly initialChoice: SearchChoice }

const NOTHING_CHOSEN = { page: 1, kind: [], quantity: [], connector: [], supply: [], colour: [] } as const;

function NothingFound({ choice, onClear }: { readonly choice: SearchChoice; readonly onClear: () => void }) {
  const filters = chosenCount(choice);
  return (
    <EmptyState
      title={choice.q.trim() === "" ? "No entry fits these filters." : `No entry fits “${choice.q.trim()}”${filters > 0 ? " with these filters" : ""}.`}
      action={(
        <>
          {filters > 0 ? <Button tone="main" onClick={onClear}>Clear the filters</Button> : null}
          <ButtonLink href="/checks/new" tone={filters > 0 ? "plain" : "main"}>Check an unknown device</ButtonLink>
        </>
      )}
    >
      Try fewer words, part of a part number, or what can be seen: wire colours such as BN/BU/BK, the connector, the kind.
      A device without an entry can be identified by a check.
    </EmptyState>
  );
}

interface SearchFieldProps {
  readonly q: string;
  readonly ref: Ref<HTMLInputElement>;
  readonly onKeyDown: KeyboardEventHandler;
  readonly onText: (text: string) => void;
}

function SearchField({ q, ref, onKeyDown, onText }: SearchFieldProps) {
  return (
    <div className="lg:col-span-2">
      <label htmlFor="catalogue-q" className="text-lg font-bold">Part number, name, wire colours or connector</label>
      <div className="mt-1 flex gap-2">
        <input
          ref={ref} id="catalogue-q" name="q" type="search" value={q} maxLength={200} autoComplete="off" autoCapitalize="none" spellCheck={false} enterKeyHint="search"
          aria-describedby="catalogue-keys" onKeyDown={onKeyDown} onChange={(event) => onText(event.target.value)} className="control min-h-14 text-xl"
        />
        <Button type="submit" tone="main" className="min-h-14!">Search</Button>
      </div>
      <p id="catalogue-keys" className="mt-1 text-quiet">As you remember it: “AMI 4-210”, “ladder angel”, “BN/BU/BK”. <span className="hidden md:inline">Keys: / to this field, Enter or arrows to the list.</span></p>
    </div>
  );
}

/** On a phone the facets open and close by a tick box of their own, so that they do without a script; on a desk they stand open. */
function Narrowing({ filters, total, children }: { readonly filters: number; readonly total: number; readonly children: ReactNode }) {
  return (
    <div>
      <input type="checkbox" id="catalogue-narrow" className="peer sr-only lg:hidden" />
      <label htmlFor="catalogue-narrow" className="tag-cut button button-plain min-h-touch w-full peer-focus-visible:outline-3 peer-focus-visible:outline-offset-3 peer-focus-visible:outline-bench lg:hidden">
        Narrow down{filters > 0 ? ` (${filters} chosen)` : ""}
      </label>
      <div className="mt-4 hidden peer-checked:block lg:mt-0 lg:block">
        {children}
        <label htmlFor="catalogue-narrow" className="tag-cut button button-main mt-5 min-h-touch w-full lg:hidden">Show {total === 1 ? "1 entry" : `${total} entries`}</label>
      </div>
    </div>
  );
}

function SearchFailed({ message, onRetry }: { readonly message: string; readonly onRetry: () => void }) {
  return (
    <div className="mb-4">
      <Notice tone="stop" live="assertive" title="The search did not get through.">
        <p>{message} What you see is the last answer.</p>
        <Button className="mt-3" onClick={onRetry}>Try again</Button>
      </Notice>
    </div>
  );
}

/** Search field, facets and results; a plain form until the script is there, search as you type from then on. */
export function CatalogueSearch({ initial, initialChoice }: CatalogueSearchProps) {
  const { choice, setChoice, query, result, waiting } = useCatalogueSearch(initial, initialChoice);
  const { field, list, toFirst, onFieldKey, onListKey } = useResultKeys();
  const filters = chosenCount(choice);
  const clear = () => setChoice({ ...choice, ...NOTHING_CHOSEN });
  const onSubmit = (event: SubmitEvent) => {
    event.preventDefault();
    // While the answer to what was typed is still under way, the first row is that of another question.
    if (result.q.trim() === choice.q.trim()) toFirst();
  };
  const goTo = (page: number) => {
    setChoice({ ...choice, page });
    list.current?.scrollIntoView({ block: "start" });
  };
  return (
    <form action="/catalogue" method="get" role="search" onSubmit={onSubmit} className="grid gap-6 lg:grid-cols-[17rem_1fr] lg:gap-10">
      <SearchField q={choice.q} ref={field} onKeyDown={onFieldKey} onText={(q) => setChoice({ ...choice, q, page: 1 })} />
      <Narrowing filters={filters} total={result.total}>
        <FacetPanel groups={result.facets} isChosen={(facet, value) => choice[facet].includes(value)} onToggle={(facet, value) => setChoice(toggled(choice, facet, value))} />
      </Narrowing>
      <div className="min-w-0">
        <div className="mb-3 flex min-h-touch flex-wrap items-center justify-between gap-3">
          <h2 className="sr-only">Entries</h2>
          <ResultCount result={result} waiting={waiting} />
          {filters > 0 ? <Button onClick={clear}>Clear {filters === 1 ? "1 filter" : `${filters} filters`}</Button> : null}
        </div>
        {query.isError ? <SearchFailed message={query.error.message} onRetry={() => query.refetch()} /> : null}
        <ResultRemarks result={result} />
        {result.total === 0 && !waiting ? <NothingFound choice={choice} onClear={clear} /> : <ResultList hits={result.hits} busy={waiting} ref={list} onKeyDown={onListKey} />}
        <ResultPaging choice={choice} page={result.page} pages={result.pages} onPage={goTo} />
      </div>
    </form>
  );
}
