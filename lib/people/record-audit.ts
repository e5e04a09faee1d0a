import "server-only";
import { ulid } from "ulid";
import type { Writer } from "@/db/client";
import { auditRows } from "@/db/schema";

export interface AuditEntry {
  /** Who did it; null for the system itself. */
  readonly personId: string | null;
  /** The verb in the form "area:verb", e.g. "check:finish". */
  readonly verb: string;
  readonly subjectType: string;
  readonly subjectId: string;
  /** What changed; never passwords or anything that signs in. */
  readonly detail?: Readonly<Record<string, unknown>>;
}

/** The last step of every write, in the same transaction as the change. */
export async function recordAudit(tx: Writer, entry: AuditEntry, now = new Date()): Promise<void> {
  await tx.insert(auditRows).values({ id: ulid(now.getTime()), at: now, ...entry, detail: entry.detail ?? {} });
}
