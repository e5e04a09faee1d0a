import "server-only";
import { and, count, eq, max, sql } from "drizzle-orm";
import { type Reader, readDb } from "@/db/client";
import { checks, entries, entryVersions, people } from "@/db/schema";
import { assertPermission, type Person } from "@/lib/auth/permissions";
import { notFound } from "@/lib/errors";
import { parseInput } from "@/lib/parse";
import type { EntryData } from "./entry-data";
import { getEntrySchema } from "./schemas";

/** How finished checks bear an entry out. */
export interface Confirmations {
  /** Finished checks made with this entry. */
  readonly finished: number;
  /** Those that found the entry's kind of device with sound wiring. */
  readonly confirmed: number;
  readonly lastConfirmedAt: Date | null;
}

export interface EntryView {
  readonly id: string;
  readonly slug: string;
  readonly versionId: string;
  readonly version: number;
  /** Number of the version the catalogue shows; null when the entry is retired or still a draft. */
  readonly shownVersion: number | null;
  readonly retired: boolean;
  readonly publishedBy: string;
  readonly publishedAt: Date;
  readonly data: EntryData;
  readonly confirmations: Confirmations;
}

async function confirmationsOf(db: Reader, entryId: string, kind: string): Promise<Confirmations> {
  const [all] = await db.select({ finished: count() }).from(checks).where(and(eq(checks.entryId, entryId), eq(checks.state, "finished")));
  const [sound] = await db.select({ confirmed: count(), last: max(checks.finishedAt) }).from(checks)
    .where(and(eq(checks.entryId, entryId), eq(checks.state, "finished"), eq(checks.kind, kind), eq(checks.findingCode, "none")));
  return { finished: all?.finished ?? 0, confirmed: sound?.confirmed ?? 0, lastConfirmedAt: sound?.last ?? null };
}

/**
 * One entry by its slug, in the version shown or in an older one.
 * @throws AppError not-allowed (403), invalid-input (400), not-found (404)
 */
export async function getEntry(person: Person, input: unknown): Promise<EntryView> {
  assertPermission(person, "catalogue:read");
  const { slug, version } = parseInput(getEntrySchema, input);
  const db = readDb();
  const wanted = version === undefined ? eq(entryVersions.id, entries.currentVersionId) : eq(entryVersions.version, version);
  const [row] = await db.select({
    id: entries.id, slug: entries.slug, retiredAt: entries.retiredAt, versionId: entryVersions.id, version: entryVersions.version,
    publishedBy: people.name, publishedAt: entryVersions.publishedAt, data: entryVersions.data,
    shownVersion: sql<number | null>`(SELECT version FROM entry_versions AS shown WHERE shown.id = ${entries.currentVersionId})`,
  }).from(entries).innerJoin(entryVersions, and(eq(entryVersions.entryId, entries.id), wanted))
    .innerJoin(people, eq(people.id, entryVersions.publishedBy)).where(eq(entries.slug, slug));
  if (!row) throw notFound("entry");
  const { retiredAt, ...view } = row;
  return { ...view, retired: retiredAt !== null, confirmations: await confirmationsOf(db, row.id, row.data.kind) };
}
