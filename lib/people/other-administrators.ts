import "server-only";
import { and, isNull, ne } from "drizzle-orm";
import type { Reader } from "@/db/client";
import { people } from "@/db/schema";
import { AppError } from "@/lib/errors";

/**
 * A workshop without an administrator cannot be helped from inside.
 * @throws AppError last-administrator (409) when nobody but this person administers
 */
export async function assertAnotherAdministrator(reader: Reader, personId: string): Promise<void> {
  const others = await reader.select({ roles: people.roles }).from(people).where(and(ne(people.id, personId), isNull(people.disabledAt)));
  if (!others.some(({ roles }) => roles.includes("administrator"))) {
    throw new AppError("last-administrator", "This is the last administrator. Make somebody else administrator first.", 409);
  }
}
