"use client";

import { keepPreviousData, useQuery } from "@tanstack/react-query";
import { useSearchParams } from "next/navigation";
import { useEffect, useState } from "react";
import { choiceOf, paramsOf, type SearchChoice } from "@/lib/catalogue/search-params";
import type { SearchResult } from "@/lib/catalogue/search-result";

/** Long enough to skip the letters between, short enough to feel at once. */
const TYPING_PAUSE_MS = 140;

async function fetchSearch(params: string, signal: AbortSignal): Promise<SearchResult> {
  const response = await fetch(`/api/catalogue/search?${params}`, { signal, headers: { accept: "application/json" } });
  const body: unknown = await response.json().catch(() => null);
  if (response.ok && body) return body as SearchResult;
  const error = (body as { error?: { message?: string } } | null)?.error;
  throw new Error(error?.message ?? "The workshop's server did not answer.");
}

/** The value once it has stopped changing for `ms` milliseconds. */
function useSettled<T>(value: T, ms: number): T {
  const [settled, setSettled] = useState(value);
  useEffect(() => {
    const timer = setTimeout(() => setSettled(value), ms);
    return () => clearTimeout(timer);
  }, [value, ms]);
  return settled;
}

/**
 * Search as you type: starts from what the server rendered, keeps the last answer on screen while the next one
 * is under way, and writes the choice into the address so that it can be shared, reloaded and gone back to.
 */
export function useCatalogueSearch(initial: SearchResult, initialChoice: SearchChoice) {
  // From the address, not from what the server rendered: on the way back the page kept by the router may be older.
  const address = useSearchParams();
  const [choice, setChoice] = useState(() => choiceOf(new URLSearchParams(address)));
  const q = useSettled(choice.q, TYPING_PAUSE_MS);
  const params = paramsOf({ ...choice, q }).toString();
  const initialParams = paramsOf(initialChoice).toString();

  useEffect(() => {
    const own = params === "" ? "/catalogue" : `/catalogue?${params}`;
    if (`${window.location.pathname}${window.location.search}` !== own) window.history.replaceState(null, "", own);
  }, [params]);

  const query = useQuery({
    queryKey: ["catalogue-search", params],
    queryFn: ({ signal }) => fetchSearch(params, signal),
    initialData: params === initialParams ? initial : undefined,
    placeholderData: keepPreviousData,
  });
  // After a failure there is no data under the new key: what was answered last stays on screen.
  const [result, setResult] = useState(initial);
  if (query.data && query.data !== result) setResult(query.data);
  return { choice, setChoice, query, result, waiting: query.isFetching && (query.isPlaceholderData || query.isError) };
}
