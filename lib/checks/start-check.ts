import "server-only";
import { eq } from "drizzle-orm";
import { transact, type Writer } from "@/db/client";
import { checks, entryVersions, machines, meters } from "@/db/schema";
import { assertPermission, type Person } from "@/lib/auth/permissions";
import { AppError, notFound } from "@/lib/errors";
import { parseInput } from "@/lib/parse";
import { recordAudit } from "@/lib/people/record-audit";
import { visibleCheck } from "./check-rows";
import { fixExperience } from "./experience-rows";
import type { RunSetup } from "./run";
import { startCheckSchema } from "./schemas";

/** The things a setup names must exist; an entry's version must be that entry's. */
async function assertKnown(tx: Writer, person: Person, setup: RunSetup): Promise<void> {
  if (setup.entryVersionId || setup.entryId) {
    const [version] = await tx.select({ entryId: entryVersions.entryId }).from(entryVersions).where(eq(entryVersions.id, setup.entryVersionId ?? "")).limit(1);
    if (!version || version.entryId !== setup.entryId) throw notFound("version of an entry");
  }
  if (setup.machineId) {
    const [machine] = await tx.select({ id: machines.id }).from(machines).where(eq(machines.id, setup.machineId)).limit(1);
    if (!machine) throw notFound("machine");
  }
  if (setup.meterId) {
    const [meter] = await tx.select({ id: meters.id }).from(meters).where(eq(meters.id, setup.meterId)).limit(1);
    if (!meter) throw notFound("meter");
  }
  if (setup.recheckOf) await visibleCheck(tx, person, setup.recheckOf);
}

/** The phone's clock may be wrong: never later than now. */
function startOf(claimed: string | undefined, now: Date): Date {
  const at = claimed ? new Date(claimed) : now;
  return at > now ? now : at;
}

/** What of a start is worth a note beside who and when. */
function detailOf(setup: RunSetup, replaced: boolean): Readonly<Record<string, unknown>> {
  return { ...(setup.recheckOf ? { recheckOf: setup.recheckOf } : {}), ...(replaced ? { experience: "replaced by the counts in force" } : {}) };
}

/**
 * Starts a check under the id that the phone made. Starting the same one again changes nothing. The workshop's own
 * counts are fixed into the setup here: those the phone judges by where the workshop once gave them out, else those in force.
 * @throws AppError invalid-input (400), not-found (404), id-in-use (409)
 */
export async function startCheck(person: Person, input: unknown, now = new Date()): Promise<{ readonly id: string }> {
  assertPermission(person, "check:run");
  const { id, setup: claimed, startedAt } = parseInput(startCheckSchema, input);
  return transact(async (tx) => {
    const [known] = await tx.select({ personId: checks.personId }).from(checks).where(eq(checks.id, id)).limit(1);
    if (known?.personId === person.id) return { id };
    if (known) throw new AppError("id-in-use", "This id belongs to another check. Start again with a new one.", 409, "id");
    await assertKnown(tx, person, claimed);
    const { experience, replaced } = await fixExperience(tx, claimed.experience, now);
    const setup = { ...claimed, experience };
    await tx.insert(checks).values({
      id, personId: person.id, entryId: setup.entryId, entryVersionId: setup.entryVersionId, machineId: setup.machineId,
      meterId: setup.meterId, recheckOf: setup.recheckOf, state: "running", setup, startedAt: startOf(startedAt, now),
    });
    await recordAudit(tx, { personId: person.id, verb: "check:start", subjectType: "check", subjectId: id, detail: detailOf(setup, replaced) }, now);
    return { id };
  });
}
