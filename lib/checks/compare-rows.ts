import { meterLimit, parseCheck, type EvidenceRow, type MeterSpec, type Prediction, type Reading, type ReadingValue } from "@/lib/diagnosis";
import type { RunSetup } from "./run";
import type { RunStep } from "./run";
import { effectiveReadings } from "./run-state";

/** changed: by more than the meter may be out on both readings. only-one: not taken in both runs. */
export type Change = "changed" | "same" | "only-one";

export interface CompareRow {
  readonly check: string;
  readonly before: ReadingValue | null;
  readonly after: ReadingValue | null;
  /** Meter's limits of error; null for words. */
  readonly beforeLimit: number | null;
  readonly afterLimit: number | null;
  readonly ifSound: Prediction | null;
  readonly change: Change;
}

interface Compared { readonly setup: RunSetup; readonly steps: readonly RunStep[]; readonly verdict: { readonly evidence: readonly EvidenceRow[] } | null }

function limitOf(check: string, value: ReadingValue | null, meter: MeterSpec | undefined): number | null {
  const spec = parseCheck(check);
  return spec && typeof value === "number" ? meterLimit(spec, value, meter) : null;
}

function changeOf(before: ReadingValue | null, after: ReadingValue | null, slack: number): Change {
  if (before === null || after === null) return "only-one";
  if (typeof before === "number" && typeof after === "number") return Math.abs(before - after) > slack ? "changed" : "same";
  return before === after ? "same" : "changed";
}

const valueIn = (readings: readonly Reading[], check: string): ReadingValue | null => readings.find(([code]) => code === check)?.[1] ?? null;

/** Reading by reading, in the order of the first run and then what only the second one took. */
export function compareRows(first: Compared, second: Compared): readonly CompareRow[] {
  const [old, fresh] = [effectiveReadings(first.steps), effectiveReadings(second.steps)];
  const codes = [...new Set([...old, ...fresh].map(([code]) => code))];
  const sound = new Map([...(first.verdict?.evidence ?? []), ...(second.verdict?.evidence ?? [])].map((row) => [row.check, row.ifSound]));
  return codes.map((check) => {
    const [before, after] = [valueIn(old, check), valueIn(fresh, check)];
    const beforeLimit = limitOf(check, before, first.setup.meter);
    const afterLimit = limitOf(check, after, second.setup.meter);
    return { check, before, after, beforeLimit, afterLimit, ifSound: sound.get(check) ?? null, change: changeOf(before, after, (beforeLimit ?? 0) + (afterLimit ?? 0)) };
  });
}
