import "server-only";
import { eq } from "drizzle-orm";
import { readDb, transact, type Writer } from "@/db/client";
import { checks } from "@/db/schema";
import { assertPermission, type Person } from "@/lib/auth/permissions";
import { AppError } from "@/lib/errors";
import { log } from "@/lib/log";
import { parseInput } from "@/lib/parse";
import { recordAudit } from "@/lib/people/record-audit";
import { assertRunning, ownCheck, stepsOf } from "./check-rows";
import { sameExperience } from "./experience";
import { judgeInSlices } from "./judge";
import { finishCheckSchema } from "./schemas";
import { standingDifference } from "./standing-difference";
import { readVerdict } from "./stored-verdict";
import type { Verdict } from "./verdict";
import { verdictColumns } from "./verdict-columns";

export interface Finished { readonly id: string; readonly verdict: Verdict }

/** A difference is a defect of ours, not of the technician's: it is logged and kept, and the server's answer stands. */
async function recordDifference(tx: Writer, person: Person, checkId: string, parts: readonly string[], now: Date): Promise<void> {
  if (parts.length === 0) return;
  log().error({ checkId, parts }, "the phone's standing differs from the server's");
  await recordAudit(tx, { personId: person.id, verb: "check:standing-differs", subjectType: "check", subjectId: checkId, detail: { parts } }, now);
}

/**
 * Finishes one's own running check: the server judges the stored readings with the same engine as the phone, compares
 * the phone's standing where it was sent along, and keeps the verdict. Finishing again gives the same answer.
 * @throws AppError invalid-input (400), not-found (404), no-readings, check-closed, check-changed (409), engine codes (422)
 */
export async function finishCheck(person: Person, checkId: string, input: unknown, now = new Date()): Promise<Finished> {
  assertPermission(person, "check:run");
  const { standing, experience } = parseInput(finishCheckSchema, input);
  const before = await ownCheck(readDb(), person, checkId);
  const kept = readVerdict(before.verdict);
  if (kept) return { id: checkId, verdict: kept };
  assertRunning(before);
  const steps = await stepsOf(readDb(), checkId);
  const { assessment, verdict } = await judgeInSlices({ setup: before.setup, steps });
  // A phone that counted in other checks than the server (see startCheck) has to believe something else: no defect.
  const comparable = sameExperience(experience, before.setup.experience);
  const difference = standing && comparable ? standingDifference(assessment, standing) : [];
  return transact(async (tx) => {
    const check = await ownCheck(tx, person, checkId);
    const made = readVerdict(check.verdict);
    if (made) return { id: checkId, verdict: made };
    assertRunning(check);
    if ((await stepsOf(tx, checkId)).length !== steps.length) throw new AppError("check-changed", "Another reading came in meanwhile. Finish again.", 409);
    await tx.update(checks).set({ state: "finished", finishedAt: now, ...verdictColumns(verdict) }).where(eq(checks.id, checkId));
    await recordAudit(tx, { personId: person.id, verb: "check:finish", subjectType: "check", subjectId: checkId, detail: { sentence: verdict.sentence } }, now);
    await recordDifference(tx, person, checkId, difference, now);
    return { id: checkId, verdict };
  });
}
