import "server-only";
import { eq } from "drizzle-orm";
import { readDb } from "@/db/client";
import { machines } from "@/db/schema";
import { assertPermission, type Person } from "@/lib/auth/permissions";
import { notFound } from "@/lib/errors";
import { parseInput } from "@/lib/parse";
import { getMachineSchema } from "./schemas";

export type Machine = typeof machines.$inferSelect;

/**
 * One machine; retired ones too, for their history.
 * @throws AppError not-allowed (403), invalid-input (400), not-found (404)
 */
export async function getMachine(person: Person, input: unknown): Promise<Machine> {
  assertPermission(person, "machine:read");
  const { id } = parseInput(getMachineSchema, input);
  const [machine] = await readDb().select().from(machines).where(eq(machines.id, id));
  if (!machine) throw notFound("machine");
  return machine;
}
