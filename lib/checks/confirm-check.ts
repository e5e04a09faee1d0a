import "server-only";
import { and, eq, isNull } from "drizzle-orm";
import { ulid } from "ulid";
import { transact, type Writer } from "@/db/client";
import { confirmations } from "@/db/schema";
import { assertPermission, hasPermission, type Person } from "@/lib/auth/permissions";
import { AppError, notAllowed } from "@/lib/errors";
import { parseInput } from "@/lib/parse";
import { recordAudit } from "@/lib/people/record-audit";
import { visibleCheck, type CheckRecord } from "./check-rows";
import { confirmCheckSchema } from "./confirm-schemas";
import { noteState } from "./experience-rows";
import { KIND_WORDS } from "./finding-words";
import { isOfKind, outcomeId } from "./outcome-choices";

/** A re-check finds the machine repaired: counted, it would make every finding look rarer than it is. */
function assertConfirmable(check: CheckRecord): void {
  if (check.state !== "finished") throw new AppError("check-not-finished", "Only a finished check can be confirmed.", 409);
  if (check.recheckOf) throw new AppError("confirm-first-run", "A re-check proves a repair. Confirm the first run instead.", 409);
}

async function assertUnconfirmed(tx: Writer, checkId: string): Promise<void> {
  const [known] = await tx.select({ id: confirmations.id }).from(confirmations).where(and(eq(confirmations.checkId, checkId), isNull(confirmations.withdrawnAt))).limit(1);
  if (known) throw new AppError("already-confirmed", "This check is confirmed already. Withdraw that first, then record what it was.", 409);
}

/**
 * Records what a finished check turned out to be, and how that was proved: by the person who made it, or by whoever may
 * confirm everybody's. The finding need not be the verdict's, and readings that contradict each other do not stand in the
 * way. From then on it shifts the chances that later checks start from.
 * @throws AppError invalid-input, finding-not-of-kind (400), not-allowed (403), not-found (404),
 * check-not-finished, confirm-first-run, already-confirmed (409)
 */
export async function confirmCheck(person: Person, checkId: string, input: unknown, now = new Date()): Promise<{ readonly id: string }> {
  assertPermission(person, "check:confirm");
  const { finding, kind, proof } = parseInput(confirmCheckSchema, input);
  if (!isOfKind(finding.code, kind)) throw new AppError("finding-not-of-kind", `${KIND_WORDS[kind].replace(/^a/, "A")} cannot have this finding. Choose the kind that has it, or another finding.`, 400, "kind");
  return transact(async (tx) => {
    const check = await visibleCheck(tx, person, checkId);
    if (check.personId !== person.id && !hasPermission(person, "check:confirm-any")) throw notAllowed();
    assertConfirmable(check);
    await assertUnconfirmed(tx, checkId);
    const id = ulid(now.getTime());
    // Where an entry named the kind beforehand, the check says nothing of how usual the kind is among unknown devices.
    const countsKind = check.setup.expect === undefined;
    await tx.insert(confirmations).values({ id, checkId, personId: person.id, at: now, kind, findingCode: finding.code, findingPins: finding.pins ?? null, proof, countsKind });
    await noteState(tx, person.id, now);
    await recordAudit(tx, { personId: person.id, verb: "check:confirm", subjectType: "check", subjectId: checkId, detail: { confirmation: id, finding: outcomeId(finding), kind } }, now);
    return { id };
  });
}
