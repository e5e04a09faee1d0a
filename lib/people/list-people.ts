import "server-only";
import { asc } from "drizzle-orm";
import { readDb } from "@/db/client";
import { people } from "@/db/schema";
import { assertPermission, knownRoles, type Person, type Role } from "@/lib/auth/permissions";

export interface ListedPerson {
  readonly id: string;
  readonly name: string;
  readonly email: string;
  readonly roles: readonly Role[];
  readonly disabled: boolean;
}

/**
 * Everybody of the workshop, by name.
 * @throws AppError not-allowed (403)
 */
export async function listPeople(person: Person): Promise<ListedPerson[]> {
  assertPermission(person, "people:read");
  const rows = await readDb()
    .select({ id: people.id, name: people.name, email: people.email, roles: people.roles, disabledAt: people.disabledAt })
    .from(people).orderBy(asc(people.name), asc(people.id));
  return rows.map(({ disabledAt, roles, ...row }) => ({ ...row, roles: knownRoles(roles), disabled: disabledAt !== null }));
}
