import { faultId } from "../circuit/candidate";
import { marginals } from "../inference/standing";
import type { Reading, ReadingEffect, Setup } from "../types";
import { drain, leavingOut } from "./leaving-out";

/** Chances are compared no closer to nothing than this: beyond it the model itself is not that good. */
const LEAST_CHANCE = 1e-6;
/** Findings below this chance, with and without the reading, are left out of its effect. */
const WORTH_NAMING = 0.01;

/** How many times likelier: chance with over chance without; 1e-6 to 1e6. */
export const factorOf = (chance = 0, without = 0) => Math.max(chance, LEAST_CHANCE) / Math.max(without, LEAST_CHANCE);

/** The same as `effects`, in steps of one belief each. */
export function* effectsSteps(setup: Setup, readings: readonly Reading[]): Generator<void, ReadingEffect[]> {
  const left = yield* leavingOut(setup, readings), all = marginals(left.all);
  return readings.map(([check, value], i) => {
    const others = marginals(left.without[i]!);
    const kindWithout = new Map(others.kinds.map((k) => [k.kind, k.p])), faultWithout = new Map(others.faults.map((f) => [faultId(f), f.p]));
    const seen = new Map([...others.faults, ...all.faults].map(({ code, pins }) => [faultId({ code, pins }), pins ? { code, pins } : { code }]));
    const faultWith = new Map(all.faults.map((f) => [faultId(f), f.p]));
    return {
      check, value,
      kinds: all.kinds.map(({ kind, p }) => ({ kind, factor: factorOf(p, kindWithout.get(kind)) })),
      faults: [...seen].filter(([id]) => Math.max(faultWith.get(id) ?? 0, faultWithout.get(id) ?? 0) >= WORTH_NAMING)
        .map(([id, fault]) => ({ fault, factor: factorOf(faultWith.get(id), faultWithout.get(id)) })),
    };
  });
}

/**
 * How each reading moved the chances: belief with all readings over belief with this one left out. A factor above 1
 * speaks for, below 1 against; the order in which readings were taken does not matter.
 */
export function effects(setup: Setup, readings: readonly Reading[]): ReadingEffect[] {
  return drain(effectsSteps(setup, readings));
}
