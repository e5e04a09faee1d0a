import "server-only";
import { and, eq, isNull } from "drizzle-orm";
import { transact } from "@/db/client";
import { checks, machines } from "@/db/schema";
import { assertPermission, hasPermission, type Person } from "@/lib/auth/permissions";
import { AppError, notAllowed, notFound } from "@/lib/errors";
import { parseInput } from "@/lib/parse";
import { recordAudit } from "@/lib/people/record-audit";
import { visibleCheck } from "./check-rows";
import { attachMachineSchema } from "./schemas";

/**
 * Says on which machine a finished check was made: by the person who made it, or by whoever keeps the machines.
 * The setup of the run stays as it was recorded.
 * @throws AppError invalid-input (400), not-allowed (403), not-found (404), check-running (409)
 */
export async function attachMachine(person: Person, checkId: string, input: unknown, now = new Date()): Promise<{ readonly id: string; readonly machineId: string }> {
  assertPermission(person, "check:run");
  const { machineId } = parseInput(attachMachineSchema, input);
  return transact(async (tx) => {
    const check = await visibleCheck(tx, person, checkId);
    if (check.personId !== person.id && !hasPermission(person, "machine:edit")) throw notAllowed();
    if (check.state !== "finished") throw new AppError("check-running", "Finish the check first, then attach it to a machine.", 409);
    const [machine] = await tx.select({ id: machines.id }).from(machines).where(and(eq(machines.id, machineId), isNull(machines.retiredAt))).limit(1);
    if (!machine) throw notFound("machine");
    if (check.machineId !== machineId) {
      await tx.update(checks).set({ machineId }).where(eq(checks.id, checkId));
      await recordAudit(tx, { personId: person.id, verb: "check:attach", subjectType: "check", subjectId: checkId, detail: { from: check.machineId, to: machineId } }, now);
    }
    return { id: checkId, machineId };
  });
}
