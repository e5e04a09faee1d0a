import type { Reading, ReadingValue } from "@/lib/diagnosis";
import { parseCheck } from "@/lib/diagnosis";

/** As much of an answer as is needed to carry on with a check. */
export interface Asked { readonly done: boolean; readonly next: readonly { readonly check: string }[] }

export interface Course<A extends Asked> {
  readonly readings: readonly Reading[];
  /** One answer for each number of readings, from the first request on. */
  readonly answers: readonly A[];
  readonly last: A;
  /** A check that was proposed though it was taken before or cannot be read on this machine. */
  readonly invalid: string | null;
}

/** A check that is not done by then is broken off. */
export const MOST_READINGS = 40;

/** Follows the engine's proposals, or an order of one's own, until it is done; starts from `taken`. */
export function followCheck<A extends Asked>(
  ask: (readings: readonly Reading[]) => A, read: (check: string) => ReadingValue | undefined, taken: readonly Reading[] = [], order?: readonly string[],
): Course<A> {
  const readings = [...taken], answers: A[] = [];
  for (;;) {
    const last = ask([...readings]);
    answers.push(last);
    const has = (check: string) => readings.some(([c]) => c === check);
    const next = order ? order.find((check) => !has(check)) : last.next[0]?.check;
    if (last.done || readings.length >= MOST_READINGS || next === undefined) return { readings, answers, last, invalid: null };
    const value = has(next) ? undefined : read(next);
    if (value === undefined) return { readings, answers, last, invalid: next };
    readings.push([next, value]);
  }
}

/** Effort of parting or mating the device connector, the controller connector, and of switching the power (the bench's rule). */
const TOGGLES = [2, 4, 1] as const;

/** Effort of readings in the order taken, the machine mated and off at first: a reading counts 1, changes of its state as the bench counts them. */
export function effortOf(readings: readonly Reading[]): number {
  const state = [false, false, false];
  let effort = 0;
  for (const [check] of readings) {
    effort += 1;
    bench(check).forEach((needed, i) => {
      if (needed === null || needed === state[i]) return;
      effort += TOGGLES[i]!;
      state[i] = needed;
    });
  }
  return effort;
}

/** What a check needs of the machine, from the bench's README: device connector parted, controller connector parted, power on. */
function bench(check: string): readonly (boolean | null)[] {
  const [quantity, place] = check.split(":");
  if (check === "volt:battery") return [null, null, true];
  if (place === "device" || place === "contact") return [true, null, false];
  if (place === "wire" || place === "loose") return [true, true, false];
  return place === "harness" ? [true, false, quantity === "volt"] : [false, false, true];
}

/** The bench's fixed order, for comparison: battery, the parted device, the harness, mated, contacts, wires. */
export const FIXED_ORDER: readonly string[] = [
  "volt:battery",
  ...["1-2", "2-3", "1-3"].flatMap((p) => [`res:device:${p}@rest`, `res:device:${p}@full`]),
  ...["2-1", "3-2", "3-1"].map((p) => `res:device:${p}@rest`),
  ...[1, 2, 3].map((i) => `volt:harness:${i}-gnd`), ...[1, 2, 3].map((i) => `res:harness:${i}-gnd`),
  ...["rest", "full"].flatMap((at) => [1, 2, 3].map((i) => `volt:mated:${i}-gnd@${at}`)),
  ...[1, 2, 3].map((i) => `freq:mated:${i}@rest`), ...["rest", "full"].flatMap((at) => [1, 2, 3].map((i) => `duty:mated:${i}@${at}`)),
  ...["sweep:mated:", "fit:contact:", "res:wire:"].flatMap((what) => [1, 2, 3].map((i) => what + i)),
  ...[1, 2, 3].map((i) => `res:loose:${i}-gnd`), ...["1-2", "2-3", "1-3"].map((p) => `res:loose:${p}`),
];

/** Unit of a check of the vocabulary. */
export function unitOf(check: string) {
  const spec = parseCheck(check);
  if (!spec) throw new Error(`no check ${check}`);
  return spec.unit;
}
