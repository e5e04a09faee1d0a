import { NextResponse, type NextRequest } from "next/server";
import { isOwnRequest } from "@/lib/auth/own-origin";
import { isHttps, SURFACE_HEADER, type Surface } from "@/lib/auth/request-facts";
import { contentSecurityPolicy, securityHeaders } from "@/lib/auth/security-headers";
import { env } from "@/lib/env";

const READS = new Set(["GET", "HEAD"]);

function surfaceOf(request: NextRequest): Surface {
  if (request.nextUrl.pathname.startsWith("/api/")) return "route";
  return READS.has(request.method) ? "page" : "action";
}

/** A page takes nothing but the forms and actions of its own. */
function isActionCall(request: NextRequest): boolean {
  if (request.method !== "POST") return false;
  const type = request.headers.get("content-type") ?? "";
  return request.headers.has("next-action") || type.startsWith("multipart/form-data");
}

function refuse(status: number, code: string, message: string, https: boolean): NextResponse {
  return NextResponse.json({ error: { code, message } }, { status, headers: securityHeaders(https) });
}

/** Headers and the origin rule for everything. No boundary: every page, action and route authorises itself. */
export function proxy(request: NextRequest): NextResponse {
  const https = isHttps(request.headers);
  if (!isOwnRequest(request.method, request.headers)) {
    return refuse(403, "foreign-origin", "This request did not come from a page of this workshop. Reload the page and try again.", https);
  }
  const surface = surfaceOf(request);
  if (surface === "action" && !isActionCall(request)) {
    return refuse(405, "method-not-allowed", "This address only shows a page.", https);
  }
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
