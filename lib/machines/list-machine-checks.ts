import "server-only";
import { and, count, desc, eq, ne } from "drizzle-orm";
import { readDb } from "@/db/client";
import { checks, confirmations, entryVersions, people } from "@/db/schema";
import { assertPermission, type Person } from "@/lib/auth/permissions";
import { CONFIRMED_COLUMNS, confirmedWords, inForce } from "@/lib/checks/confirmed";
import { parseInput } from "@/lib/parse";
import { listMachineChecksSchema } from "./schemas";

export interface MachineCheck {
  readonly id: string;
  readonly startedAt: Date;
  readonly finished: boolean;
  readonly person: string;
  /** Name of the entry checked, in the version used; null for an unknown device. */
  readonly entry: string | null;
  /** The verdict's sentence; null while the check runs. */
  readonly sentence: string | null;
  /** What it turned out to be, in a few words; null while nothing is confirmed. */
  readonly confirmed: string | null;
}

/**
 * The newest checks made on a machine, abandoned ones left out, and how many there are in all.
 * @throws AppError not-allowed (403), invalid-input (400)
 */
export async function listMachineChecks(person: Person, input: unknown): Promise<{ readonly total: number; readonly newest: readonly MachineCheck[] }> {
  assertPermission(person, "check:read");
  const { id, limit } = parseInput(listMachineChecksSchema, input);
  const db = readDb();
  const mine = and(eq(checks.machineId, id), ne(checks.state, "abandoned"));
  const [all] = await db.select({ total: count() }).from(checks).where(mine);
  const rows = await db.select({
    id: checks.id, startedAt: checks.startedAt, state: checks.state, verdict: checks.verdict, person: people.name, entry: entryVersions.name, ...CONFIRMED_COLUMNS,
  }).from(checks).innerJoin(people, eq(people.id, checks.personId)).leftJoin(entryVersions, eq(entryVersions.id, checks.entryVersionId))
    .leftJoin(confirmations, inForce).where(mine).orderBy(desc(checks.startedAt), desc(checks.id)).limit(limit);
  const newest = rows.map(({ verdict, state, setup, confirmedCode, confirmedPins, ...row }) => ({
    ...row, finished: state === "finished", sentence: verdict?.sentence ?? null, confirmed: confirmedWords({ setup, confirmedCode, confirmedPins }),
  }));
  return { total: all?.total ?? 0, newest };
}
