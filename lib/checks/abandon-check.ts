import "server-only";
import { eq } from "drizzle-orm";
import { transact } from "@/db/client";
import { checks } from "@/db/schema";
import { assertPermission, type Person } from "@/lib/auth/permissions";
import { recordAudit } from "@/lib/people/record-audit";
import { assertRunning, ownCheck } from "./check-rows";

/**
 * Gives up one's own running check; its steps stay on record. Abandoning twice changes nothing.
 * @throws AppError not-found (404), check-closed (409) when it is finished
 */
export async function abandonCheck(person: Person, checkId: string, now = new Date()): Promise<{ readonly id: string; readonly state: "abandoned" }> {
  assertPermission(person, "check:run");
  return transact(async (tx) => {
    const check = await ownCheck(tx, person, checkId);
    if (check.state !== "abandoned") {
      assertRunning(check);
      await tx.update(checks).set({ state: "abandoned", finishedAt: now }).where(eq(checks.id, checkId));
      await recordAudit(tx, { personId: person.id, verb: "check:abandon", subjectType: "check", subjectId: checkId }, now);
    }
    return { id: checkId, state: "abandoned" };
  });
}
