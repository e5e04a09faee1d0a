import "server-only";
import { env } from "@/lib/env";
import { AppError } from "@/lib/errors";

type HeaderReader = Pick<Headers, "get">;

const SAFE_METHODS = new Set(["GET", "HEAD", "OPTIONS"]);

function isOwnOrigin(origin: string, headers: HeaderReader): boolean {
  const { appOrigin } = env();
  if (appOrigin) return origin === appOrigin;
  const host = headers.get("host");
  return host !== null && URL.canParse(origin) && new URL(origin).host === host;
}

/**
 * May this request change anything? Only when the browser says it comes from a page of our own: by its
 * Origin or, without one, by Sec-Fetch-Site. A request with neither is refused.
 */
export function isOwnRequest(method: string, headers: HeaderReader): boolean {
  if (SAFE_METHODS.has(method.toUpperCase())) return true;
  const origin = headers.get("origin");
  if (origin !== null) return isOwnOrigin(origin, headers);
  return headers.get("sec-fetch-site") === "same-origin";
}

/** @throws AppError foreign-origin (403) */
export function assertOwnRequest(method: string, headers: HeaderReader): void {
  if (!isOwnRequest(method, headers)) {
    throw new AppError("foreign-origin", "This request did not come from a page of this workshop. Reload the page and try again.", 403);
  }
}
