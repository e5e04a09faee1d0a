import "server-only";
import { ulid } from "ulid";
import { transact } from "@/db/client";
import { people } from "@/db/schema";
import { hashPassword } from "@/lib/auth/password";
import { recordAudit } from "./record-audit";

/**
 * Give an empty workshop its first administrator (FIRST_ADMIN_EMAIL, FIRST_ADMIN_PASSWORD). Does nothing
 * once there is anybody, so the two settings may stay or go.
 * @returns whether somebody was added
 */
export async function addFirstAdministrator({ email, password }: { readonly email: string; readonly password: string }): Promise<boolean> {
  const passwordHash = await hashPassword(password);
  return transact(async (tx) => {
    if ((await tx.$count(people)) > 0) return false;
    const id = ulid();
    await tx.insert(people).values({ id, email: email.toLowerCase(), name: "Administrator", passwordHash, roles: ["administrator"], createdAt: new Date() });
    await recordAudit(tx, { personId: null, verb: "person:add-first", subjectType: "person", subjectId: id });
    return true;
  });
}
