import { describe, expect, it } from "vitest";
import { DEFAULT_METER, type Reading } from "@/lib/diagnosis";
import { compareRows } from "./compare-rows";
import type { RunStep } from "./run";

const run = (readings: readonly Reading[]) => ({
  setup: { cavityLabels: ["1", "2", "3"] as const, meter: DEFAULT_METER }, verdict: null,
  steps: readings.map(([check, value], i): RunStep => ({ id: `01J000000000000000000000${10 + i}`, at: "2026-03-01T08:00:00Z", type: "reading", check, value, typed: "" })),
});
const changes = (before: readonly Reading[], after: readonly Reading[]) => Object.fromEntries(compareRows(run(before), run(after)).map((row) => [row.check, row.change]));

describe("two runs side by side", () => {
  it("calls a reading changed only beyond what the meter may be out in both runs", () => {
    // 5.000 V, 0.5 % and 4 mV: ±0.029 V each time [computed from the meter's limits].
    expect(changes([["volt:battery", 5]], [["volt:battery", 5.05]])).toEqual({ "volt:battery": "same" });
    expect(changes([["volt:battery", 5]], [["volt:battery", 5.07]])).toEqual({ "volt:battery": "changed" });
  });

  it("compares words with words and numbers with OL", () => {
    expect(changes([["res:wire:2", "OL"], ["sweep:mated:2", "smooth"]], [["res:wire:2", 0.3], ["sweep:mated:2", "smooth"]])).toEqual({ "res:wire:2": "changed", "sweep:mated:2": "same" });
  });

  it("keeps readings of one run only and does not call them changed", () => {
    expect(changes([["res:wire:1", 0.2]], [["res:wire:2", 0.2]])).toEqual({ "res:wire:1": "only-one", "res:wire:2": "only-one" });
  });
});
