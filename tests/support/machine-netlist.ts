import type { FaultCode } from "@/lib/diagnosis";
import type { Circuit } from "./netlist";

/**
 * The machine as a circuit, written down from its description alone (README of the bench; common practice for the values):
 * a controller with a supply and a signal input that is pulled, three wires, a connector, the device, a meter.
 * Nothing of the engine's network code is used. Roles: 0 supply, 1 ground, 2 signal.
 */
export interface Description {
  readonly family: "potentiometer" | "open-collector" | "push-pull" | "voltage";
  readonly pull: "up" | "up-to-supply" | "down";
  readonly fault: FaultCode;
  /** Roles of the fault's places. */
  readonly at: readonly number[];
  /** Potentiometer with an open track: the role of the end where it is broken. */
  readonly brokenEnd: number;
  /** Volts of battery, supply in force, the input's own rail; ohms of everything else; see the names. */
  readonly battery: number; readonly fed: number; readonly rail: number;
  readonly supplySource: number; readonly supplyBleed: number; readonly pullOhms: number; readonly railOff: number; readonly batteryOff: number; readonly faultOhms: number;
  readonly track: number; readonly wiper: number; readonly share: readonly [number, number];
  readonly internal: number; readonly leak: number; readonly clamp: number; readonly dropSupply: number; readonly dropSignal: number;
  /** An input held by a pull-up and a pull-down, ohms, in place of `pull`. */
  readonly divided?: { readonly up: number; readonly down: number };
  /** Resistors in series with the supply's and the ground's end of the track, ohms. */
  readonly ends?: readonly [number, number];
  readonly loadAmperes: number; readonly driveLow: number; readonly high: number;
}

/** Constants of the description: an aged harness's wire, a broken wire's insulation, an input without its pull, a driven output. */
const WIRE = 0.3, BROKEN = 10e9, INPUT_LEAK = 20e6, OUTPUT = 100, OUTPUT_LOW = 0.05, OUTPUT_DROP = 0.1;
/** Junctions: drops are stated at 2 microamperes; emission coefficient; thermal voltage at 27 degrees C. */
const DROP_AMPERES = 2e-6, EMISSION = 1.75, THERMAL = 0.025864;

const saturation = (drop: number) => DROP_AMPERES * Math.exp(-drop / (EMISSION * THERMAL));
const cavity = (role: number) => `c${role}`;
const pin = (role: number) => `p${role}`;

/** Wires from ends e0..e2 at the controller to cavities c0..c2, with their fault. */
export function addWires(net: Circuit, d: Description): void {
  const has = (code: FaultCode, role: number) => d.fault === code && d.at.includes(role);
  for (const role of [0, 1, 2]) {
    const end = has("wires-swapped", role) ? d.at.find((other) => other !== role)! : role;
    net.resistor(`e${end}`, cavity(role), has("wire-open", role) ? BROKEN : WIRE + (has("wire-resistive", role) ? d.faultOhms : 0));
    if (has("short-to-ground", role)) net.resistor(cavity(role), "0", d.faultOhms);
    if (has("short-to-battery", role)) net.resistor(cavity(role), "battery", d.faultOhms);
  }
  if (d.fault === "wires-shorted" || d.fault === "connector-damp") net.resistor(cavity(d.at[0]!), cavity(d.at[1]!), d.faultOhms);
}

/** The battery: its volts with the power on; off, the loads of the machine behind it. */
export function addBattery(net: Circuit, d: Description, on: boolean): void {
  if (on) net.source("battery", "0", d.battery);
  else net.resistor("battery", "0", d.batteryOff);
}

/** The controller's three terminals e0..e2. */
export function addController(net: Circuit, d: Description, on: boolean): void {
  if (on && d.fault !== "supply-missing") net.feed("e0", "0", d.fed, d.supplySource);
  else net.resistor("e0", "0", d.supplyBleed);
  net.source("e1", "0", 0);
  if (d.divided) {
    net.resistor("e2", "0", d.divided.down);
    if (on) net.feed("e2", "0", d.rail, d.divided.up); else net.resistor("e2", "0", d.divided.up + d.railOff);
  } else if (d.fault === "pull-missing") net.resistor("e2", "0", INPUT_LEAK);
  else if (d.pull === "down") net.resistor("e2", "0", d.pullOhms);
  else if (on) net.feed("e2", "0", d.pull === "up" ? d.rail : d.fed, d.pullOhms);
  else net.resistor("e2", "0", d.pullOhms + d.railOff);
}

