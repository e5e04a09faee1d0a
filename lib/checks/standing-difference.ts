import type { Assessment } from "@/lib/diagnosis";
import { standingSchema, type ComparedStanding } from "./schemas";

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
export function standingDifference(server: Assessment, phone: ComparedStanding): readonly string[] {
  const own = standingSchema.parse(JSON.parse(JSON.stringify(server)));
  const keys = Object.keys(own) as (keyof ComparedStanding)[];
  return keys.filter((key) => !same(own[key], phone[key]));
}
