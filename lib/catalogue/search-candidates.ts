import "server-only";
import { sql } from "drizzle-orm";
import Fuse from "fuse.js";
import type { Reader } from "@/db/client";

export interface Candidates {
  readonly ids: ReadonlySet<string>;
  /** True when no entry has all the words: those with most of them are given. */
  readonly relaxed: boolean;
  /** Words nobody has, with the nearest that were looked for instead. */
  readonly corrected: readonly { readonly typed: string; readonly used: readonly string[] }[];
}

interface Found { readonly ids: readonly string[]; readonly used?: readonly string[] }

/** One or two letters cannot make a trigram: they are the start of a word ("bn", "5v", "tf"). */
const SHORTEST_PART = 3;
const MOST_NEAR_WORDS = 12;
const MOST_ALIKE = 60;

const quoted = (word: string) => `"${word}"`;

/** Ids of one full-text question, as one JSON text: a common word has thousands, and row by row they take far longer. */
async function idsOf(db: Reader, table: "entry_words" | "entry_grams", match: string): Promise<string[]> {
  const [answer] = await db.all<{ ids: string }>(sql`SELECT json_group_array(entry_id) AS ids FROM ${sql.raw(table)} WHERE ${sql.raw(table)} MATCH ${match}`);
  return JSON.parse(answer?.ids ?? "[]") as string[];
}

const withPrefix = (db: Reader, word: string) => idsOf(db, "entry_words", `${quoted(word)}*`);
const withPart = (db: Reader, word: string) => idsOf(db, "entry_grams", quoted(word));
const withAnyWord = (db: Reader, words: readonly string[]) => idsOf(db, "entry_words", words.map(quoted).join(" OR "));

/** Letters of a misspelling that may be wrong: none in a short word, where everything is near everything. */
function errorsAllowed(word: string): number {
  return word.length < 4 ? 0 : word.length < 5 ? 1 : 2;
}

/**
 * Words of the catalogue that a misspelling may stand for, by length. Letters are compared with words, and what has a digit with part
 * numbers, or a large catalogue's part numbers would outweigh its words a hundred to one.
 */
async function vocabulary(db: Reader, word: string, errors: number, initial: boolean): Promise<readonly string[]> {
  // The range is answered from the index; without it every word of the catalogue is looked at.
  const range = initial ? sql`term >= ${word.slice(0, 1)} AND term < ${word.slice(0, 1) + "\uffff"} AND` : sql``;
  const digits = /[0-9]/.test(word) ? sql`term GLOB '*[0-9]*'` : sql`term NOT GLOB '*[0-9]*'`;
  const rows = await db.all<{ term: string }>(sql`SELECT term FROM entry_terms WHERE ${range} length(term) BETWEEN ${word.length - errors} AND ${word.length + errors} AND ${digits}`);
  return rows.map((row) => row.term);
}

function nearest(terms: readonly string[], word: string, errors: number): readonly string[] {
  const fuse = new Fuse(terms, { includeScore: true, ignoreLocation: true, ignoreFieldNorm: true, threshold: errors / word.length + 0.001 });
  const near = fuse.search(word, { limit: MOST_NEAR_WORDS });
  const best = near[0]?.score ?? 0;
  return near.filter((match) => (match.score ?? 1) <= best + 0.5 / word.length).map((match) => match.item);
}

/** Words of the catalogue within the errors allowed, nearest first: those with the same first letter, and only without any of them all others. */
async function nearWords(db: Reader, word: string): Promise<readonly string[]> {
  const errors = errorsAllowed(word);
  if (errors === 0) return [];
  const sameStart = nearest(await vocabulary(db, word, errors, true), word, errors);
  return sameStart.length > 0 ? sameStart : nearest(await vocabulary(db, word, errors, false), word, errors);
}

/** Last resort for words run together or badly spelled: entries that share at least half of the word's trigrams. */
async function alike(db: Reader, word: string): Promise<string[]> {
  const grams = Array.from({ length: word.length - 2 }, (_, i) => word.slice(i, i + 3));
  const rows = await db.all<{ id: string; words: string }>(
    sql`SELECT entry_id AS id, words FROM entry_grams WHERE entry_grams MATCH ${grams.map(quoted).join(" OR ")} ORDER BY rank LIMIT ${MOST_ALIKE}`,
  );
  return rows.filter(({ words }) => grams.filter((gram) => words.includes(gram)).length * 2 >= grams.length).map(({ id }) => id);
}

async function find(db: Reader, word: string): Promise<Found> {
  if (word.length < SHORTEST_PART) return { ids: await withPrefix(db, word) };
  const ids = await withPart(db, word);
  if (ids.length > 0) return { ids };
  const used = await nearWords(db, word);
  if (used.length > 0) return { ids: await withAnyWord(db, used), used };
  return { ids: await alike(db, word), used: [] };
}

/**
 * Entries that have the words of a query, by full-text search: a word counts as typed wherever it is part of a word;
 * only when nobody has it so, the nearest words of the catalogue stand in for it (two letters wrong at most).
 * @param words from `queryWords`, at least one
 */
export async function findCandidates(db: Reader, words: readonly string[]): Promise<Candidates> {
  const found = await Promise.all(words.map((word) => find(db, word)));
  const counts = new Map<string, number>();
  for (const { ids } of found) for (const id of new Set(ids)) counts.set(id, (counts.get(id) ?? 0) + 1);
  const most = Math.max(0, ...counts.values());
  const ids = new Set([...counts].filter(([, count]) => count === most).map(([id]) => id));
  const corrected = found.flatMap(({ used }, i) => (used ? [{ typed: words[i] ?? "", used }] : []));
  return { ids, relaxed: ids.size > 0 && most < words.length, corrected };
}
