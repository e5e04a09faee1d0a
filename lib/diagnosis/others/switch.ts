import { norm } from "../numerics";
import type { CheckSpec, Terminal } from "../types";
import { between, near, word, type Expected } from "./density";
import { EVERY_ORDER, grid, GROUND_OHMS, harnessVolts, JUNCTIONS, NO_PULSES, STEADY, SUPPLY_OHMS, wiringExpects, type OtherFamily } from "./family";

/**
 * Switching output, such as a proximity switch: lines plus, minus, output. PNP gives its supply less 0.3 to 2.5 V or lets the line
 * fall to 0; NPN pulls a line that is held up to 0 to 2 V. It changes over at one place of the travel. Source: common practice.
 */
const PLUS = 0, MINUS = 1;
interface Setting { readonly weight: number; readonly supply: number; readonly held: number; readonly on: readonly [boolean, boolean] }

const STATES = [{ weight: 0.45, on: [true, false] }, { weight: 0.45, on: [false, true] }, { weight: 0.05, on: [true, true] }, { weight: 0.05, on: [false, false] }] as const;
const SUPPLIES = grid(5, 8, 10, 12, 15, 18, 21, 24, 27, 30);

/** Volts of the output: on and off. */
function outputVolts(pnp: boolean, on: boolean, { supply, held }: Setting): Expected {
  if (pnp) return on ? [near(0.98, supply - 1.3, norm(0.6, 0.06 * supply))] : [near(0.98, 0.05, 0.08)];
  return on ? [between(0.98, 0, 2)] : [near(0.98, held, 0.06 * held)];
}
/** Half way it may have changed over or not. */
const half = (expected: Expected): Expected => expected.map((part) => ({ ...part, p: 0.5 * part.p }));

const expectsOf = (pnp: boolean) => (spec: CheckSpec, line: (t: Terminal) => number, s: Setting): Expected => {
  const red = line(spec.red), output = red !== PLUS && red !== MINUS, spread = 0.06 * s.supply, known = wiringExpects(spec);
  if (known) return known;
  if (spec.place === "device") return JUNCTIONS;
  if (spec.place === "harness") {
    if (spec.meter !== "dc-volts") return red === PLUS ? SUPPLY_OHMS : red === MINUS ? GROUND_OHMS : [between(0.97, 470, 200_000)];
    return [near(0.98, harnessVolts(spec, line, [s.supply, 0, pnp ? 0 : s.held]), spec.black === "gnd" && (red === MINUS || (output && pnp)) ? 0.02 : spread)];
  }
  if (spec.meter === "dc-volts" && output && spec.position === "half") return [...half(outputVolts(pnp, s.on[0], s)), ...half(outputVolts(pnp, s.on[1], s))];
  if (spec.meter === "dc-volts") return output ? outputVolts(pnp, s.on[spec.position === "full" ? 1 : 0]!, s) : [red === PLUS ? near(0.98, s.supply, spread) : near(0.98, 0, 0.02)];
  if (spec.meter === "ac-volts") return STEADY;
  if (spec.meter !== "watch") return NO_PULSES;
  return output && s.on[0] !== s.on[1] ? [word(0.85, "jumps"), word(0.1, "smooth"), word(0.05, "still")] : [word(0.97, "still"), word(0.03, "jumps")];
};

const settings = (helds: (supply: number) => readonly number[]): readonly Setting[] =>
  SUPPLIES.flatMap((supply) => helds(supply).flatMap((held) => STATES.map(({ weight, on }) => ({ weight: weight / helds(supply).length, supply, held, on }))));

export const SWITCH_PNP: OtherFamily<Setting> = { device: "switch-pnp", orders: EVERY_ORDER, settings: settings(() => [0]), expects: expectsOf(true) };
export const SWITCH_NPN: OtherFamily<Setting> = { device: "switch-npn", orders: EVERY_ORDER, settings: settings((supply) => [supply, 5]), expects: expectsOf(false) };
