import "server-only";
import { eq } from "drizzle-orm";
import { ulid } from "ulid";
import { transact, type Writer } from "@/db/client";
import { entries, entryVersions } from "@/db/schema";
import { assertPermission, type Person } from "@/lib/auth/permissions";
import { AppError } from "@/lib/errors";
import { parseInput } from "@/lib/parse";
import { recordAudit } from "@/lib/people/record-audit";
import { publishEntrySchema } from "./schemas";
import { versionColumns } from "./version-row";

export interface PublishedEntry { readonly entryId: string; readonly versionId: string; readonly version: number; readonly slug: string }

async function shownVersion(tx: Writer, slug: string): Promise<{ id: string; version: number; retired: boolean } | null> {
  const [row] = await tx.select({ id: entries.id, version: entryVersions.version, retiredAt: entries.retiredAt })
    .from(entries).leftJoin(entryVersions, eq(entryVersions.id, entries.currentVersionId)).where(eq(entries.slug, slug));
  return row ? { id: row.id, version: row.version ?? 0, retired: row.retiredAt !== null } : null;
}

/**
 * Publish a new version of an entry, or its first one; older versions stay as they are.
 * @throws AppError not-allowed (403), invalid-input (400), entry-changed (409: somebody published since `basedOn`), entry-retired (409)
 */
export async function publishEntry(person: Person, input: unknown, now = new Date()): Promise<PublishedEntry> {
  assertPermission(person, "entry:publish");
  const { slug, data, basedOn } = parseInput(publishEntrySchema, input);
  return transact(async (tx) => {
    const before = await shownVersion(tx, slug);
    if (before?.retired) throw new AppError("entry-retired", "This entry is retired. Publish under a new name.", 409, "slug");
    if ((before?.version ?? 0) !== basedOn) {
      throw new AppError("entry-changed", `Version ${before?.version ?? 0} is shown now, yours was made from version ${basedOn}. Look at what changed and publish again.`, 409, "basedOn");
    }
    const entryId = before?.id ?? ulid(now.getTime());
    const versionId = ulid(now.getTime());
    const version = basedOn + 1;
    if (!before) await tx.insert(entries).values({ id: entryId, slug, currentVersionId: null, createdAt: now, retiredAt: null });
    await tx.insert(entryVersions).values({ id: versionId, entryId, version, publishedBy: person.id, publishedAt: now, ...versionColumns(data) });
    await tx.update(entries).set({ currentVersionId: versionId }).where(eq(entries.id, entryId));
    await recordAudit(tx, { personId: person.id, verb: "entry:publish", subjectType: "entry", subjectId: entryId, detail: { slug, version, versionId } }, now);
    return { entryId, versionId, version, slug };
  });
}
