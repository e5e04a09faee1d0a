import { beliefs } from "../assess";
import type { Believed } from "../inference/posterior";
import type { Reading, Setup } from "../types";

/** Belief with all readings, and with each of them left out in turn (same order as the readings). */
export interface LeavingOut { readonly all: readonly Believed[]; readonly without: readonly (readonly Believed[])[] }

/** Belief with all readings, made once for all explanations of them. */
let whole: { readonly name: string; readonly all: readonly Believed[] } | null = null;

export function believedOf(setup: Setup, readings: readonly Reading[]): readonly Believed[] {
  const name = JSON.stringify([setup, readings]);
  if (whole?.name !== name) whole = { name, all: beliefs(setup, readings) };
  return whole.all;
}

/** The last one made: every explanation of the same readings starts from it, and it costs one belief a reading. */
let last: { readonly name: string; readonly made: LeavingOut } | null = null;

/**
 * Works the beliefs out, yielding after each so that whoever waits may do something else in between.
 * Same input, same output; the readings of one setup are only gone through once.
 */
export function* leavingOut(setup: Setup, readings: readonly Reading[]): Generator<void, LeavingOut> {
  const name = JSON.stringify([setup, readings]);
  if (last?.name === name) return last.made;
  const all = believedOf(setup, readings), without: (readonly Believed[])[] = [];
  for (let i = 0; i < readings.length; i++) {
    yield;
    without.push(beliefs(setup, readings.filter((_, k) => k !== i)));
  }
  last = { name, made: { all, without } };
  return last.made;
}

/** Runs steps to their end in one go. */
export function drain<T>(steps: Generator<void, T>): T {
  for (;;) {
    const step = steps.next();
    if (step.done) return step.value;
  }
}
