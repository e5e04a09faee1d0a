import "server-only";
import { transact } from "@/db/client";
import { assertPermission, type Person } from "@/lib/auth/permissions";
import { parseInput } from "@/lib/parse";
import { recordAudit } from "@/lib/people/record-audit";
import { switchExperienceSchema } from "./confirm-schemas";
import { latestState, noteState } from "./experience-rows";

/**
 * Sets the workshop's own confirmed checks aside, so that new checks start from the published chances alone, or counts
 * them again. The confirmations stay. Asking for what holds already changes nothing.
 * @throws AppError not-allowed (403), invalid-input (400)
 */
export async function switchExperience(person: Person, input: unknown, now = new Date()): Promise<{ readonly inUse: boolean }> {
  assertPermission(person, "experience:switch");
  const { inUse } = parseInput(switchExperienceSchema, input);
  return transact(async (tx) => {
    const current = (await latestState(tx))?.inUse ?? true;
    if (current !== inUse) {
      await noteState(tx, person.id, now, inUse);
      await recordAudit(tx, { personId: person.id, verb: inUse ? "experience:take-up" : "experience:set-aside", subjectType: "workshop", subjectId: "experience" }, now);
    }
    return { inUse };
  });
}
