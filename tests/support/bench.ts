import { readFileSync } from "node:fs";
import { fileURLToPath } from "node:url";
import type { Expect, Fault, Kind, PinAssignment, ReadingValue, Role } from "@/lib/diagnosis";

/** One machine of the bench: its hidden truth and what a meter reads at every check; circuits solved by SPICE, outside the project. */
export interface BenchCase {
  readonly id: string;
  readonly task: "identify" | "verify";
  readonly setup: { readonly pins: readonly [string, string, string]; readonly expect?: Expect };
  readonly truth: { readonly kind: Kind; readonly pins: PinAssignment; readonly fault: Fault };
  readonly readings: Readonly<Record<string, ReadingValue>>;
}

/** All bench cases, in the order of the file. */
export function benchCases(): BenchCase[] {
  const file = fileURLToPath(new URL("../engine/data/bench-cases.jsonl", import.meta.url));
  return readFileSync(file, "utf8").trim().split("\n").map((line) => JSON.parse(line) as BenchCase);
}

/** Every n-th case, from the first on: a spread over all that the bench holds. */
export function everyNth<T>(list: readonly T[], n: number): T[] {
  return list.filter((_, i) => i % n === 0);
}

/** A finding as other programs get it. */
export interface Named { readonly code: string; readonly pins?: readonly number[] }
type Pins = Readonly<Record<Role, number>>;

/** Whether two findings are the same, whatever the order of their pins. */
export function sameFault(a: Named | undefined, b: Named): boolean {
  return a !== undefined && a.code === b.code && [...(a.pins ?? [])].sort().join() === [...(b.pins ?? [])].sort().join();
}

/** Whether pins agree; `loose`: a potentiometer's ends are alike, so only the signal pin counts. */
export function samePins(a: Pins | undefined, b: Pins, loose = false): boolean {
  return a !== undefined && a.signal === b.signal && (loose || (a.supply === b.supply && a.ground === b.ground));
}
