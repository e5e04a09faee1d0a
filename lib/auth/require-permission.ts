import "server-only";
import { headers } from "next/headers";
import { forbidden, redirect } from "next/navigation";
import { cache } from "react";
import { notAllowed, notSignedIn } from "@/lib/errors";
import { sessionCookie } from "./cookies";
import { hasPermission, type Permission, type Person } from "./permissions";
import { SURFACE_HEADER } from "./request-facts";
import { personOfSession } from "./session-rows";

/** The session of this request, or null; looked up once a request. */
export const currentSession = cache(async (): Promise<{ readonly sessionId: string; readonly person: Person } | null> => {
  const { sessionId } = await sessionCookie();
  if (!sessionId) return null;
  const person = await personOfSession(sessionId);
  return person ? { sessionId, person } : null;
});

/** Whoever is signed in, or null. */
export async function currentPerson(): Promise<Person | null> {
  return (await currentSession())?.person ?? null;
}

/**
 * The first line of every page, action and route. A page sends the signed-out to the sign-in page and
 * shows the refused a page that says so; actions and routes get coded errors.
 * @throws AppError not-signed-in (401), not-allowed (403)
 */
export async function requirePermission(permission: Permission): Promise<Person> {
  const person = await currentPerson();
  if (person && hasPermission(person, permission)) return person;
  const isPage = (await headers()).get(SURFACE_HEADER) === "page";
  if (!isPage) throw person ? notAllowed() : notSignedIn();
  return person ? forbidden() : redirect("/sign-in?expired=1");
}