/** The mated connector: cavities c0..c2 to device pins p0..p2. */
export function addConnector(net: Circuit, d: Description): void {
  for (const role of [0, 1, 2]) {
    if (d.fault === "contact-open" && d.at.includes(role)) net.hold(pin(role));
    else net.source(cavity(role), pin(role), 0);
  }
}

export function addPotentiometer(net: Circuit, d: Description, position: 0 | 1): void {
  const broken = d.fault === "track-open" ? d.brokenEnd : -1, share = d.share[position];
  net.hold("w", pin(0), pin(1), pin(2));
  if (share < 0 || share > 1) {
    // The track goes on past the tap; the wiper stands there.
    net.resistor(pin(0), pin(1), d.track);
    net.resistor("w", pin(share < 0 ? 1 : 0), d.track * (share < 0 ? -share : share - 1));
  } else if (d.ends) {
    net.resistor(pin(0), "a", d.ends[0]);
    net.resistor("a", "w", d.track * (1 - share));
    net.resistor("w", "b", d.track * share);
    net.resistor("b", pin(1), d.ends[1]);
  } else {
    if (broken !== 0) net.resistor(pin(0), "w", d.track * (1 - share));
    if (broken !== 1) net.resistor("w", pin(1), d.track * share);
  }
  if (d.fault !== "wiper-open") net.resistor("w", pin(2), d.wiper);
}

/** Clamp from ground to signal and leakage: there whether the electronics run or not. */
function addClamp(net: Circuit, d: Description): void {
  net.diode(pin(1), "k", saturation(d.dropSignal), EMISSION);
  net.resistor("k", pin(2), d.clamp);
  net.resistor(pin(2), pin(1), d.leak);
  net.hold("k");
}

/** Electronics that do not run: junctions into their inner supply. */
export function addIdleElectronics(net: Circuit, d: Description): void {
  addClamp(net, d);
  net.diode(pin(0), "i", saturation(d.dropSupply), EMISSION);
  net.resistor("i", pin(1), d.internal);
  if (d.family !== "open-collector") net.diode(pin(2), "i", saturation(d.dropSignal), EMISSION);
  net.hold("i", pin(0), pin(1), pin(2));
}

export type Output = "released" | "low" | "high" | number;

/** Electronics that run: a load, and an output that is let go, pulls low, drives high or stands at a number of volts. */
export function addRunningElectronics(net: Circuit, d: Description, output: Output): void {
  addClamp(net, d);
  net.resistor(pin(0), pin(1), d.fed / d.loadAmperes);
  net.hold(pin(0), pin(1), pin(2));
  if (output === "released") return;
  if (d.family !== "open-collector") net.feed(pin(2), pin(1), output === "low" ? OUTPUT_LOW : output === "high" ? Math.min(d.high, d.fed) - OUTPUT_DROP : output, OUTPUT);
  else if (output === "low") net.resistor(pin(2), pin(1), d.driveLow);
}

/** A voltmeter of 10 megohm between two nodes. */
export function addVoltmeter(net: Circuit, red: string, black: string): void {
  net.resistor(red, black, 10e6);
}

/** An ohms function: 2.5 V behind a resistor as large as the range. */
export const OHM_VOLTS = 2.5;
export const OHM_RANGES = [600, 6e3, 6e4, 6e5, 6e6, 6e7] as const;
export function addOhmmeter(net: Circuit, red: string, black: string, range: number): void {
  net.feed(red, black, OHM_VOLTS, range);
}

/** What the ohms function shows at its terminals' volts. */
export const ohmsShown = (volts: number, range: number) => (volts >= OHM_VOLTS * (1 - 1e-9) ? Infinity : range * volts / (OHM_VOLTS - volts));
