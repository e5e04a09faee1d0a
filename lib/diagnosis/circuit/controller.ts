import { GROUND, SUPPLY, type Candidate } from "./candidate";
import { P } from "./parameters";

/** What holds a controller's signal input that has lost its pull, ohms (common practice: tens of megohms). */
const INPUT_LEAK = 20e6;
/** A sound wire with its joints, ohms: some metres of 0.75 mm2 (IEC 60228 class 5: 26 milliohm/m at most) and contacts that have aged; and how far one differs from another. */
const WIRE_OHMS = 0.3;
export const WIRE_OHMS_SPREAD = 0.2;
/** Insulation of a broken wire, ohms: what a sound harness shows between its wires. */
const OPEN_OHMS = 10e9;

/** A voltage behind a resistance, seen from a harness cavity with everything of the wires in it. */
export interface Thevenin { volts: number; ohms: number }

function set(t: Thevenin, volts: number, ohms: number): void { t.volts = volts; t.ohms = ohms; }

/** Supply volts in force: the battery's own where the device is fed from it. */
export function supplyVolts(c: Candidate, x: Float64Array): number {
  return c.suppliedByBattery ? x[P.battery]! : x[P.supply]!;
}

/** Volts that the signal input is pulled to; 0 where it is pulled down. */
function railVolts(c: Candidate, x: Float64Array): number {
  return c.pull === "down" ? 0 : c.pull === "up" ? x[P.rail]! : supplyVolts(c, x);
}

/** The controller's terminal of a role, without the wire. */
function terminal(c: Candidate, x: Float64Array, role: number, on: boolean, t: Thevenin): void {
  if (role === GROUND) return set(t, 0, 0);
  if (role === SUPPLY) {
    if (!on || c.code === "supply-missing") return set(t, 0, x[P.supplyBleed]!);
    return set(t, supplyVolts(c, x), x[P.supplySource]!);
  }
  if (c.code === "pull-missing") return set(t, 0, INPUT_LEAK);
  const pull = x[P.pull]! + (c.pull !== "down" && !on ? x[P.railOff]! : 0);
  set(t, on ? railVolts(c, x) : 0, pull);
}

/** Which controller terminal reaches the cavity of a role: another one where two wires are exchanged. */
export function terminalFor(c: Candidate, role: number): number {
  if (c.code !== "wires-swapped") return role;
  return role === c.at ? c.at2 : role === c.at2 ? c.at : role;
}

/**
 * Thevenin equivalent at the harness cavity of a role (0 supply, 1 ground, 2 signal), device connector
 * parted: controller, wire and any open, resistive or shorted-to-rail wire. Two wires shorted together are
 * not in it; the caller joins them.
 */
export function cavity(c: Candidate, x: Float64Array, role: number, on: boolean, t: Thevenin): void {
  terminal(c, x, terminalFor(c, role), on, t);
  t.ohms += WIRE_OHMS;
  if (c.at !== role) return;
  if (c.code === "wire-open") t.ohms = OPEN_OHMS;
  else if (c.code === "wire-resistive") t.ohms += x[P.fault]!;
  else if (c.code === "short-to-ground") parallel(t, 0, x[P.fault]!);
  else if (c.code === "short-to-battery") parallel(t, on ? x[P.battery]! : 0, x[P.fault]! + (on ? 0 : x[P.batteryOff]!));
}

/** Puts a second voltage behind a resistance in parallel with the first. */
export function parallel(t: Thevenin, volts: number, ohms: number): void {
  const g1 = 1 / t.ohms, g2 = 1 / ohms;
  set(t, (t.volts * g1 + volts * g2) / (g1 + g2), 1 / (g1 + g2));
}

/** Ohms from a loose wire (both ends parted) to battery negative, or Infinity. */
export function looseToGround(c: Candidate, x: Float64Array, role: number): number {
  if (c.at !== role) return Infinity;
  if (c.code === "short-to-ground") return x[P.fault]!;
  return c.code === "short-to-battery" ? x[P.fault]! + x[P.batteryOff]! : Infinity;
}

/** Ohms end to end of the wire that should serve a role's cavity, both ends parted; Infinity where it goes elsewhere. */
export function wireOhms(c: Candidate, x: Float64Array, role: number): number {
  const concerned = c.at === role || c.at2 === role;
  if (!concerned) return WIRE_OHMS;
  if (c.code === "wires-swapped" || c.code === "wire-open") return Infinity;
  return c.code === "wire-resistive" ? WIRE_OHMS + x[P.fault]! : WIRE_OHMS;
}

