import type { Family, Pull } from "./circuit/parameters";
import type { Experience, FaultCode, Kind, OtherDevice } from "./types";

/** What is believed of one finding or kind before the first reading, as a share, and where the figure comes from. */
export interface Prior<Code> { readonly code: Code; readonly share: number; readonly source: string }

const PRACTICE = "common practice";
const CONNECTION = "MIL-HDBK-338B after FMD-91: of faulty connections 0.61 open, 0.23 poor, 0.16 short; share of all findings by common practice";
const RESISTOR = "MIL-HDBK-338B after FMD-91: of faulty variable resistors 0.53 open, 0.40 erratic, 0.07 short; share of all findings by common practice";

/**
 * Chances before the first reading. When a technician is sent to a machine, about a third of the devices turn out
 * sound; of the rest most faults are in wires and connectors, fewer in the device, few in the controller.
 * A finding with several places shares its chance among them.
 */
export const FINDING_PRIORS: readonly Prior<FaultCode>[] = [
  { code: "none", share: 0.31, source: PRACTICE },
  { code: "wire-open", share: 0.15, source: CONNECTION },
  { code: "wire-resistive", share: 0.09, source: CONNECTION },
  { code: "short-to-ground", share: 0.075, source: CONNECTION },
  { code: "contact-open", share: 0.07, source: CONNECTION },
  { code: "wires-swapped", share: 0.055, source: PRACTICE },
  { code: "supply-missing", share: 0.05, source: PRACTICE },
  { code: "short-to-battery", share: 0.05, source: CONNECTION },
  { code: "wires-shorted", share: 0.04, source: CONNECTION },
  { code: "connector-damp", share: 0.002, source: PRACTICE },
  { code: "pull-missing", share: 0.025, source: PRACTICE },
  { code: "track-worn", share: 0.055, source: RESISTOR },
  { code: "wiper-open", share: 0.03, source: RESISTOR },
  { code: "track-open", share: 0.02, source: RESISTOR },
  { code: "output-dead", share: 0.03, source: PRACTICE },
  { code: "output-stuck-high", share: 0.03, source: PRACTICE },
  { code: "output-stuck-low", share: 0.03, source: PRACTICE },
];

/** No kind is rare on mobile plant; powered voltage devices are the fewest of the three. */
export const KIND_PRIORS: readonly Prior<Kind>[] = [
  { code: "potentiometer", share: 0.38, source: PRACTICE },
  { code: "pwm", share: 0.4, source: PRACTICE },
  { code: "voltage", share: 0.22, source: PRACTICE },
];

/** Devices that are none of the three kinds; about one in seventy is worth the walk (common practice). */
export const OTHER_PRIORS: readonly Prior<OtherDevice>[] = [
  { code: "current-loop", share: 0.004, source: PRACTICE },
  { code: "switch-pnp", share: 0.003, source: PRACTICE },
  { code: "switch-npn", share: 0.002, source: PRACTICE },
  { code: "edge-protocol", share: 0.002, source: PRACTICE },
  { code: "can-pair", share: 0.002, source: PRACTICE },
  { code: "mains", share: 0.001, source: PRACTICE },
];

/** The published chances count as much as this many checks of the workshop's own (common practice; shown with them). */
export const PRIOR_CHECKS = 100;

/** Dirichlet posterior mean of one list of chances: prior shares worth PRIOR_CHECKS checks, and the workshop's own counts. Shares sum to 1. */
function shifted<Code extends string>(priors: readonly Prior<Code>[], counts: Readonly<Partial<Record<Code, number>>> | undefined): Record<Code, number> {
  const whole = priors.reduce((sum, p) => sum + p.share, 0), own = priors.reduce((sum, p) => sum + (counts?.[p.code] ?? 0), 0);
  return Object.fromEntries(priors.map((p) => [p.code, (PRIOR_CHECKS * p.share / whole + (counts?.[p.code] ?? 0)) / (PRIOR_CHECKS + own)])) as Record<Code, number>;
}

/** Chances of kinds and findings before the first reading, with the workshop's own confirmed checks counted in where there are any. */
export function chancesBefore(experience?: Experience): { kinds: Readonly<Record<Kind, number>>; findings: Readonly<Record<FaultCode, number>> } {
  return { kinds: shifted(KIND_PRIORS, experience?.kinds), findings: shifted(FINDING_PRIORS, experience?.findings) };
}

/** Open-collector outputs are the more common of the two PWM output types (common practice). */
export const FAMILY_SHARE: Readonly<Record<Family, number>> = { potentiometer: 1, "open-collector": 0.65, "push-pull": 0.35, voltage: 1 };

/** How the controller holds the signal input when nothing drives it. An open collector needs a pull-up to work at all. */
export const PULL_SHARE: Readonly<Record<Family, Readonly<Record<Pull, number>>>> = {
  potentiometer: { down: 0.7, up: 0.08, "up-to-supply": 0.22 }, voltage: { down: 0.7, up: 0.08, "up-to-supply": 0.22 },
  "push-pull": { down: 0.9, up: 0.06, "up-to-supply": 0.04 }, "open-collector": { down: 0, up: 0.65, "up-to-supply": 0.35 },
};

/** Share of potentiometers that have supply or ground at a tap of the track, so that the wiper may travel past it (common practice: few). */
export const TAPPED_SHARE = 0.02;

/** Chance that the device fitted is the one a catalogue entry names, pins included. */
export const ENTRY_IS_RIGHT = 0.97;

/** A test terminal tried in a contact: a bad contact feels loose 95 times in 100, a sound one 3 (common practice). */
export const LOOSE_IF_BAD = 0.95;
export const LOOSE_IF_SOUND = 0.03;

/**
 * Chance that a reading is entered wrong, a check: by a power of ten, on another pin, with its sign lost, or otherwise
 * (common practice: about one entry in a hundred).
 */
export const SLIP = { decimal: 0.003, pin: 0.003, sign: 0.001, other: 0.003 } as const;
