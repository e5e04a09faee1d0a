import "server-only";
import { readDb } from "@/db/client";
import { assertPermission, type Person } from "@/lib/auth/permissions";
import { openSessions, type SessionRow } from "@/lib/auth/session-rows";

/**
 * The browsers this person is signed in with, last used first.
 * @throws AppError not-allowed (403)
 */
export async function listOwnSessions(person: Person): Promise<SessionRow[]> {
  assertPermission(person, "account:own");
  return openSessions(readDb(), person.id);
}
