import "server-only";
import { desc, eq, lt } from "drizzle-orm";
import { readDb } from "@/db/client";
import { auditRows, people } from "@/db/schema";
import { assertPermission, type Person } from "@/lib/auth/permissions";

export interface AuditLine {
  readonly id: string;
  readonly at: Date;
  readonly who: string | null;
  readonly verb: string;
  readonly subjectType: string;
  readonly subjectId: string;
  readonly detail: Readonly<Record<string, unknown>>;
}

export interface AuditPage { readonly lines: readonly AuditLine[]; /** Id to go on from, or null at the end. */ readonly next: string | null }

const PAGE = 30;

/**
 * What was done, newest first, a page at a time.
 * @param before id of the last line seen; ids are ULIDs, so they order by time
 * @throws AppError not-allowed (403)
 */
export async function listAudit(person: Person, before?: string): Promise<AuditPage> {
  assertPermission(person, "audit:read");
  const rows = await readDb()
    .select({ id: auditRows.id, at: auditRows.at, who: people.name, verb: auditRows.verb, subjectType: auditRows.subjectType, subjectId: auditRows.subjectId, detail: auditRows.detail })
    .from(auditRows).leftJoin(people, eq(people.id, auditRows.personId))
    .where(before ? lt(auditRows.id, before) : undefined)
    .orderBy(desc(auditRows.id)).limit(PAGE + 1);
  const lines = rows.slice(0, PAGE);
  return { lines, next: rows.length > PAGE ? (lines.at(-1)?.id ?? null) : null };
}
