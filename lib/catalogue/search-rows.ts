import "server-only";
import { and, eq, inArray, isNull, sql } from "drizzle-orm";
import type { Reader } from "@/db/client";
import { entries, entryVersions } from "@/db/schema";
import type { Kind } from "@/lib/diagnosis";
import type { EntryData } from "./entry-data";

/** One entry as far as filters and ranking need it. */
export interface SearchRow {
  readonly id: string;
  readonly slug: string;
  readonly name: string;
  readonly kind: Kind;
  readonly maker: string;
  readonly quantity: string;
  readonly connector: string;
  readonly supply: string;
  /** "BN/BU/BK" in cavity order. */
  readonly colours: string;
}

const shown = and(eq(entryVersions.id, entries.currentVersionId), isNull(entries.retiredAt));

/** Rows of the entries shown; only those with the given ids when there are any to go by. */
export async function searchRows(db: Reader, ids: ReadonlySet<string> | null): Promise<readonly SearchRow[]> {
  const wanted = ids ? sql`AND e.id IN (SELECT value FROM json_each(${JSON.stringify([...ids])}))` : sql``;
  // As one JSON text: five thousand rows handed over one by one take four times as long.
  const [answer] = await db.all<{ rows: string }>(sql`
    SELECT json_group_array(json_object('id', e.id, 'slug', e.slug, 'name', v.name, 'kind', v.kind, 'maker', v.maker,
      'quantity', v.quantity, 'connector', v.connector_shape, 'supply', v.supply, 'colours', v.colours)) AS rows
    FROM entries e JOIN entry_versions v ON v.id = e.current_version_id WHERE e.retired_at IS NULL ${wanted}`);
  return JSON.parse(answer?.rows ?? "[]") as SearchRow[];
}

/** Part numbers by entry id, for the rows that are ranked: they stand in the data, which a whole catalogue would read in vain. */
export async function partNumbersOf(db: Reader, rows: readonly SearchRow[]): Promise<ReadonlyMap<string, readonly string[]>> {
  const found = await db.select({ id: entries.id, parts: sql<string>`json_extract(${entryVersions.data}, '$.partNumbers')` })
    .from(entries).innerJoin(entryVersions, and(shown, sql`${entries.id} IN (SELECT value FROM json_each(${JSON.stringify(rows.map((row) => row.id))}))`));
  return new Map(found.map((row) => [row.id, JSON.parse(row.parts) as string[]]));
}

/** Full data of a page of entries, by entry id. */
export async function dataOf(db: Reader, ids: readonly string[]): Promise<ReadonlyMap<string, EntryData>> {
  if (ids.length === 0) return new Map();
  const rows = await db.select({ id: entries.id, data: entryVersions.data }).from(entries).innerJoin(entryVersions, and(shown, inArray(entries.id, [...ids])));
  return new Map(rows.map((row) => [row.id, row.data]));
}
