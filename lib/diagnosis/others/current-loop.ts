import type { CheckSpec, Terminal } from "../types";
import { between, near, word, type Expected } from "./density";
import { EVERY_ORDER, grid, harnessVolts, NO_PULSES, STEADY, SUPPLY_OHMS, wiringExpects, type OtherFamily } from "./family";

/**
 * Two-wire current loop: lines plus, minus and one that is not connected or a shield. The controller feeds plus and reads the
 * current across a resistor at minus. Source: NAMUR NE43, 3.8 to 20.5 mA for measured values; resistor 100 to 500 ohm, supply 10 to 30 V by common practice.
 */
const PLUS = 0, MINUS = 1;
const LEAST_AMPERES = 0.0038, MOST_AMPERES = 0.0205;
interface Setting { readonly weight: number; readonly supply: number; readonly shunt: number }

const SETTINGS: readonly Setting[] = grid(10, 12, 15, 18, 21, 24, 27, 30).flatMap((supply) => grid(100, 120, 150, 180, 220, 250, 300, 390, 500).map((shunt) => ({ weight: 1, supply, shunt })));

function expects(spec: CheckSpec, line: (t: Terminal) => number, { supply, shunt }: Setting): Expected {
  const red = line(spec.red), spread = 0.06 * supply;
  if (spec.place === "device") {
    if (red + line(spec.black) !== PLUS + MINUS) return [word(0.96, "OL"), between(0.04, 1000, 60e6)];
    return red === PLUS ? [between(0.55, 200, 20e6), word(0.45, "OL")] : [between(0.35, 200, 20e6), word(0.65, "OL")];
  }
  if (spec.place === "harness") {
    if (spec.meter === "dc-volts") return [near(0.98, harnessVolts(spec, line, [supply, 0, 0]), spec.black === "gnd" && red !== PLUS ? 0.02 : spread)];
    return red === PLUS ? SUPPLY_OHMS : red === MINUS ? [near(0.98, shunt, 0.05 * shunt)] : [word(0.65, "OL"), between(0.35, 0, 3)];
  }
  if (spec.meter === "dc-volts") return [red === PLUS ? near(0.98, supply, spread) : red === MINUS ? between(0.98, LEAST_AMPERES * shunt, MOST_AMPERES * shunt) : near(0.98, 0, 0.03)];
  if (spec.meter === "ac-volts") return STEADY;
  if (spec.meter === "watch") return red === MINUS ? [word(0.9, "smooth"), word(0.08, "still"), word(0.02, "jumps")] : [word(0.97, "still"), word(0.03, "smooth")];
  return NO_PULSES;
}

export const CURRENT_LOOP: OtherFamily<Setting> = { device: "current-loop", orders: EVERY_ORDER, settings: SETTINGS, expects: (spec, line, s) => wiringExpects(spec) ?? expects(spec, line, s) };
