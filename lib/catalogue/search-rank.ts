import Fuse from "fuse.js";
import { foldWords, KIND_NAMES } from "./words";
import type { SearchRow } from "./search-rows";

/** So many are ranked; a query that fits more says too little to rank by, and names in order serve better. */
const MOST_RANKED = 400;

const folded = (text: string) => foldWords(text).join(" ");

const KEYS = [
  { name: "parts", weight: 5, getFn: (row: SearchRow) => row.partNumbers.map(folded) },
  { name: "name", weight: 4, getFn: (row: SearchRow) => folded(row.name) },
  { name: "maker", weight: 2, getFn: (row: SearchRow) => folded(row.maker) },
  { name: "quantity", weight: 2, getFn: (row: SearchRow) => folded(row.quantity) },
  { name: "kind", weight: 1, getFn: (row: SearchRow) => folded(KIND_NAMES[row.kind]) },
  { name: "connector", weight: 1, getFn: (row: SearchRow) => folded(row.connector) },
  { name: "colours", weight: 1, getFn: (row: SearchRow) => folded(row.colours) },
];

const byName = (a: SearchRow, b: SearchRow) => a.name.localeCompare(b.name, "en") || (a.slug < b.slug ? -1 : 1);

/**
 * Best first: fuse.js weighs where each word was met (part number before name before the rest); what it does not
 * score follows by name. Ties by name, so that the same query always gives the same order.
 */
export function rankRows(rows: readonly SearchRow[], words: readonly string[]): readonly SearchRow[] {
  const sorted = [...rows].sort(byName);
  if (words.length === 0 || sorted.length > MOST_RANKED) return sorted;
  const fuse = new Fuse(sorted, { keys: KEYS, useTokenSearch: true, tokenMatch: "any", ignoreLocation: true, includeScore: true, threshold: 0.35 });
  const ranked = fuse.search(words.join(" ")).map((result) => result.item);
  const seen = new Set(ranked.map((row) => row.id));
  return [...ranked, ...sorted.filter((row) => !seen.has(row.id))];
}
