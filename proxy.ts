import { NextResponse, type NextRequest } from "next/server";
import { assertActionBody } from "@/lib/auth/action-body";
import { assertOwnRequest } from "@/lib/auth/own-origin";
import { isHttps, SURFACE_HEADER, type Surface } from "@/lib/auth/request-facts";
import { contentSecurityPolicy, securityHeaders } from "@/lib/auth/security-headers";
import { env } from "@/lib/env";
import { AppError, errorBody } from "@/lib/errors";

const READS = new Set(["GET", "HEAD"]);

function surfaceOf(request: NextRequest): Surface {
  if (request.nextUrl.pathname.startsWith("/api/")) return "route";
  return READS.has(request.method) ? "page" : "action";
}

/** The answer to a request that goes no further; null when it may. */
async function refusal(request: NextRequest, surface: Surface, https: boolean): Promise<NextResponse | null> {
  try {
    assertOwnRequest(request.method, request.headers);
    if (surface === "action") await assertActionBody(request);
    return null;
  } catch (error) {
    if (!(error instanceof AppError)) throw error;
    return NextResponse.json({ error: errorBody(error) }, { status: error.status, headers: securityHeaders(https) });
  }
}

/** Headers, origin and form of everything that comes in. No boundary: every page, action and route authorises itself. */
export async function proxy(request: NextRequest): Promise<NextResponse> {
  const https = isHttps(request.headers);
  const surface = surfaceOf(request);
  const refused = await refusal(request, surface, https);
  if (refused) return refused;
  const nonce = Buffer.from(crypto.randomUUID()).toString("base64");
  const policy = contentSecurityPolicy({ nonce, https, development: env().development });
  const forwarded = new Headers(request.headers);
  forwarded.set(SURFACE_HEADER, surface);
  forwarded.set("content-security-policy", policy);
  const response = NextResponse.next({ request: { headers: forwarded } });
  response.headers.set("Content-Security-Policy", policy);
  for (const [name, value] of Object.entries(securityHeaders(https))) response.headers.set(name, value);
  return response;
}

export const config = { matcher: "/((?!_next/static|_next/image|favicon.ico|icon.svg).*)" };
