import "server-only";
import { isIPv6 } from "node:net";
import { env } from "@/lib/env";

/** Set by the server itself on every request (instrumentation.ts); whatever a client sends under this name is overwritten. */
export const PEER_HEADER = "x-pinwright-peer";
/** Set by proxy.ts on every request: what kind of answer is expected. */
export const SURFACE_HEADER = "x-pinwright-surface";
export type Surface = "page" | "action" | "route";

type HeaderReader = Pick<Headers, "get">;

/** Did the browser come over HTTPS? A false claim only changes the sender's own cookie name. */
export function isHttps(headers: HeaderReader): boolean {
  const { appOrigin } = env();
  if (appOrigin) return appOrigin.startsWith("https:");
  return headers.get("x-forwarded-proto")?.split(",")[0]?.trim() === "https";
}

/** An IPv6 customer has a whole /64 to pick addresses from, so that is what counts as one. */
function network(address: string): string {
  const plain = address.replace(/^::ffff:(?=\d+\.)/i, "");
  if (!isIPv6(plain)) return plain;
  const [head = "", tail = ""] = plain.split("::");
  const left = head ? head.split(":") : [];
  const right = tail ? tail.split(":") : [];
  const middle = plain.includes("::") ? Array<string>(Math.max(0, 8 - left.length - right.length)).fill("0") : [];
  return `${[...left, ...middle, ...right].slice(0, 4).map((part) => part.replace(/^0+(?=.)/, "").toLowerCase()).join(":")}::/64`;
}

/**
 * The address that limits are counted by. X-Forwarded-For is believed only as far as our own proxies
 * wrote it: the entry TRUSTED_PROXY_HOPS from the right. Everything left of that anyone can invent.
 */
export function clientAddress(headers: HeaderReader): string {
  const hops = env().trustedProxyHops;
  const peer = headers.get(PEER_HEADER) ?? "unknown";
  if (hops === 0) return network(peer);
  const chain = (headers.get("x-forwarded-for") ?? "").split(",").map((part) => part.trim()).filter(Boolean);
  return network(chain[chain.length - hops] ?? peer);
}

/** For showing a session to its owner; cut, because anyone can send a long one. */
export function userAgent(headers: HeaderReader): string {
  return (headers.get("user-agent") ?? "unknown browser").slice(0, 300);
}
