import "server-only";
import { readDb } from "@/db/client";
import { assertPermission, type Person } from "@/lib/auth/permissions";
import type { Experience } from "@/lib/diagnosis";
import { chanceTable, type ChanceTable } from "./chance-rows";
import { NO_EXPERIENCE, ownChecks } from "./experience";
import { countConfirmed, experienceInForce, setAsideSince } from "./experience-rows";

export interface Chances extends ChanceTable {
  /** Confirmed checks of the workshop that are in force. */
  readonly ownChecks: number;
  /** Who set own checks aside and when (ISO 8601, UTC); null while they count. */
  readonly setAside: { readonly by: string; readonly at: string } | null;
}

/**
 * What a check believes before its first reading, and what the workshop's own checks have done to it.
 * @throws AppError not-allowed (403)
 */
export async function showChances(person: Person): Promise<Chances> {
  assertPermission(person, "check:read");
  const db = readDb();
  const [own, inForce, aside] = await Promise.all([countConfirmed(db), experienceInForce(db), setAsideSince(db)]);
  return {
    ...chanceTable(own, inForce), ownChecks: ownChecks(own),
    setAside: aside ? { by: aside.by, at: aside.at.toISOString() } : null,
  };
}

/**
 * The counts that a check started from this page is to be judged by, for the phone to take along; empty where there are
 * none. The server takes them back only because it has given them out.
 * @throws AppError not-allowed (403)
 */
export async function experienceForPhone(person: Person): Promise<Experience> {
  assertPermission(person, "check:run");
  return (await experienceInForce(readDb())) ?? NO_EXPERIENCE;
}
