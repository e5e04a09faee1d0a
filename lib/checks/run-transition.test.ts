import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { vocabulary, type MachineState } from "@/lib/diagnosis";
import { AS_FOUND } from "./run-state";
import { transition, type StateAction } from "./run-transition";

const known = fc.record({
  deviceParted: fc.constantFrom(true, false, null), controllerParted: fc.constantFrom(true, false, null), powerOn: fc.constantFrom(true, false, null),
});
const needed = fc.constantFrom(...vocabulary().map((spec) => spec.state));
const moves = (action: StateAction) => action.startsWith("part-") || action.startsWith("mate-");

// Order of changes: common practice of the trade (power off before a connector is parted or mated, power on last).
describe("the way to another machine state", () => {
  it("never parts or mates a connector unless the power is known to be off", () => {
    fc.assert(fc.property(known, needed, (from, to) => {
      const actions = transition(from, to)?.actions ?? [];
      const firstMove = actions.findIndex(moves);
      if (firstMove < 0) return;
      expect(from.powerOn === false || actions.slice(0, firstMove).includes("power-off")).toBe(true);
      expect(actions.indexOf("power-on") < 0 || actions.indexOf("power-on") === actions.length - 1).toBe(true);
    }));
  });

  it("ends where the check needs the machine, and from there is no way left", () => {
    fc.assert(fc.property(known, needed, (from, to) => {
      const way = transition(from, to);
      const end: MachineState = way?.end ?? from;
      for (const part of ["deviceParted", "controllerParted", "powerOn"] as const) if (to[part] !== null) expect(end[part]).toBe(to[part]);
      if (way) {
        expect(way.actions.length).toBeGreaterThan(0);
        expect(transition(way.end, to)).toBeNull();
      }
    }));
  });

  it("asks for the power off before the first resistance on a machine as found", () => {
    const ohms = vocabulary().filter((spec) => spec.meter === "ohms");
    expect(ohms.length).toBeGreaterThan(0);
    for (const spec of ohms) expect(transition(AS_FOUND, spec.state)?.actions[0]).toBe("power-off");
  });

  it("goes from mated and live to parted and live through power off", () => {
    const live: MachineState = { deviceParted: false, controllerParted: false, powerOn: true };
    expect(transition(live, { deviceParted: true, controllerParted: false, powerOn: true })?.actions).toEqual(["power-off", "part-device", "power-on"]);
  });

  it("mates the controller before the device when everything was parted", () => {
    const parted: MachineState = { deviceParted: true, controllerParted: true, powerOn: false };
    expect(transition(parted, { deviceParted: false, controllerParted: false, powerOn: true })?.actions).toEqual(["mate-controller", "mate-device", "power-on"]);
  });

  it("switches nothing when the check does not mind", () => {
    const live: MachineState = { deviceParted: true, controllerParted: false, powerOn: true };
    expect(transition(live, { deviceParted: null, controllerParted: null, powerOn: true })).toBeNull();
  });
});
