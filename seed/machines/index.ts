import type { Database } from "@/db/client";
import { machines, meters } from "@/db/schema";
import { SEED_MACHINES } from "./machines";
import { SEED_METERS } from "./meters";

const REGISTERED = new Date("2026-09-01T09:00:00Z");

/** Fill the empty register with the demo workshop's machines and meters; to be run inside one write. */
export async function seedMachines(db: Pick<Database, "insert">): Promise<void> {
  await db.insert(machines).values(SEED_MACHINES.map((machine) => ({ ...machine, createdAt: REGISTERED, retiredAt: null })));
  await db.insert(meters).values(SEED_METERS.map((meter) => ({ ...meter, createdAt: REGISTERED, retiredAt: null })));
}
