import "server-only";
import { createHash } from "node:crypto";
import type { Limit } from "./rate-limits";

const MINUTE = 60_000;

/** Keys hold no address that could be read back. */
const digest = (text: string) => createHash("sha256").update(text).digest("base64url");

export interface Attempt {
  readonly email: string;
  /** Network address of the sender, see clientAddress(). */
  readonly address: string;
  /** Set when this browser has signed in to this very account before. */
  readonly knownBrowserId: string | null;
}

/**
 * Which limits an attempt counts against.
 *
 * A browser that has signed in to the account before has a limit of its own, so a stranger who uses up
 * the others does not lock its owner out. Anybody else counts three times: sender and account together
 * (guessing at one account), sender alone (trying one password on many), account alone and much wider
 * (many senders guessing at one account); one sender reaches the first long before the last.
 */
export function signInLimits({ email, address, knownBrowserId }: Attempt): Limit[] {
  const account = digest(email);
  if (knownBrowserId) return [{ key: `browser:${digest(knownBrowserId)}:${account}`, points: 10, windowMs: 15 * MINUTE }];
  const sender = digest(address);
  return [
    { key: `pair:${sender}:${account}`, points: 10, windowMs: 15 * MINUTE },
    { key: `sender:${sender}`, points: 100, windowMs: 15 * MINUTE },
    { key: `account:${account}`, points: 100, windowMs: 60 * MINUTE },
  ];
}
