import "server-only";
import { eq } from "drizzle-orm";
import { transact } from "@/db/client";
import { confirmations } from "@/db/schema";
import { assertPermission, hasPermission, type Person } from "@/lib/auth/permissions";
import { AppError, notAllowed, notFound } from "@/lib/errors";
import { parseInput } from "@/lib/parse";
import { recordAudit } from "@/lib/people/record-audit";
import { withdrawSchema } from "./confirm-schemas";
import { noteState } from "./experience-rows";

/**
 * Takes a confirmation back: one's own, or anybody's for those who may confirm everybody's checks. It stays on record
 * with who withdrew it and when, and no longer shifts the chances; checks that began meanwhile stay as they were.
 * @throws AppError invalid-input (400), not-allowed (403), not-found (404), already-withdrawn (409)
 */
export async function withdrawConfirmation(person: Person, input: unknown, now = new Date()): Promise<{ readonly id: string; readonly checkId: string }> {
  assertPermission(person, "check:confirm");
  const { confirmationId } = parseInput(withdrawSchema, input);
  return transact(async (tx) => {
    // Confirmed checks are finished, and finished ones are open to the whole workshop.
    const [row] = await tx.select().from(confirmations).where(eq(confirmations.id, confirmationId)).limit(1);
    if (!row) throw notFound("confirmation");
    if (row.personId !== person.id && !hasPermission(person, "check:confirm-any")) throw notAllowed();
    if (row.withdrawnAt) throw new AppError("already-withdrawn", "This confirmation was withdrawn before.", 409);
    await tx.update(confirmations).set({ withdrawnAt: now, withdrawnBy: person.id }).where(eq(confirmations.id, row.id));
    await noteState(tx, person.id, now);
    await recordAudit(tx, { personId: person.id, verb: "check:withdraw", subjectType: "check", subjectId: row.checkId, detail: { confirmation: row.id } }, now);
    return { id: row.id, checkId: row.checkId };
  });
}
