import "server-only";
import { transact } from "@/db/client";
import { assertPermission, type Person } from "@/lib/auth/permissions";
import { revokeSession } from "@/lib/auth/session-rows";
import { notFound } from "@/lib/errors";
import { parseInput } from "@/lib/parse";
import { recordAudit } from "./record-audit";
import { revokeSessionSchema } from "./schemas";

/**
 * Sign one of one's own browsers out; it takes effect with that browser's next request.
 * @throws AppError not-allowed (403), invalid-input (400), not-found (404), also for other people's sessions
 */
export async function revokeOwnSession(person: Person, input: unknown): Promise<void> {
  assertPermission(person, "account:own");
  const { sessionId } = parseInput(revokeSessionSchema, input);
  await transact(async (tx) => {
    if ((await revokeSession(tx, person.id, sessionId)) === 0) throw notFound("session");
    await recordAudit(tx, { personId: person.id, verb: "session:revoke", subjectType: "session", subjectId: sessionId });
  });
}
