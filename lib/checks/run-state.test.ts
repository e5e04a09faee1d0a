import { describe, expect, it } from "vitest";
import { vocabulary } from "@/lib/diagnosis";
import type { RunStep, SkipReason } from "./run";
import { AS_FOUND, effectiveReadings, engineSetup, excludedChecks, machineState, skipSteps, undoable } from "./run-state";

const at = "2026-03-02T09:00:00.000Z";
const reading = (id: string, check: string, value: number | "OL" = 1): RunStep => ({ id, at, type: "reading", check, value, typed: String(value) });
const skip = (id: string, check: string, reason: SkipReason): RunStep => ({ id, at, type: "skip", check, reason });
const state = (id: string, powerOn: boolean, deviceParted = false): RunStep => ({ id, at, type: "state", deviceParted, controllerParted: false, powerOn });
const retract = (id: string, step: string): RunStep => ({ id, at, type: "retract", step });

describe("readings that stand", () => {
  it("leaves out a reading that was taken back, and brings it back with the retract taken back", () => {
    const steps = [reading("01", "volt:battery", 12.6), retract("02", "01")];
    expect(effectiveReadings(steps)).toEqual([]);
    expect(effectiveReadings([...steps, retract("03", "02")])).toEqual([["volt:battery", 12.6]]);
  });

  it("lets the later of two readings of one check stand, in the place of the later", () => {
    const steps = [reading("01", "volt:battery", 12.6), reading("02", "res:wire:1", "OL"), reading("03", "volt:battery", 24.9)];
    expect(effectiveReadings(steps)).toEqual([["res:wire:1", "OL"], ["volt:battery", 24.9]]);
  });

  it("is the same for steps that arrive twice or out of order", () => {
    const steps = [reading("01", "volt:battery", 12.6), retract("02", "01"), reading("03", "volt:battery", 12.7)];
    expect(effectiveReadings([...steps].reverse().concat(steps))).toEqual(effectiveReadings(steps));
  });
});

describe("machine state", () => {
  it("starts as found: mated, power unknown", () => {
    expect(machineState([])).toEqual(AS_FOUND);
  });

  it("is not changed by undoing a reading, because undo switches no power", () => {
    const steps = [state("01", false, true), reading("02", "res:device:1-2@rest"), state("03", true)];
    expect(undoable(steps)?.id).toBe("02");
    expect(machineState([...steps, retract("04", "02")])).toEqual({ deviceParted: false, controllerParted: false, powerOn: true });
  });

  it("is unknown once a confirmation is taken back, until the next one", () => {
    const steps = [state("01", false, true), state("02", true), retract("03", "02")];
    expect(machineState(steps)).toEqual({ deviceParted: null, controllerParted: null, powerOn: null });
    expect(machineState([...steps, state("04", false)]).powerOn).toBe(false);
  });
});

describe("what cannot be done here", () => {
  const excludedBy = (check: string, reason: SkipReason) => excludedChecks([skip("01", check, reason)], vocabulary());

  it("excludes only the check itself when it cannot be reached", () => {
    expect(excludedBy("volt:mated:1-gnd@rest", "cannot-reach")).toEqual(["volt:mated:1-gnd@rest"]);
  });

  it("excludes every check of a function that the meter lacks", () => {
    const excluded = excludedBy("freq:mated:2@rest", "no-function-on-meter");
    expect(excluded).toHaveLength(6);
    expect(excluded.every((code) => code.startsWith("freq:"))).toBe(true);
  });

  it("excludes full travel and sweep, not rest, when the actuator cannot be moved", () => {
    const excluded = excludedBy("volt:mated:1-gnd@full", "cannot-move-actuator");
    expect(excluded).toContain("sweep:mated:3");
    expect(excluded.some((code) => code.endsWith("@rest"))).toBe(false);
  });

  it("keeps checks with the device parted when only the controller's connector cannot be parted", () => {
    const excluded = excludedBy("res:wire:1", "cannot-part-connector");
    expect(excluded).toContain("res:loose:1-gnd");
    expect(excluded).not.toContain("res:device:1-2@rest");
  });

  it("takes back the exclusion when the check is read after all", () => {
    const steps = [skip("01", "volt:battery", "cannot-reach"), reading("02", "volt:battery", 12.6)];
    expect(skipSteps(steps)).toEqual([]);
    expect(engineSetup({ setup: { cavityLabels: ["A", "B", "C"] }, steps }, vocabulary())).toEqual({ pins: ["A", "B", "C"] });
  });
});
