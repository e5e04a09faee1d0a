import "server-only";
import { eq } from "drizzle-orm";
import { readDb, transact } from "@/db/client";
import { people } from "@/db/schema";
import { AppError } from "@/lib/errors";
import { parseInput } from "@/lib/parse";
import { recordAudit } from "@/lib/people/record-audit";
import { assertPasswordLength, passwordFits } from "./password";
import { returnPoints, takePoints } from "./rate-limits";
import { signInSchema } from "./schemas";
import { openSession, revokeSession } from "./session-rows";
import { signInLimits } from "./sign-in-limits";

/** What is known of the browser that asks. */
export interface BrowserFacts {
  readonly address: string;
  readonly userAgent: string;
  readonly browserId: string | null;
  /** Ids of people who have signed in here before. */
  readonly knownPeople: readonly string[];
  /** A session this browser still holds; it ends with the new one. */
  readonly previousSessionId: string | null;
}

export interface SignedIn { readonly personId: string; readonly sessionId: string }

const wrong = () => new AppError("wrong-credentials", "The e-mail address or the password is wrong.", 401);

function tooMany(waitMs: number): AppError {
  const minutes = Math.max(1, Math.ceil(waitMs / 60_000));
  return new AppError("too-many-attempts", `Too many attempts. Wait ${minutes} ${minutes === 1 ? "minute" : "minutes"}, then try again.`, 429);
}

/**
 * Sign in: open a session for the person whose password fits. An address nobody has, a wrong password and a
 * disabled account get the same answer after the same work.
 * @throws AppError invalid-input, password-too-long (400), wrong-credentials (401), too-many-attempts (429)
 */
export async function signIn(input: unknown, facts: BrowserFacts, now = new Date()): Promise<SignedIn> {
  const { email, password } = parseInput(signInSchema, input);
  assertPasswordLength(password);
  const [person] = await readDb().select().from(people).where(eq(people.email, email));
  const known = person !== undefined && facts.browserId !== null && facts.knownPeople.includes(person.id);
  const limits = signInLimits({ email, address: facts.address, knownBrowserId: known ? facts.browserId : null });
  const wait = await transact((tx) => takePoints(tx, limits, now));
  if (wait !== null) throw tooMany(wait);
  const fits = await passwordFits(password, person?.passwordHash ?? null);
  if (!fits || !person || person.disabledAt) throw wrong();
  return transact(async (tx) => {
    await returnPoints(tx, limits);
    if (facts.previousSessionId) await revokeSession(tx, person.id, facts.previousSessionId, now);
    const sessionId = await openSession(tx, person.id, facts.userAgent, now);
    await recordAudit(tx, { personId: person.id, verb: "session:open", subjectType: "session", subjectId: sessionId }, now);
    return { personId: person.id, sessionId };
  });
}
