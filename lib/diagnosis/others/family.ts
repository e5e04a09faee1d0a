import { exp, ln } from "../numerics";
import type { Observation } from "../inference/observe";
import type { CheckSpec, OtherDevice, PinNumber, Terminal } from "../types";
import { between, logChance, near, word, type Expected } from "./density";

/** What stands at each pin, by the family's own numbering of its three lines; `pinOf[line]` is the pin. */
export type Order = readonly [PinNumber, PinNumber, PinNumber];
export const EVERY_ORDER: readonly Order[] = [[1, 2, 3], [1, 3, 2], [2, 1, 3], [2, 3, 1], [3, 1, 2], [3, 2, 1]];

/** A thing that is not one of the three kinds: sound and wired right, with every value that matters on a grid. */
export interface OtherFamily<Setting extends { readonly weight: number }> {
  readonly device: OtherDevice;
  /** Orders of its lines on the pins that differ. */
  readonly orders: readonly Order[];
  readonly settings: readonly Setting[];
  /** What a meter shows; lines are 0 to 2 by `line`. */
  readonly expects: (spec: CheckSpec, line: (t: Terminal) => number, setting: Setting) => Expected;
}

/**
 * Log-chance of the readings under a family: the mean over the orders of its lines and its settings. What cannot reach
 * `least` is given up on the way; -Infinity where nothing does.
 */
export function logEvidence<S extends { readonly weight: number }>(family: OtherFamily<S>, obs: readonly Observation[], least: number): number {
  const logs: number[] = [], whole = family.settings.reduce((sum, s) => sum + s.weight, 0) * family.orders.length;
  // The most that each observation and those after it could still add: a number at its peak, a word for certain.
  const still = new Float64Array(obs.length + 1);
  for (let i = obs.length - 1; i >= 0; i--) still[i] = still[i + 1]! + Math.max(0, obs[i]!.word === null ? obs[i]!.logPeak : 0);
  for (const order of family.orders) {
    const line = (t: Terminal) => order.indexOf(t as PinNumber);
    for (const setting of family.settings) {
      let log = ln(setting.weight / whole);
      for (let i = 0; i < obs.length && log + still[i]! >= least; i++) log += logChance(obs[i]!, family.expects(obs[i]!.spec, line, setting));
      if (log >= least) logs.push(log);
    }
  }
  if (logs.length === 0) return -Infinity;
  const most = Math.max(...logs);
  return most + ln(logs.reduce((sum, log) => sum + exp(log - most), 0));
}

/** Numbers on a grid with equal weights. */
export const grid = (...values: readonly number[]): readonly number[] => values;

/** What is the same whatever the device: battery, grip of contacts, whole wires that touch nothing (common practice). */
export function wiringExpects(spec: CheckSpec): Expected | null {
  switch (spec.place) {
    case "battery": return [between(1, 6, 34)];
    case "contact": return [word(0.97, "grips"), word(0.03, "loose")];
    case "wire": return [near(0.98, 0.5, 0.25)];
    case "loose": return [word(0.98, "OL")];
    default: return null;
  }
}

/** DC volts of a harness check between two lines, or from one to battery negative, out of the volts of each line. */
export const harnessVolts = (spec: CheckSpec, line: (t: Terminal) => number, volts: readonly number[]): number =>
  volts[line(spec.red)]! - (spec.black === "gnd" ? 0 : volts[line(spec.black)]!);

/** Ohms of a controller's supply terminal, of its ground, with the power off (common practice). */
export const SUPPLY_OHMS: Expected = [between(0.85, 300, 200_000), word(0.15, "OL")];
export const GROUND_OHMS: Expected = [near(0.98, 0.5, 0.3)];
/** Ohms of unknown electronics, by way of their junctions. */
export const JUNCTIONS: Expected = [between(0.55, 1000, 60e6), word(0.45, "OL")];
/** AC volts of a line that stands still. */
export const STEADY: Expected = [near(0.98, 0, 0.05)];
export const NO_PULSES: Expected = [word(0.98, "none")];
