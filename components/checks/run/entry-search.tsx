"use client";

import { useQuery } from "@tanstack/react-query";
import Link from "next/link";
import { useDeferredValue, useState } from "react";
import { Field, TextInput } from "@/components/ui";
import type { SearchResult } from "@/lib/catalogue/search-result";

async function search(q: string, signal: AbortSignal): Promise<SearchResult> {
  const response = await fetch(`/api/catalogue/search?q=${encodeURIComponent(q)}`, { signal });
  if (!response.ok) throw new Error(`search answered ${response.status}`);
  return (await response.json()) as SearchResult;
}

/** Looks for the device in the catalogue; picking one starts the form from its entry. */
export function EntrySearch() {
  const [text, setText] = useState("");
  const q = useDeferredValue(text.trim());
  const { data, isError, isFetching } = useQuery({ queryKey: ["catalogue", q], queryFn: ({ signal }) => search(q, signal), enabled: q.length > 1 });
  const hits = q.length > 1 ? data?.hits.slice(0, 6) ?? [] : [];
  return (
    <div className="grid gap-2">
      <Field label="Is it in the catalogue?" hint="Part number, name, maker or wire colours">
        <TextInput type="search" value={text} onChange={(event) => setText(event.target.value)} autoComplete="off" />
      </Field>
      <p role="status" className="text-quiet">
        {isError ? "The catalogue does not answer. Carry on as unknown below." : q.length > 1 && !isFetching && data && hits.length === 0 ? "Nothing fits. Carry on as unknown below." : ""}
      </p>
      <ul className="grid gap-2">
        {hits.map((hit) => (
          <li key={hit.slug}>
            <Link href={`/checks/new?entry=${hit.slug}`} className="tag-cut button button-plain min-h-touch w-full flex-col items-start gap-0 px-4 py-2 text-left">
              <span>{hit.name}</span>
              <span className="font-normal text-quiet">{hit.maker} · {hit.partNumbers.join(", ")} · {hit.pins.map((pin) => pin.colour).join("/")}</span>
            </Link>
          </li>
        ))}
      </ul>
    </div>
  );
}
