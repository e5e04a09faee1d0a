import "server-only";
import { readDb } from "@/db/client";
import { assertPermission, type Person } from "@/lib/auth/permissions";
import { AppError } from "@/lib/errors";
import { parseInput } from "@/lib/parse";
import { visibleCheck } from "./check-rows";
import { startRecheckSchema } from "./schemas";
import { startCheck } from "./start-check";

/**
 * Starts a check after a repair: linked to the first one, with the same setup, on the machine it is attached to now.
 * @throws AppError invalid-input (400), not-found (404), check-running (409), id-in-use (409)
 */
export async function startRecheck(person: Person, firstId: string, input: unknown, now = new Date()): Promise<{ readonly id: string }> {
  assertPermission(person, "check:run");
  const { id } = parseInput(startRecheckSchema, input);
  const first = await visibleCheck(readDb(), person, firstId);
  if (first.state !== "finished") throw new AppError("check-running", "Finish the first check before you start its re-check.", 409);
  // The note was about the first run, and the workshop may have learnt something since; everything else still holds.
  const setup = { ...first.setup, note: undefined, experience: undefined, machineId: first.machineId ?? undefined, recheckOf: firstId };
  return startCheck(person, { id, setup }, now);
}
