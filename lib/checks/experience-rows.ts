import "server-only";
import { asc, desc, eq, gt, gte, isNull, lt } from "drizzle-orm";
import type { Reader, Writer } from "@/db/client";
import { confirmations, experienceStates, people } from "@/db/schema";
import type { Experience } from "@/lib/diagnosis";
import { countOutcomes, sameExperience, tidyExperience } from "./experience";

/** A phone may be without a server for this long and still start checks by the counts that it was given. */
const GIVEN_HOLDS_MS = 30 * 86_400_000;

/** What the confirmations in force add up to, whether they are in use or not. */
export async function countConfirmed(db: Reader | Writer): Promise<Experience | undefined> {
  const rows = await db.select({ kind: confirmations.kind, findingCode: confirmations.findingCode, countsKind: confirmations.countsKind })
    .from(confirmations).where(isNull(confirmations.withdrawnAt));
  return countOutcomes(rows);
}

/** The last state, or null before anything was confirmed or set aside. */
export async function latestState(db: Reader | Writer): Promise<typeof experienceStates.$inferSelect | null> {
  const [row] = await db.select().from(experienceStates).orderBy(desc(experienceStates.id)).limit(1);
  return row ?? null;
}

/** Who set own checks aside, and when; null while they count. Confirmations that came since are not the one who did it. */
export async function setAsideSince(db: Reader | Writer): Promise<{ readonly by: string; readonly at: Date } | null> {
  const [used] = await db.select({ id: experienceStates.id }).from(experienceStates).where(eq(experienceStates.inUse, true)).orderBy(desc(experienceStates.id)).limit(1);
  const [first] = await db.select({ by: people.name, at: experienceStates.at }).from(experienceStates).innerJoin(people, eq(people.id, experienceStates.personId))
    .where(gt(experienceStates.id, used?.id ?? 0)).orderBy(asc(experienceStates.id)).limit(1);
  return first ?? null;
}

/** The counts that a check started now is judged by; undefined where there are none or they are set aside. */
export async function experienceInForce(db: Reader | Writer): Promise<Experience | undefined> {
  return tidyExperience((await latestState(db))?.counts);
}

/** To be called in the transaction of every change to confirmations or their use: notes the state that it leads to. */
export async function noteState(tx: Writer, personId: string, now: Date, inUse?: boolean): Promise<void> {
  const used = inUse ?? (await latestState(tx))?.inUse ?? true;
  const counts = used ? (await countConfirmed(tx)) ?? null : null;
  await tx.insert(experienceStates).values({ at: now, personId, inUse: used, counts });
}

/** Were these counts in force at some moment of the last month? The published chances alone always were. */
export async function wasInForce(db: Reader | Writer, claimed: Experience, now: Date): Promise<boolean> {
  if (!tidyExperience(claimed)) return true;
  const from = new Date(now.getTime() - GIVEN_HOLDS_MS);
  const since = await db.select({ counts: experienceStates.counts }).from(experienceStates).where(gte(experienceStates.at, from));
  const [before] = await db.select({ counts: experienceStates.counts }).from(experienceStates)
    .where(lt(experienceStates.at, from)).orderBy(desc(experienceStates.id)).limit(1);
  return [...since, ...(before ? [before] : [])].some(({ counts }) => sameExperience(counts, claimed));
}

export interface FixedExperience { readonly experience: Experience | undefined; /** True where the phone's claim did not hold. */ readonly replaced: boolean }

/**
 * The counts that are fixed into a check at its start. The phone says by which it judges, because it may have begun
 * without a server; what it says holds only if the workshop once gave it out. Anything else, and saying nothing,
 * gives the counts in force now.
 */
export async function fixExperience(db: Reader | Writer, claimed: Experience | undefined, now: Date): Promise<FixedExperience> {
  if (claimed && (await wasInForce(db, claimed, now))) return { experience: tidyExperience(claimed), replaced: false };
  return { experience: await experienceInForce(db), replaced: claimed !== undefined };
}
