import { describe, expect, it } from "vitest";
import { assess } from "@/lib/diagnosis";
import { sameFault, samePins } from "../support/bench";
import { drawer } from "../support/draw";
import { FIXED_ORDER, followCheck } from "../support/run-check";
import { SLOW } from "../support/slow";
import { wideMachine, type Wanted } from "../support/wide-machine";
import { TAPPED, WIDE } from "../support/wide-values";

/**
 * Machines at the edges of what is met: values are listed with their sources in tests/support/wide-values.ts, readings drawn from
 * the engine's model, whose circuits are held against SPICE for the same values (tests/published-values/wide-values-against-spice).
 */
const cases = (list: readonly Wanted[]) => list.map((wanted, i) => [wanted.name, wanted, i] as const);

function standing(setup: Parameters<typeof assess>[0], readings: Parameters<typeof assess>[1]) {
  const a = assess(setup, readings);
  if (a.state === "invalid-input") throw new Error(`${a.message} (${a.where})`);
  return a;
}

describe("a check followed to its end", SLOW, () => {
  it.each(cases(WIDE))("%s", (_, wanted, i) => {
    const m = wideMachine(wanted, drawer(500 + i)), { last, invalid } = followCheck((readings) => standing(m.setup, readings), (check) => m.readings[check]);
    const says = `${m.drawn.candidate.hypothesis.id}: ${JSON.stringify(last.faults.slice(0, 3))}`;
    expect(invalid).toBeNull();
    expect(last.kinds[0]!.kind, says).toBe(m.truth.kind);
    // A faulty potentiometer's ends cannot be told apart on the bench (the bench's rule): only its signal pin counts.
    expect(samePins(last.pins[0], m.truth.pins, m.truth.kind === "potentiometer" && m.truth.fault.code !== "none"), says).toBe(true);
    expect(sameFault(last.faults[0], m.truth.fault), says).toBe(true);
    expect(last.done).toBe(true);
  });
});

describe("all ohms of a tapped potentiometer, in both positions", SLOW, () => {
  it.each(cases(TAPPED))("%s: explained, where a plain track would contradict them", (_, wanted, i) => {
    const m = wideMachine(wanted, drawer(700 + i)), a = standing(m.setup, FIXED_ORDER.slice(0, 20).map((check) => [check, m.readings[check]!]));
    expect(a.state).toBe("ranked");
    expect(a.kinds[0]!.kind).toBe("potentiometer");
    expect(a.pins[0]!.signal).toBe(m.truth.pins.signal);
    expect(sameFault(a.faults[0], m.truth.fault), JSON.stringify(a.faults.slice(0, 3))).toBe(true);
  });
});
