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
  readonly partNumbers: readonly string[];
}

const shown = and(eq(entryVersions.id, entries.currentVersionId), isNull(entries.retiredAt));

/** Rows of the entries shown; only those with the given ids when there are any to go by. */
export async function searchRows(db: Reader, ids: ReadonlySet<string> | null): Promise<readonly SearchRow[]> {
  const wanted = ids ? sql`${entries.id} IN (SELECT value FROM json_each(${JSON.stringify([...ids])}))` : undefined;
  return db.select({
    id: entries.id, slug: entries.slug, name: entryVersions.name, kind: sql<Kind>`${entryVersions.kind}`, maker: entryVersions.maker,
    quantity: entryVersions.quantity, connector: entryVersions.connectorShape, supply: entryVersions.supply, colours: entryVersions.colours,
    // Part numbers matter for ranking only; without a query they would be read for the whole catalogue in vain.
    partNumbers: ids ? sql<string[]>`json_extract(${entryVersions.data}, '$.partNumbers')`.mapWith((text: string) => JSON.parse(text) as string[]) : sql<string[]>`'[]'`.mapWith(() => []),
  }).from(entries).innerJoin(entryVersions, and(shown, wanted));
}

/** Full data of a page of entries, by entry id. */
export async function dataOf(db: Reader, ids: readonly string[]): Promise<ReadonlyMap<string, EntryData>> {
  if (ids.length === 0) return new Map();
  const rows = await db.select({ id: entries.id, data: entryVersions.data }).from(entries).innerJoin(entryVersions, and(shown, inArray(entries.id, [...ids])));
  return new Map(rows.map((row) => [row.id, row.data]));
}
