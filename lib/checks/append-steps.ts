import "server-only";
import { eq, inArray, sql } from "drizzle-orm";
import { transact, type Writer } from "@/db/client";
import { checkSteps } from "@/db/schema";
import { assertPermission, type Person } from "@/lib/auth/permissions";
import { AppError } from "@/lib/errors";
import { parseInput } from "@/lib/parse";
import { recordAudit } from "@/lib/people/record-audit";
import { assertRunning, ownCheck } from "./check-rows";
import type { RunStep } from "./run";
import { appendStepsSchema, MAX_STEP_BYTES, MAX_STEPS } from "./schemas";
import { stepProblem } from "./step-rules";

/** Largest number of ids in one query; SQLite takes far more, but not without end. */
const CHUNK = 200;

function assertSound(steps: readonly RunStep[]): void {
  steps.forEach((step, index) => {
    const problem = stepProblem(step);
    if (problem) throw new AppError(problem.code, problem.message, 400, `steps.${index}.${problem.code === "unknown-check" ? "check" : "value"}`);
  });
}

/** Ids of these steps that are stored already. @throws AppError step-in-use (409) when one belongs to another check */
async function storedIds(tx: Writer, checkId: string, ids: readonly string[]): Promise<ReadonlySet<string>> {
  const stored = new Set<string>();
  for (let from = 0; from < ids.length; from += CHUNK) {
    const rows = await tx.select({ id: checkSteps.id, checkId: checkSteps.checkId }).from(checkSteps).where(inArray(checkSteps.id, ids.slice(from, from + CHUNK)));
    if (rows.some((row) => row.checkId !== checkId)) throw new AppError("step-in-use", "A step with this id belongs to another check.", 409, "steps");
    for (const row of rows) stored.add(row.id);
  }
  return stored;
}

async function assertRetractsKnown(tx: Writer, checkId: string, fresh: readonly RunStep[]): Promise<void> {
  const inBatch = new Set(fresh.map((step) => step.id));
  const targets = fresh.flatMap((step) => (step.type === "retract" && !inBatch.has(step.step) ? [step.step] : []));
  const stored = await storedIds(tx, checkId, [...new Set(targets)]);
  const missing = targets.find((id) => !stored.has(id));
  if (missing) throw new AppError("unknown-step", "A step that is to be taken back is not part of this check.", 400, "steps");
}

async function assertRoom(tx: Writer, checkId: string, fresh: readonly RunStep[]): Promise<void> {
  const [held] = await tx.select({ count: sql<number>`count(*)`, bytes: sql<number>`coalesce(sum(length(cast(${checkSteps.step} as blob))), 0)` })
    .from(checkSteps).where(eq(checkSteps.checkId, checkId));
  const bytes = fresh.reduce((sum, step) => sum + Buffer.byteLength(JSON.stringify(step)), held?.bytes ?? 0);
  if ((held?.count ?? 0) + fresh.length > MAX_STEPS) throw new AppError("too-many-steps", `A check holds at most ${MAX_STEPS} steps. Finish this one and start a re-check.`, 409, "steps");
  if (bytes > MAX_STEP_BYTES) throw new AppError("check-too-large", "This check holds as much as one check may. Finish it and start a re-check.", 409, "steps");
}

/**
 * Appends steps to one's own running check. A step whose id is stored already is passed over, so that sending
 * twice does no harm, even after the check was finished.
 * @throws AppError invalid-input, unknown-check, wrong-value, out-of-bounds, unknown-step (400), not-found (404),
 * check-closed, step-in-use, too-many-steps, check-too-large (409)
 */
export async function appendSteps(person: Person, checkId: string, input: unknown, now = new Date()): Promise<{ readonly added: number }> {
  assertPermission(person, "check:run");
  const { steps } = parseInput(appendStepsSchema, input);
  assertSound(steps);
  return transact(async (tx) => {
    const check = await ownCheck(tx, person, checkId);
    const unique = [...new Map(steps.map((step) => [step.id, step])).values()];
    const stored = await storedIds(tx, checkId, unique.map((step) => step.id));
    const fresh = unique.filter((step) => !stored.has(step.id));
    if (fresh.length === 0) return { added: 0 };
    assertRunning(check);
    await assertRetractsKnown(tx, checkId, fresh);
    await assertRoom(tx, checkId, fresh);
    await tx.insert(checkSteps).values(fresh.map((step) => ({ id: step.id, checkId, at: new Date(step.at), receivedAt: now, step })));
    await recordAudit(tx, { personId: person.id, verb: "check:append", subjectType: "check", subjectId: checkId, detail: { steps: fresh.length } }, now);
    return { added: fresh.length };
  });
}
