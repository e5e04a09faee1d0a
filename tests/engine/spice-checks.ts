import { vocabulary, type CheckSpec } from "@/lib/diagnosis";
import {
  addBattery, addConnector, addController, addIdleElectronics, addOhmmeter, addPotentiometer, addRunningElectronics, addVoltmeter, addWires, OHM_RANGES, ohmsShown,
  type Description, type Output,
} from "../support/machine-netlist";
import { Circuit } from "../support/netlist";

/** One circuit to solve, and the two nodes that the meter touches. */
export interface Probe { readonly circuit: Circuit; readonly red: string; readonly black: string; readonly range: number }
type Volts = (node: string) => number;

/** Volts that the meter shows in a solved probe. */
export const voltsAt = (p: Probe, volts: Volts) => volts(p.circuit.node(p.red)) - (p.black === "0" ? 0 : volts(p.circuit.node(p.black)));

let made = 0;
const circuit = () => new Circuit(`x${made++}_`);

/** Role that a pin of the check has. */
export type RoleOf = (pin: number) => number;

/** Ohms of a straight circuit: any one range shows the same. */
const ANY_RANGE = 6e4;

function wireProbe(d: Description, check: CheckSpec, role: RoleOf): Probe {
  const net = circuit(), red = role(check.red as number);
  addWires(net, d);
  addBattery(net, d, false);
  net.hold("e0", "e1", "e2", "c0", "c1", "c2");
  const probe = check.place === "wire" ? { red: `e${red}`, black: `c${red}` } : { red: `c${red}`, black: check.black === "gnd" ? "0" : `c${role(check.black as number)}` };
  addOhmmeter(net, probe.red, probe.black, ANY_RANGE);
  return { circuit: net, ...probe, range: ANY_RANGE };
}

function harnessProbe(d: Description, check: CheckSpec, role: RoleOf): Probe {
  const net = circuit(), on = check.meter === "dc-volts";
  const red = check.place === "battery" ? "battery" : `c${role(check.red as number)}`, black = check.black === "gnd" ? "0" : `c${role(check.black as number)}`;
  addWires(net, d);
  addBattery(net, d, on);
  addController(net, d, on);
  net.hold("c0", "c1", "c2");
  if (on) addVoltmeter(net, red, black); else addOhmmeter(net, red, black, ANY_RANGE);
  return { circuit: net, red, black, range: ANY_RANGE };
}

/** The parted device between two of its pins, in every range that the check may need. */
export function deviceProbes(d: Description, check: CheckSpec, role: RoleOf): Probe[] {
  const red = `p${role(check.red as number)}`, black = `p${role(check.black as number)}`;
  return (d.family === "potentiometer" ? [ANY_RANGE] : OHM_RANGES).map((range) => {
    const net = circuit();
    if (d.family === "potentiometer") addPotentiometer(net, d, check.position === "full" ? 1 : 0);
    else addIdleElectronics(net, d);
    net.source(black, "0", 0);
    addOhmmeter(net, red, black, range);
    return { circuit: net, red, black, range };
  });
}

/** Close to the end of a range a meter may show the one or the other, and through junctions they differ much. */
const RANGE_END = 0.15;

/** What the lowest range that holds the reading shows; beside it the neighbour's, where the reading is close to a range's end. */
export function autoranged(d: Description, probes: readonly Probe[], volts: Volts): number[] {
  const shown = probes.map((p) => ohmsShown(voltsAt(p, volts), p.range));
  if (d.family === "potentiometer") return shown;
  const full = (k: number) => shown[k]! / probes[k]!.range, found = shown.findIndex((_, k) => full(k) < 1), k = found < 0 ? shown.length - 1 : found;
  const near = [k - 1, k].filter((n) => n >= 0 && Math.abs(full(n) - 1) < RANGE_END).map((n) => (n === k ? k + 1 : n));
  return [k, ...near].filter((n) => n < shown.length).map((n) => shown[n]!);
}

/** The mated machine with the meter at one cavity; `doing`: the actuator's position, or what the electronics do. */
export function matedProbe(d: Description, role: number, doing: 0 | 1 | "idle" | { readonly output: Output }): Probe {
  const net = circuit(), red = `c${role}`;
  addWires(net, d);
  addBattery(net, d, true);
  addController(net, d, true);
  addConnector(net, d);
  if (doing === "idle") addIdleElectronics(net, d);
  else if (typeof doing === "object") addRunningElectronics(net, d, doing.output);
  else addPotentiometer(net, d, doing);
  addVoltmeter(net, red, "0");
  return { circuit: net, red, black: "0", range: 0 };
}

/** Checks of straight circuits: wires, loose ends, harness, battery. */
export const STRAIGHT = vocabulary().filter((c) => ["wire", "loose", "harness", "battery"].includes(c.place));
export const straightProbe = (d: Description, check: CheckSpec, role: RoleOf) => (check.place === "wire" || check.place === "loose" ? wireProbe(d, check, role) : harnessProbe(d, check, role));
