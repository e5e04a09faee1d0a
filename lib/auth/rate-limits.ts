import "server-only";
import { inArray, lte, sql } from "drizzle-orm";
import type { Writer } from "@/db/client";
import { rateLimits } from "@/db/schema";

/** At most `points` under `key` within a window that starts with the first. */
export interface Limit { readonly key: string; readonly points: number; readonly windowMs: number }

/**
 * Take one point of every limit, or of none when one of them is used up. Runs inside a transaction of the
 * one writer, so attempts at the same moment cannot all see the last free point.
 * @returns null when taken, else how long until the limit opens again, milliseconds
 */
export async function takePoints(tx: Writer, limits: readonly Limit[], now: Date): Promise<number | null> {
  await tx.delete(rateLimits).where(lte(rateLimits.expiresAt, now));
  const rows = await tx.select().from(rateLimits).where(inArray(rateLimits.key, limits.map((limit) => limit.key)));
  const used = new Map(rows.map((row) => [row.key, row]));
  const shut = limits.map((limit) => used.get(limit.key)).filter((row, at) => row && row.points >= (limits[at]?.points ?? 0));
  if (shut.length > 0) return Math.max(...shut.map((row) => (row?.expiresAt.getTime() ?? 0) - now.getTime()));
  for (const { key, windowMs } of limits) {
    await tx.insert(rateLimits).values({ key, points: 1, expiresAt: new Date(now.getTime() + windowMs) })
      .onConflictDoUpdate({ target: rateLimits.key, set: { points: sql`${rateLimits.points} + 1` } });
  }
  return null;
}

/** Give the point of an attempt back that turned out to be right. */
export async function returnPoints(tx: Writer, limits: readonly Limit[]): Promise<void> {
  await tx.update(rateLimits).set({ points: sql`max(0, ${rateLimits.points} - 1)` }).where(inArray(rateLimits.key, limits.map((limit) => limit.key)));
}
