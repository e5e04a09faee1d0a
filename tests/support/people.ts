import { ulid } from "ulid";
import { write } from "@/db/client";
import { people } from "@/db/schema";
import { hashPassword } from "@/lib/auth/password";
import type { Person, Role } from "@/lib/auth/permissions";

export const TEST_PASSWORD = "weed-cutter-rope-9";
let hashed: Promise<string> | null = null;

/** A person in the database; the password is TEST_PASSWORD. */
export async function makePerson(roles: readonly Role[] = ["technician"], name = "Test Person"): Promise<Person> {
  hashed ??= hashPassword(TEST_PASSWORD);
  const passwordHash = await hashed;
  const id = ulid();
  const email = `${id.toLowerCase()}@canal-workshop.example`;
  await write((db) => db.insert(people).values({ id, email, name, passwordHash, roles: [...roles], createdAt: new Date() }));
  return { id, email, name, roles };
}
