import type { CheckSpec, Terminal } from "../types";
import { between, near, word, type Expected } from "./density";
import { EVERY_ORDER, grid, GROUND_OHMS, harnessVolts, JUNCTIONS, NO_PULSES, STEADY, SUPPLY_OHMS, wiringExpects, type OtherFamily } from "./family";

/**
 * Digital protocol of falling edges on the signal's wire: lines supply, ground, signal. Source: SAE J2716: tick 3 to 90 microseconds,
 * nibbles of 12 to 27 ticks, low for at least 5, low below 0.5 V, high above 4.1 V. A nibble has 20 ticks on average and a frame a
 * pulse of 56 besides, so a meter sees about 1/(23 ticks), unsteady: 480 Hz to 14.5 kHz (computed); most work at 3 to 5 microseconds
 * (common practice). The low share is 5/23 or somewhat more whatever is measured.
 */
const SUPPLY = 0, GROUND = 1;
const HIGH_VOLTS = 4.6, LOW_VOLTS = 0.25;
interface Setting { readonly weight: number; readonly highShare: number }

const SETTINGS: readonly Setting[] = grid(0.66, 0.69, 0.72, 0.75, 0.78, 0.81).map((highShare) => ({ weight: 1, highShare }));
const RATE: Expected = [between(0.75, 7000, 28_000), between(0.22, 400, 7000), word(0.03, "none")];

function expects(spec: CheckSpec, line: (t: Terminal) => number, { highShare }: Setting): Expected {
  const red = line(spec.red), signal = red !== SUPPLY && red !== GROUND;
  if (spec.place === "device") return JUNCTIONS;
  if (spec.place === "harness") {
    if (spec.meter !== "dc-volts") return red === SUPPLY ? SUPPLY_OHMS : red === GROUND ? GROUND_OHMS : [between(0.95, 1000, 200_000)];
    if (!signal || spec.black !== "gnd") return [near(0.97, harnessVolts(spec, line, [5, 0, 5]), red === GROUND && spec.black === "gnd" ? 0.02 : 0.25)];
    return [near(0.75, 5, 0.25), near(0.22, 0, 0.05)];
  }
  switch (spec.meter) {
    case "dc-volts": return [signal ? near(0.98, highShare * HIGH_VOLTS + (1 - highShare) * LOW_VOLTS, 0.2) : red === SUPPLY ? near(0.98, 5, 0.15) : near(0.98, 0, 0.02)];
    case "ac-volts": return signal ? [near(0.98, (HIGH_VOLTS - LOW_VOLTS) * Math.sqrt(highShare * (1 - highShare)), 0.4)] : STEADY;
    case "hertz": return signal ? RATE : NO_PULSES;
    case "duty": return signal ? [near(0.95, highShare, 0.02), word(0.05, "none")] : NO_PULSES;
    default: return [word(0.85, "still"), word(0.1, "smooth"), word(0.05, "jumps")];
  }
}

export const EDGE_PROTOCOL: OtherFamily<Setting> = { device: "edge-protocol", orders: EVERY_ORDER, settings: SETTINGS, expects: (spec, line, s) => wiringExpects(spec) ?? expects(spec, line, s) };
