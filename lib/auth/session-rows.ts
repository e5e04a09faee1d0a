import "server-only";
import { and, desc, eq, gt, isNull, ne } from "drizzle-orm";
import { ulid } from "ulid";
import { readDb, write, type Reader, type Writer } from "@/db/client";
import { people, sessions } from "@/db/schema";
import { knownRoles, type Person } from "./permissions";

const DAY = 86_400_000;
/** A session ends after 14 days, used or not. */
export const SESSION_DAYS = 14;
/** "Last seen" is kept to five minutes: a write a request would be one too many. */
const TOUCH_AFTER = 5 * 60_000;

export interface SessionRow {
  readonly id: string;
  readonly userAgent: string;
  readonly createdAt: Date;
  readonly lastSeenAt: Date;
}

/** Open a session; the caller puts the id into the sealed cookie. */
export async function openSession(tx: Writer, personId: string, agent: string, now = new Date()): Promise<string> {
  const id = ulid(now.getTime());
  await tx.insert(sessions).values({
    id, personId, userAgent: agent, createdAt: now, lastSeenAt: now, expiresAt: new Date(now.getTime() + SESSION_DAYS * DAY),
  });
  return id;
}

const alive = (now: Date) => and(isNull(sessions.revokedAt), gt(sessions.expiresAt, now));

/** Who is signed in by this session now; null once it is revoked, expired or its person disabled. */
export async function personOfSession(sessionId: string, now = new Date()): Promise<Person | null> {
  const [row] = await readDb()
    .select({ id: people.id, name: people.name, email: people.email, roles: people.roles, lastSeenAt: sessions.lastSeenAt })
    .from(sessions).innerJoin(people, eq(people.id, sessions.personId))
    .where(and(eq(sessions.id, sessionId), alive(now), isNull(people.disabledAt)));
  if (!row) return null;
  if (now.getTime() - row.lastSeenAt.getTime() > TOUCH_AFTER) {
    await write((db) => db.update(sessions).set({ lastSeenAt: now }).where(eq(sessions.id, sessionId)));
  }
  return { id: row.id, name: row.name, email: row.email, roles: knownRoles(row.roles) };
}

/** The open sessions of one person, last used first. */
export async function openSessions(reader: Reader, personId: string, now = new Date()): Promise<SessionRow[]> {
  return reader.select({ id: sessions.id, userAgent: sessions.userAgent, createdAt: sessions.createdAt, lastSeenAt: sessions.lastSeenAt })
    .from(sessions).where(and(eq(sessions.personId, personId), alive(now))).orderBy(desc(sessions.lastSeenAt), desc(sessions.id));
}

/** Revoke one session of a person; returns how many that were open (0 or 1). */
export async function revokeSession(tx: Writer, personId: string, sessionId: string, now = new Date()): Promise<number> {
  const done = await tx.update(sessions).set({ revokedAt: now })
    .where(and(eq(sessions.id, sessionId), eq(sessions.personId, personId), isNull(sessions.revokedAt)));
  return done.rowsAffected;
}

/** Revoke all sessions of a person, but for one if given; returns how many. */
export async function revokeSessions(tx: Writer, personId: string, except?: string, now = new Date()): Promise<number> {
  const done = await tx.update(sessions).set({ revokedAt: now })
    .where(and(eq(sessions.personId, personId), isNull(sessions.revokedAt), except ? ne(sessions.id, except) : undefined));
  return done.rowsAffected;
}
