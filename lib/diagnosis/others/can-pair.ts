import type { CheckSpec, Terminal } from "../types";
import { between, near, word, type Expected } from "./density";
import { EVERY_ORDER, grid, GROUND_OHMS, harnessVolts, JUNCTIONS, NO_PULSES, STEADY, SUPPLY_OHMS, wiringExpects, type OtherFamily } from "./family";

/**
 * CAN pair: lines high, low and a third (ground, supply or not connected). Source: ISO 11898-2: both lines at 2.5 V when recessive, 120 ohm at each
 * end of the bus, so 60 ohm between the lines with both in; dominant some 3.5 and 1.5 V, which on the mean moves them apart by some tenths [memory].
 */
const HIGH = 0, LOW = 1, MIDDLE_VOLTS = 2.5;
interface Setting { readonly weight: number; readonly third: "ground" | "none" | number; readonly terminator: number | null; readonly apart: number }

const SETTINGS: readonly Setting[] = (["ground", "none", ...grid(5, 12, 24)] as const).flatMap((third) => [120, 60, null].flatMap((terminator) =>
  grid(0, 0.15, 0.35).map((apart) => ({ weight: typeof third === "number" ? 1 / 3 : 1, third, terminator, apart }))));

const thirdVolts = ({ third }: Setting) => (typeof third === "number" ? third : 0);
const busVolts = (line: number, s: Setting) => (line === HIGH ? MIDDLE_VOLTS + s.apart : line === LOW ? MIDDLE_VOLTS - s.apart : thirdVolts(s));
const spreadOf = (line: number, s: Setting) => (line === HIGH || line === LOW ? 0.12 : 0.02 + 0.06 * thirdVolts(s));

function expects(spec: CheckSpec, line: (t: Terminal) => number, s: Setting): Expected {
  const red = line(spec.red), onBus = red === HIGH || red === LOW;
  if (spec.place === "device") {
    if (red + line(spec.black) !== HIGH + LOW) return JUNCTIONS;
    return s.terminator === null ? [between(0.95, 5000, 200_000), word(0.05, "OL")] : [near(0.98, s.terminator, 0.03 * s.terminator)];
  }
  if (spec.place === "harness") {
    if (spec.meter !== "dc-volts") return onBus ? [between(0.9, 500, 200_000), word(0.1, "OL")] : s.third === "ground" ? GROUND_OHMS : s.third === "none" ? [word(0.98, "OL")] : SUPPLY_OHMS;
    return [near(0.98, harnessVolts(spec, line, [HIGH, LOW, 2].map((l) => busVolts(l, s))), spec.black === "gnd" ? spreadOf(red, s) : Math.max(spreadOf(red, s), spreadOf(line(spec.black), s)))];
  }
  if (spec.meter === "dc-volts") return [near(0.98, busVolts(red, s), spreadOf(red, s))];
  if (spec.meter === "ac-volts") return onBus ? [between(0.98, 0, 1.2)] : STEADY;
  if (spec.meter === "watch") return [word(0.9, "still"), word(0.06, "jumps"), word(0.04, "smooth")];
  if (!onBus || s.apart === 0) return NO_PULSES;
  return spec.meter === "hertz" ? [between(0.75, 100, 600_000), word(0.25, "none")] : [between(0.75, 0.05, 0.95), word(0.25, "none")];
}

export const CAN_PAIR: OtherFamily<Setting> = { device: "can-pair", orders: EVERY_ORDER, settings: SETTINGS, expects: (spec, line, s) => wiringExpects(spec) ?? expects(spec, line, s) };
