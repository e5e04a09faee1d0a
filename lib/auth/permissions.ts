import { notAllowed } from "@/lib/errors";

export const ROLES = ["technician", "editor", "trainer", "administrator"] as const;
export type Role = (typeof ROLES)[number];

export const PERMISSIONS = [
  "account:own",
  "catalogue:read", "entry:propose", "entry:edit", "entry:publish",
  "check:read", "check:run",
  // Own checks; everybody's; the switch that sets all of them aside.
  "check:confirm", "check:confirm-any", "experience:switch",
  "machine:read", "machine:edit", "meter:edit",
  "walkthrough:do", "walkthrough:author", "walkthrough:assign", "walkthrough:sign-off",
  "people:read", "people:manage", "audit:read", "backup:run",
] as const;
export type Permission = (typeof PERMISSIONS)[number];

/** What everyone may do who is signed in, whatever the role. */
const EVERYONE: readonly Permission[] = ["account:own", "catalogue:read", "check:read", "machine:read", "walkthrough:do"];

const GRANTS: Readonly<Record<Role, readonly Permission[]>> = {
  technician: ["check:run", "check:confirm", "entry:propose"],
  editor: ["check:run", "check:confirm", "check:confirm-any", "experience:switch", "entry:propose", "entry:edit", "entry:publish", "machine:edit"],
  trainer: ["check:run", "check:confirm", "check:confirm-any", "walkthrough:author", "walkthrough:assign", "walkthrough:sign-off", "people:read"],
  administrator: ["experience:switch", "machine:edit", "meter:edit", "people:read", "people:manage", "audit:read", "backup:run"],
};

/** Somebody signed in, as far as the rest of the project needs to know them. */
export interface Person {
  readonly id: string;
  readonly name: string;
  readonly email: string;
  readonly roles: readonly Role[];
}

/** May this person do this? Nobody at all may do nothing. */
export function hasPermission(person: Person | null, permission: Permission): boolean {
  if (!person) return false;
  return EVERYONE.includes(permission) || person.roles.some((role) => GRANTS[role].includes(permission));
}

/**
 * The first line of every verb.
 * @throws AppError not-allowed (403)
 */
export function assertPermission(person: Person, permission: Permission): void {
  if (!hasPermission(person, permission)) throw notAllowed();
}

/** Roles as stored, without any this version does not know. */
export function knownRoles(stored: readonly string[]): Role[] {
  return ROLES.filter((role) => stored.includes(role));
}
