import "server-only";
import { getIronSession, type SessionOptions } from "iron-session";
import { cookies, headers } from "next/headers";
import { env } from "@/lib/env";
import { isHttps } from "./request-facts";
import { SESSION_DAYS } from "./session-rows";

interface SessionCookie { sessionId?: string }
/** Where a person once signed in with success: a stranger's failures elsewhere do not lock this browser out. */
interface KnownBrowserCookie { browserId?: string; people?: string[] }

const DAY = 86_400;

function options(name: string, days: number, https: boolean): SessionOptions {
  return {
    cookieName: https ? `__Host-${name}` : name,
    password: env().sessionSecret,
    ttl: days * DAY,
    cookieOptions: { httpOnly: true, secure: https, sameSite: "lax", path: "/", maxAge: days * DAY },
  };
}

/** The sealed cookie that names the session; the session itself is a row that can be revoked. */
export async function sessionCookie() {
  const https = isHttps(await headers());
  return getIronSession<SessionCookie>(await cookies(), options("pinwright_session", SESSION_DAYS, https));
}

/** The sealed cookie that remembers who has signed in here before. */
export async function knownBrowserCookie() {
  const https = isHttps(await headers());
  return getIronSession<KnownBrowserCookie>(await cookies(), options("pinwright_browser", 180, https));
}
