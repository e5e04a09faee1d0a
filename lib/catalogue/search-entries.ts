import "server-only";
import { type Reader, readDb } from "@/db/client";
import { assertPermission, type Person } from "@/lib/auth/permissions";
import { parseInput } from "@/lib/parse";
import type { EntryData } from "./entry-data";
import { pinsInOrder } from "./expect-of-entry";
import { searchEntriesSchema } from "./schemas";
import { findCandidates } from "./search-candidates";
import { facetGroups, filterRows } from "./search-facets";
import { rankRows, sortByName, worthRanking } from "./search-rank";
import type { SearchHit, SearchResult } from "./search-result";
import { dataOf, partNumbersOf, searchRows, type SearchRow } from "./search-rows";
import { supplyWords } from "./supply-words";
import { queryWords } from "./words";

const PAGE_SIZE = 20;

function hit(row: SearchRow, data: EntryData): SearchHit {
  return {
    slug: row.slug, name: data.name, maker: data.maker, partNumbers: data.partNumbers, kind: data.kind, senses: data.senses,
    connector: data.connector.name, gender: data.connector.gender, supply: supplyWords(data.supply),
    pins: pinsInOrder(data).map(({ role, cavity, colour }) => ({ role, cavity, colour })),
  };
}

/** The search itself, without the question who asks: for benchmarks and the verb below. */
export async function search(db: Reader, input: unknown): Promise<SearchResult> {
  const wanted = parseInput(searchEntriesSchema, input);
  const words = queryWords(wanted.q);
  const candidates = words.length > 0 ? await findCandidates(db, words) : null;
  const rows = await searchRows(db, candidates?.ids ?? null);
  const fitting = filterRows(rows, wanted);
  const ranked = worthRanking(fitting, words) ? rankRows(fitting, await partNumbersOf(db, fitting), words) : sortByName(fitting);
  const pages = Math.max(1, Math.ceil(ranked.length / PAGE_SIZE));
  const page = Math.min(wanted.page, pages);
  const onPage = ranked.slice((page - 1) * PAGE_SIZE, page * PAGE_SIZE);
  const data = await dataOf(db, onPage.map((row) => row.id));
  return {
    q: wanted.q, total: ranked.length, page, pages,
    relaxed: candidates?.relaxed ?? false, corrected: candidates?.corrected ?? [],
    hits: onPage.flatMap((row) => { const entry = data.get(row.id); return entry ? [hit(row, entry)] : []; }),
    facets: facetGroups(rows, wanted),
  };
}

/**
 * Search the catalogue as typed: part numbers with or without punctuation, words with up to two wrong letters, wire colours
 * as letters or words, connectors, kinds; narrowed by facets. A page past the end gives the last one.
 * @throws AppError not-allowed (403), invalid-input (400)
 */
export async function searchEntries(person: Person, input: unknown): Promise<SearchResult> {
  assertPermission(person, "catalogue:read");
  return search(readDb(), input);
}
