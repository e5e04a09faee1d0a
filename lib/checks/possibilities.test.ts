import { describe, expect, it } from "vitest";
import { chosenPair, possibilityChoices, possibleFindings } from "./possibilities";
import { tellTwoApart } from "./tell-two-apart";

const LABELS = ["A", "B", "C"] as const;
const FAULTS = [{ code: "wire-open", pins: [2], p: 0.6 }, { code: "contact-open", pins: [2], p: 0.397 }, { code: "none", p: 0.003 }] as const;
const KINDS = [{ kind: "pwm", p: 0.8 }, { kind: "voltage", p: 0.199 }, { kind: "potentiometer", p: 0.001 }] as const;

describe("what can be looked into", () => {
  it("are the findings still possible, and sound always", () => {
    expect(possibleFindings({ faults: FAULTS }).map(({ code }) => code)).toEqual(["wire-open", "contact-open", "none"]);
    expect(possibleFindings({ faults: FAULTS.slice(0, 1) }).map(({ code }) => code)).toEqual(["wire-open", "none"]);
  });

  it("can be told apart by name, kinds too while more than one is left", () => {
    const choices = possibilityChoices({ faults: FAULTS, kinds: KINDS }, LABELS);
    expect(choices.map(({ id }) => id)).toEqual(["wire-open:2", "contact-open:2", "none", "kind:pwm", "kind:voltage"]);
    expect(choices[3]?.clause).toBe("it is a PWM device");
    expect(possibilityChoices({ faults: FAULTS, kinds: [{ kind: "pwm", p: 0.999 }, { kind: "voltage", p: 0.001 }] }, LABELS)).toHaveLength(3);
  });

  it("takes a pair only of two different ones that are on the list", () => {
    const choices = possibilityChoices({ faults: FAULTS, kinds: KINDS }, LABELS);
    expect(chosenPair(choices, ["none", "wire-open:2"])?.map(({ id }) => id)).toEqual(["none", "wire-open:2"]);
    expect(chosenPair(choices, ["none", "none"])).toBeNull();
    expect(chosenPair(choices, ["none", "<script>"])).toBeNull();
    expect(chosenPair(choices, [undefined, undefined])).toBeNull();
  });
});

describe("what would tell two apart", () => {
  it("counts a skipped check too, and gives each side its expectation", () => {
    const choices = possibilityChoices({ faults: FAULTS, kinds: KINDS }, LABELS), pair = chosenPair(choices, ["wire-open:2", "contact-open:2"]);
    if (!pair) throw new Error("not on the list");
    const at = "2026-03-01T08:00:00Z";
    const steps = [
      { id: "01J00000000000000000000001", at, type: "reading", check: "volt:mated:1-gnd@rest", value: 5, typed: "5" },
      { id: "01J00000000000000000000002", at, type: "skip", check: "res:wire:2", reason: "cannot-reach" },
    ] as const;
    const told = tellTwoApart({ setup: { cavityLabels: LABELS }, steps }, pair);
    expect(told.map(({ check }) => check)).toContain("res:wire:2");
    expect(told.every(({ reads }) => reads.length === 2)).toBe(true);
    expect(told.length).toBeLessThanOrEqual(4);
  });
});
