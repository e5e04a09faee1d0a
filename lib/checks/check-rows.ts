import "server-only";
import { and, asc, eq, or, type SQL } from "drizzle-orm";
import type { Reader, Writer } from "@/db/client";
import { checks, checkSteps } from "@/db/schema";
import type { Person } from "@/lib/auth/permissions";
import { AppError, notFound } from "@/lib/errors";
import type { RunStep } from "./run";

export type CheckRecord = typeof checks.$inferSelect;

/** What this person may open: every finished check of the workshop, and their own whatever its state. */
export function visibleTo(person: Pick<Person, "id">): SQL | undefined {
  return or(eq(checks.state, "finished"), eq(checks.personId, person.id));
}

/**
 * One check within what the person may see.
 * @throws AppError not-found (404), whether it does not exist or is somebody else's running one
 */
export async function visibleCheck(db: Reader | Writer, person: Pick<Person, "id">, id: string): Promise<CheckRecord> {
  const [row] = await db.select().from(checks).where(and(eq(checks.id, id), visibleTo(person))).limit(1);
  if (!row) throw notFound("check");
  return row;
}

/** A check of this person's own, in any state. @throws AppError not-found (404) */
export async function ownCheck(db: Reader | Writer, person: Pick<Person, "id">, id: string): Promise<CheckRecord> {
  const [row] = await db.select().from(checks).where(and(eq(checks.id, id), eq(checks.personId, person.id))).limit(1);
  if (!row) throw notFound("check");
  return row;
}

/** @throws AppError check-closed (409) when the check is no longer running */
export function assertRunning(row: Pick<CheckRecord, "state">): void {
  if (row.state === "running") return;
  throw new AppError("check-closed", `This check is ${row.state} and takes nothing more. Start a re-check instead.`, 409);
}

/** A check's steps in the order they were made: ids are ULIDs, so text order is time order. */
export async function stepsOf(db: Reader | Writer, checkId: string): Promise<RunStep[]> {
  const rows = await db.select({ step: checkSteps.step }).from(checkSteps).where(eq(checkSteps.checkId, checkId)).orderBy(asc(checkSteps.id));
  return rows.map((row) => row.step);
}
