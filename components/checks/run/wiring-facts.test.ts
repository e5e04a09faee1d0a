import { describe, expect, it } from "vitest";
import { assess, type Reading } from "@/lib/diagnosis";
import { wiringFacts, wiringWords } from "./wiring-facts";

const SETUP = { cavityLabels: ["1", "2", "3"] } as const;
const MATED = { deviceParted: false, controllerParted: false, powerOn: true };
const factsOf = (readings: readonly Reading[]) => wiringFacts({ ...SETUP }, null, MATED, assess({ pins: ["1", "2", "3"] }, readings));

describe("what the drawing shows", () => {
  it("a finding at its wire", () => {
    // A track of 5 kohm on a harness whose second wire reads OL from end to end. [Ohm's law]
    const facts = factsOf([["res:device:1-3@rest", 5010], ["res:device:1-2@rest", 4560], ["volt:harness:1-3", 5], ["volt:harness:1-2", 0], ["res:wire:2", "OL"], ["res:wire:1", 0.2], ["res:wire:3", 0.2]]);
    expect(facts.finding).toMatchObject({ code: "wire-open", pins: [2] });
    expect(wiringWords(facts)).toContain("Believed: ");
  });

  it("neither pins nor findings of a device that is none of the three kinds", () => {
    // NAMUR NE43: 4 and 20 mA across 250 ohm are 1 and 5 V (Ohm's law).
    const facts = factsOf([["volt:harness:1-gnd", 24.1], ["volt:harness:2-gnd", 0], ["res:harness:2-gnd", 250.4], ["volt:mated:2-gnd@rest", 1], ["volt:mated:2-gnd@full", 5]]);
    expect(facts).toMatchObject({ finding: null, roles: [null, null, null], deviceName: "Device" });
    expect(wiringWords(facts)).not.toContain("Believed");
  });
});
