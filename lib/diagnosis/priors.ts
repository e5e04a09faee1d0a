import type { Family, Pull } from "./circuit/parameters";
import type { FaultCode, Kind } from "./types";

/**
 * Chances before the first reading, as relative weights. Common practice: when a technician is sent to a
 * machine, about a third of the devices turn out sound; of the rest most faults are in wires and connectors
 * (interconnections lead every published list of electrical failures, e.g. FMD-91 as in MIL-HDBK-338B:
 * connection open 0.61, poor 0.23, short 0.16), fewer in the device, few in the controller.
 * A fault with several places shares its weight among them.
 */
export const FAULT_WEIGHTS: Readonly<Record<FaultCode, number>> = {
  none: 0.31, "wire-open": 0.15, "wire-resistive": 0.09, "short-to-ground": 0.075, "contact-open": 0.07, "wires-swapped": 0.055,
  "supply-missing": 0.05, "short-to-battery": 0.05, "wires-shorted": 0.04, "pull-missing": 0.025, "track-worn": 0.055,
  "wiper-open": 0.03, "track-open": 0.02, "output-dead": 0.03, "output-stuck-high": 0.03, "output-stuck-low": 0.03,
};

/** Common practice: no kind is rare on mobile plant; powered voltage devices are the fewest of the three. */
export const KIND_WEIGHTS: Readonly<Record<Kind, number>> = { potentiometer: 0.38, pwm: 0.4, voltage: 0.22 };

/** Open-collector outputs are the more common of the two PWM output types (common practice). */
export const FAMILY_SHARE: Readonly<Record<Family, number>> = { potentiometer: 1, "open-collector": 0.65, "push-pull": 0.35, voltage: 1 };

/** How the controller holds the signal input when nothing drives it. An open collector needs a pull-up to work at all. */
export const PULL_SHARE: Readonly<Record<Family, Readonly<Record<Pull, number>>>> = {
  potentiometer: { down: 0.7, up: 0.08, "up-to-supply": 0.22 }, voltage: { down: 0.7, up: 0.08, "up-to-supply": 0.22 },
  "push-pull": { down: 0.9, up: 0.06, "up-to-supply": 0.04 }, "open-collector": { down: 0, up: 0.65, "up-to-supply": 0.35 },
};

/** Chance that the device fitted is the one a catalogue entry names, pins included. */
export const ENTRY_IS_RIGHT = 0.97;

/** A test terminal tried in a contact: a bad contact feels loose 95 times in 100, a sound one 3 (common practice). */
export const LOOSE_IF_BAD = 0.95;
export const LOOSE_IF_SOUND = 0.03;
