import "server-only";
import { asc, isNull } from "drizzle-orm";
import { readDb } from "@/db/client";
import { meters } from "@/db/schema";
import { assertPermission, type Person } from "@/lib/auth/permissions";
import type { MeterSpec } from "@/lib/diagnosis";

export interface MeterRow { readonly id: string; readonly name: string; readonly spec: MeterSpec }

/**
 * Meters in use, in the order in which they were entered: the first is the workshop's usual one.
 * @throws AppError not-allowed (403)
 */
export async function listMeters(person: Person): Promise<readonly MeterRow[]> {
  assertPermission(person, "machine:read");
  return readDb().select({ id: meters.id, name: meters.name, spec: meters.spec }).from(meters).where(isNull(meters.retiredAt)).orderBy(asc(meters.id));
}
