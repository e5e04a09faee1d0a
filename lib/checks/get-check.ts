import "server-only";
import { and, asc, eq } from "drizzle-orm";
import { readDb } from "@/db/client";
import { checks, entries, entryVersions, machines, meters, people } from "@/db/schema";
import { assertPermission, type Person } from "@/lib/auth/permissions";
import { stepsOf, visibleCheck, visibleTo } from "./check-rows";
import type { CheckView } from "./check-view";
import { confirmationsOf } from "./list-confirmations";
import { readVerdict } from "./stored-verdict";

async function namesOf(check: typeof checks.$inferSelect) {
  const [row] = await readDb().select({
    personName: people.name, fleetNumber: machines.fleetNumber, machineName: machines.name, meterName: meters.name,
    slug: entries.slug, entryName: entryVersions.name, version: entryVersions.version,
  }).from(checks)
    .innerJoin(people, eq(people.id, checks.personId))
    .leftJoin(machines, eq(machines.id, checks.machineId)).leftJoin(meters, eq(meters.id, checks.meterId))
    .leftJoin(entryVersions, eq(entryVersions.id, checks.entryVersionId)).leftJoin(entries, eq(entries.id, entryVersions.entryId))
    .where(eq(checks.id, check.id)).limit(1);
  return row;
}

/**
 * One check with everything that a page shows of it. Finished checks are open to the whole workshop, running and
 * abandoned ones only to the person who made them.
 * @throws AppError not-allowed (403), not-found (404)
 */
export async function getCheck(person: Person, id: string): Promise<CheckView> {
  assertPermission(person, "check:read");
  const check = await visibleCheck(readDb(), person, id);
  const names = await namesOf(check);
  const rechecks = await readDb().select({ id: checks.id, state: checks.state, startedAt: checks.startedAt })
    .from(checks).where(and(eq(checks.recheckOf, id), visibleTo(person))).orderBy(asc(checks.startedAt), asc(checks.id));
  return {
    id, setup: check.setup, steps: await stepsOf(readDb(), id), state: check.state,
    person: { id: check.personId, name: names?.personName ?? "" },
    startedAt: check.startedAt.toISOString(), finishedAt: check.finishedAt?.toISOString() ?? null,
    verdict: readVerdict(check.verdict),
    machine: check.machineId && names?.fleetNumber ? { id: check.machineId, fleetNumber: names.fleetNumber, name: names.machineName ?? "" } : null,
    entry: check.entryId && names?.slug ? { id: check.entryId, slug: names.slug, name: names.entryName ?? "", version: names.version ?? 0 } : null,
    meterName: names?.meterName ?? null,
    confirmations: check.state === "finished" ? await confirmationsOf(person, id) : [],
    recheckOf: check.recheckOf,
    rechecks: rechecks.map((row) => ({ ...row, startedAt: row.startedAt.toISOString() })),
  };
}
