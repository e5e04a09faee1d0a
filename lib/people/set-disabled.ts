import "server-only";
import { eq } from "drizzle-orm";
import { transact } from "@/db/client";
import { people } from "@/db/schema";
import { assertPermission, type Person } from "@/lib/auth/permissions";
import { revokeSessions } from "@/lib/auth/session-rows";
import { notFound } from "@/lib/errors";
import { parseInput } from "@/lib/parse";
import { assertAnotherAdministrator } from "./other-administrators";
import { recordAudit } from "./record-audit";
import { setDisabledSchema } from "./schemas";

/**
 * Shut an account or open it again. Shutting ends all its sessions at once; the records stay.
 * @throws AppError not-allowed (403), invalid-input (400), not-found (404), last-administrator (409)
 */
export async function setDisabled(person: Person, input: unknown): Promise<void> {
  assertPermission(person, "people:manage");
  const { personId, disabled } = parseInput(setDisabledSchema, input);
  await transact(async (tx) => {
    const [before] = await tx.select({ roles: people.roles }).from(people).where(eq(people.id, personId));
    if (!before) throw notFound("person");
    if (disabled && before.roles.includes("administrator")) await assertAnotherAdministrator(tx, personId);
    await tx.update(people).set({ disabledAt: disabled ? new Date() : null }).where(eq(people.id, personId));
    if (disabled) await revokeSessions(tx, personId);
    await recordAudit(tx, { personId: person.id, verb: disabled ? "person:disable" : "person:enable", subjectType: "person", subjectId: personId });
  });
}
