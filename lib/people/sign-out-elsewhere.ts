import "server-only";
import { transact } from "@/db/client";
import { assertPermission, type Person } from "@/lib/auth/permissions";
import { revokeSessions } from "@/lib/auth/session-rows";
import { recordAudit } from "./record-audit";

/**
 * Sign every other browser of a person out.
 * @param keep the session that asks and stays
 * @returns how many were signed out
 * @throws AppError not-allowed (403)
 */
export async function signOutElsewhere(person: Person, keep: string): Promise<number> {
  assertPermission(person, "account:own");
  return transact(async (tx) => {
    const count = await revokeSessions(tx, person.id, keep);
    await recordAudit(tx, { personId: person.id, verb: "session:revoke-others", subjectType: "person", subjectId: person.id, detail: { count } });
    return count;
  });
}
