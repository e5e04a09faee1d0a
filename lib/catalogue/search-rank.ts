import Fuse from "fuse.js";
import { KIND_NAMES } from "./kind-names";
import { foldWords } from "./words";
import type { SearchRow } from "./search-rows";

/** So many are ranked; a query that fits more says too little to rank by, and names in order serve better. */
const MOST_RANKED = 400;

const folded = (text: string) => foldWords(text).join(" ");

interface Ranked { readonly row: SearchRow; readonly parts: readonly string[] }

const KEYS = [
  { name: "parts", weight: 5, getFn: ({ parts }: Ranked) => parts.map(folded) },
  { name: "name", weight: 4, getFn: ({ row }: Ranked) => folded(row.name) },
  { name: "maker", weight: 2, getFn: ({ row }: Ranked) => folded(row.maker) },
  { name: "quantity", weight: 2, getFn: ({ row }: Ranked) => folded(row.quantity) },
  { name: "kind", weight: 1, getFn: ({ row }: Ranked) => folded(KIND_NAMES[row.kind]) },
  { name: "connector", weight: 1, getFn: ({ row }: Ranked) => folded(row.connector) },
  { name: "colours", weight: 1, getFn: ({ row }: Ranked) => folded(row.colours) },
];

// Plain comparison: names are ASCII, and a collator over a whole catalogue costs more than the search.
const compare = (a: string, b: string) => (a < b ? -1 : a > b ? 1 : 0);
const byName = (a: SearchRow, b: SearchRow) => compare(a.name, b.name) || compare(a.slug, b.slug);

/** Rows in the order of their names; the order where there is nothing to rank by. */
export function sortByName(rows: readonly SearchRow[]): readonly SearchRow[] {
  return [...rows].sort(byName);
}

/** Does ranking serve: words to rank by, and few enough rows that they say something? */
export function worthRanking(rows: readonly SearchRow[], words: readonly string[]): boolean {
  return words.length > 0 && rows.length > 1 && rows.length <= MOST_RANKED;
}

/**
 * Best first: fuse.js weighs where each word was met (part number before name before the rest); what it does not
 * score follows by name. Ties by name, so that the same query always gives the same order.
 * @param parts part numbers by entry id
 */
export function rankRows(rows: readonly SearchRow[], parts: ReadonlyMap<string, readonly string[]>, words: readonly string[]): readonly SearchRow[] {
  const sorted = sortByName(rows);
  const items: Ranked[] = sorted.map((row) => ({ row, parts: parts.get(row.id) ?? [] }));
  const fuse = new Fuse(items, { keys: KEYS, useTokenSearch: true, tokenMatch: "any", ignoreLocation: true, includeScore: true, threshold: 0.35 });
  const ranked = fuse.search(words.join(" ")).map((result) => result.item.row);
  const seen = new Set(ranked.map((row) => row.id));
  return [...ranked, ...sorted.filter((row) => !seen.has(row.id))];
}
