import "server-only";
import { asc, eq, isNotNull, isNull } from "drizzle-orm";
import { readDb } from "@/db/client";
import { checks, entries, entryVersions, machines, people } from "@/db/schema";
import { assertPermission, type Person } from "@/lib/auth/permissions";
import type { MachineChoice } from "./check-view";

export interface LogChoices {
  readonly machines: readonly MachineChoice[];
  readonly entries: readonly { readonly id: string; readonly name: string }[];
  readonly people: readonly { readonly id: string; readonly name: string }[];
}

/** Machines in use, by fleet number. @throws AppError not-allowed (403) */
export async function machineChoices(person: Person): Promise<readonly MachineChoice[]> {
  assertPermission(person, "machine:read");
  return readDb().select({ id: machines.id, fleetNumber: machines.fleetNumber, name: machines.name })
    .from(machines).where(isNull(machines.retiredAt)).orderBy(asc(machines.fleetNumber));
}

/** What the log can be filtered by: only entries and people that have checks. @throws AppError not-allowed (403) */
export async function logChoices(person: Person): Promise<LogChoices> {
  assertPermission(person, "check:read");
  const db = readDb();
  const [byMachine, byEntry, byPerson] = await Promise.all([
    machineChoices(person),
    db.selectDistinct({ id: entries.id, name: entryVersions.name }).from(checks)
      .innerJoin(entries, eq(entries.id, checks.entryId)).innerJoin(entryVersions, eq(entryVersions.id, entries.currentVersionId))
      .where(isNotNull(checks.entryId)).orderBy(asc(entryVersions.name)),
    db.selectDistinct({ id: people.id, name: people.name }).from(checks).innerJoin(people, eq(people.id, checks.personId)).orderBy(asc(people.name)),
  ]);
  return { machines: byMachine, entries: byEntry, people: byPerson };
}
