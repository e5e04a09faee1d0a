import type { Writer } from "@/db/client";
import { people } from "@/db/schema";
import type { Role } from "@/lib/auth/permissions";
import { hashPassword } from "@/lib/auth/password";

interface DemoPerson { readonly id: string; readonly email: string; readonly name: string; readonly roles: readonly Role[] }

/** One for all demo accounts; they exist only where PINWRIGHT_ENV is local. */
export const DEMO_PASSWORD = "lock-paddle-27";

const HIRED = new Date("2026-09-01T07:00:00Z");

export const DEMO_PEOPLE: readonly DemoPerson[] = [
  { id: "01K40000000000000000000001", email: "tilda@canal-workshop.example", name: "Tilda Marsh", roles: ["technician"] },
  { id: "01K40000000000000000000002", email: "joram@canal-workshop.example", name: "Joram Pell", roles: ["technician"] },
  { id: "01K40000000000000000000003", email: "edda@canal-workshop.example", name: "Edda Quill", roles: ["technician", "editor"] },
  { id: "01K40000000000000000000004", email: "tomas@canal-workshop.example", name: "Tomas Reave", roles: ["trainer"] },
  { id: "01K40000000000000000000005", email: "ana@canal-workshop.example", name: "Ana Holt", roles: ["administrator"] },
  { id: "01K40000000000000000000006", email: "wim@canal-workshop.example", name: "Wim Sluice", roles: ["technician", "editor", "trainer", "administrator"] },
];

/** The six people of the demo workshop, with every role and two who hold several. */
export async function seedPeople(tx: Writer): Promise<void> {
  const passwordHash = await hashPassword(DEMO_PASSWORD);
  await tx.insert(people).values(DEMO_PEOPLE.map((person) => ({ ...person, roles: [...person.roles], passwordHash, createdAt: HIRED })));
}
