import "server-only";
import { eq } from "drizzle-orm";
import { transact } from "@/db/client";
import { people } from "@/db/schema";
import { assertPermission, knownRoles, ROLES, type Person, type Role } from "@/lib/auth/permissions";
import { notFound } from "@/lib/errors";
import { parseInput } from "@/lib/parse";
import { assertAnotherAdministrator } from "./other-administrators";
import { recordAudit } from "./record-audit";
import { setRolesSchema } from "./schemas";

/**
 * Give a person exactly these roles; it counts from their next request on.
 * @returns the roles as stored
 * @throws AppError not-allowed (403), invalid-input (400), not-found (404), last-administrator (409)
 */
export async function setRoles(person: Person, input: unknown): Promise<Role[]> {
  assertPermission(person, "people:manage");
  const { personId, roles } = parseInput(setRolesSchema, input);
  const wanted = ROLES.filter((role) => roles.includes(role));
  return transact(async (tx) => {
    const [before] = await tx.select({ roles: people.roles }).from(people).where(eq(people.id, personId));
    if (!before) throw notFound("person");
    if (before.roles.includes("administrator") && !wanted.includes("administrator")) await assertAnotherAdministrator(tx, personId);
    await tx.update(people).set({ roles: wanted }).where(eq(people.id, personId));
    await recordAudit(tx, { personId: person.id, verb: "person:set-roles", subjectType: "person", subjectId: personId, detail: { from: knownRoles(before.roles), to: wanted } });
    return wanted;
  });
}
