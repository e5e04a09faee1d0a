import "server-only";
import { headers } from "next/headers";
import { ulid } from "ulid";
import { transact } from "@/db/client";
import { recordAudit } from "@/lib/people/record-audit";
import { knownBrowserCookie, sessionCookie } from "./cookies";
import { clientAddress, userAgent } from "./request-facts";
import { currentSession } from "./require-permission";
import { revokeSession } from "./session-rows";
import { signIn } from "./sign-in";

/** One shared phone may know this many people. */
const KNOWN_PEOPLE = 20;

/** Sign the browser of this request in. Errors as of signIn(). */
export async function signInBrowser(input: unknown): Promise<void> {
  const given = await headers();
  const session = await sessionCookie();
  const browser = await knownBrowserCookie();
  const { personId, sessionId } = await signIn(input, {
    address: clientAddress(given),
    userAgent: userAgent(given),
    browserId: browser.browserId ?? null,
    knownPeople: browser.people ?? [],
    previousSessionId: session.sessionId ?? null,
  });
  session.sessionId = sessionId;
  await session.save();
  browser.browserId ??= ulid();
  browser.people = [personId, ...(browser.people ?? []).filter((id) => id !== personId)].slice(0, KNOWN_PEOPLE);
  await browser.save();
}

/** Sign the browser of this request out: the row is revoked, so that a copy of the cookie is worth nothing. */
export async function signOutBrowser(): Promise<void> {
  const current = await currentSession();
  if (current) {
    await transact(async (tx) => {
      await revokeSession(tx, current.person.id, current.sessionId);
      await recordAudit(tx, { personId: current.person.id, verb: "session:close", subjectType: "session", subjectId: current.sessionId });
    });
  }
  (await sessionCookie()).destroy();
}
