import type { Assessment } from "@/lib/diagnosis";

/** What of a standing decides a verdict; what only words or proposes may differ between versions of the page. */
const COMPARED = ["state", "kinds", "pins", "faults", "openFindings", "done", "inseparable"] as const;

/** Same structure, same numbers to the last bit; the order of an object's keys does not matter, that of a list does. */
function same(a: unknown, b: unknown): boolean {
  if (typeof a !== "object" || typeof b !== "object" || a === null || b === null) return Object.is(a, b);
  if (Array.isArray(a) !== Array.isArray(b)) return false;
  const [left, right] = [a as Record<string, unknown>, b as Record<string, unknown>];
  const keys = Object.keys(left);
  return keys.length === Object.keys(right).length && keys.every((key) => Object.hasOwn(right, key) && same(left[key], right[key]));
}

/**
 * Names of the parts in which the phone's standing differs from the server's; empty when they are equal to the last bit.
 * Numbers survive JSON unchanged, so any difference means that the two did not run the same code on the same readings.
 */
export function standingDifference(server: Assessment, phone: Readonly<Record<string, unknown>>): readonly string[] {
  const own = JSON.parse(JSON.stringify(server)) as Record<string, unknown>;
  return COMPARED.filter((key) => Object.hasOwn(phone, key) && !same(own[key], phone[key]));
}
