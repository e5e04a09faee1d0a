import { describe, expect, it } from "vitest";
import { assess, type Reading } from "@/lib/diagnosis";
import { benchCases, everyNth } from "../support/bench";
import { SLOW } from "../support/slow";

/** Common practice: a wet connector leaks some 10 kohm to 1 Mohm between two cavities. The bench has no such machine. */
const PINS: readonly [string, string, string] = ["1", "2", "3"];
const WHOLE: Reading[] = [["res:wire:1", 0.5], ["res:wire:2", 0.5], ["res:wire:3", 0.6]];

describe("a damp connector", SLOW, () => {
  it.each([[12_000, "connector-damp"], [120_000, "connector-damp"], [900_000, "connector-damp"], [1.1, "wires-shorted"]] as const)("%d ohm between two loose wires of an unknown device: %s", (ohms, code) => {
    const a = assess({ pins: PINS }, [...WHOLE, ["res:loose:1-2", "OL"], ["res:loose:2-3", ohms], ["res:loose:1-3", "OL"]]);
    if (a.state === "invalid-input") throw new Error(a.message);
    expect(a.faults[0]).toMatchObject({ code, pins: [2, 3] });
    // One reading alone may also be a slip: likelier than not, but not sure.
    expect(a.faults[0]!.p).toBeGreaterThan(0.65);
  });

  it("is what no machine of the bench is said to have, all readings at hand", () => {
    for (const c of everyNth(benchCases(), 16)) {
      const a = assess(c.setup, Object.entries(c.readings) as Reading[]);
      if (a.state === "invalid-input") throw new Error(a.message);
      expect(a.openFindings.map(({ code }) => code), c.id).not.toContain("connector-damp");
    }
  });
});
