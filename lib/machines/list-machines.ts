import "server-only";
import { asc, isNull, sql } from "drizzle-orm";
import { readDb } from "@/db/client";
import { machines } from "@/db/schema";
import { assertPermission, type Person } from "@/lib/auth/permissions";
import { parseInput } from "@/lib/parse";
import { listMachinesSchema } from "./schemas";

export interface MachineRow {
  readonly id: string;
  readonly fleetNumber: string;
  readonly name: string;
  readonly type: string;
  readonly site: string;
  /** Nominal, volts. */
  readonly batteryVolts: number;
}

/** Letters and digits only, so that "d01", "D 01" and "D-01" are one fleet number. */
const fold = (text: string) => text.normalize("NFKD").toLowerCase().replace(/[^a-z0-9]/g, "");

/**
 * Machines in service by fleet number; with a query those that have every word of it in fleet number, name, type or site.
 * @throws AppError not-allowed (403), invalid-input (400)
 */
export async function listMachines(person: Person, input: unknown): Promise<readonly MachineRow[]> {
  assertPermission(person, "machine:read");
  const { q } = parseInput(listMachinesSchema, input);
  const rows = await readDb().select({
    id: machines.id, fleetNumber: machines.fleetNumber, name: machines.name, type: machines.type, site: machines.site, batteryVolts: machines.batteryVolts,
  }).from(machines).where(isNull(machines.retiredAt)).orderBy(asc(sql`${machines.fleetNumber} COLLATE NOCASE`));
  const words = q.split(/\s+/).map(fold).filter((word) => word !== "");
  return rows.filter((row) => {
    const text = [row.fleetNumber, row.name, row.type, row.site].map(fold).join(" ");
    return words.every((word) => text.includes(word));
  });
}
