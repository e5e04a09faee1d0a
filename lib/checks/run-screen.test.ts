import { describe, expect, it } from "vitest";
import type { Assessment } from "@/lib/diagnosis";
import type { RunStep } from "./run";
import { nextScreen } from "./run-screen";

const at = "2026-03-02T09:00:00.000Z";
const cold: RunStep = { id: "01", at, type: "state", deviceParted: true, controllerParted: false, powerOn: false };
const standing = { kinds: [], pins: [], faults: [], hypotheses: [], openFindings: [], others: [], overLimit: null, inseparable: false };
const proposing = (check: string | null, done = false): Assessment => ({
  state: "ranked", ...standing, done, next: check === null ? [] : [{ check, why: "It tells most.", gainBits: 1, effort: 1 }],
});
const base = { steps: [cold], assessment: null, chosen: null, carryOn: false };

describe("the next screen", () => {
  it("waits while the engine works", () => {
    expect(nextScreen(base).type).toBe("thinking");
  });

  it("shows the proposed reading when the machine is ready for it", () => {
    expect(nextScreen({ ...base, assessment: proposing("res:device:1-2@rest") })).toMatchObject({ type: "reading", spec: { code: "res:device:1-2@rest" } });
  });

  it("shows a state screen first when it is not", () => {
    expect(nextScreen({ ...base, assessment: proposing("volt:battery") })).toMatchObject({ type: "state", transition: { actions: ["power-on"] } });
  });

  it("puts a check picked by hand before the engine's, without waiting for the engine", () => {
    expect(nextScreen({ ...base, chosen: "fit:contact:2" })).toMatchObject({ type: "reading", spec: { code: "fit:contact:2" } });
  });

  it("offers the verdict when enough is known, and goes on when asked to", () => {
    const assessment = proposing("res:wire:1", true);
    expect(nextScreen({ ...base, assessment }).type).toBe("enough");
    expect(nextScreen({ ...base, assessment, carryOn: true }).type).toBe("state");
  });

  it("says so when nothing is left to read, and when the input is refused", () => {
    expect(nextScreen({ ...base, assessment: proposing(null) }).type).toBe("exhausted");
    const refused: Assessment = { state: "invalid-input", code: "pins", message: "Three different labels are needed.", where: "setup.pins" };
    expect(nextScreen({ ...base, assessment: refused })).toEqual({ type: "invalid", message: "Three different labels are needed." });
  });
});
