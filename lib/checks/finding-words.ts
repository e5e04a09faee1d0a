import { faultText, type Fault, type FaultCode, type Kind, type PinAssignment, type PinNumber, type Role } from "@/lib/diagnosis";
import type { Labels } from "./check-name";

/** Findings in a few words, for lists, filters and headings. */
export const FINDING_TITLES: Readonly<Record<FaultCode, string>> = {
  none: "Sound",
  "wire-open": "Open wire",
  "wire-resistive": "Corroded joint in a wire",
  "short-to-ground": "Wire shorted to ground",
  "short-to-battery": "Wire shorted to battery",
  "wires-shorted": "Wires shorted together",
  "wires-swapped": "Wires exchanged",
  "connector-damp": "Damp connector",
  "contact-open": "Contact not touching",
  "supply-missing": "No supply from the controller",
  "pull-missing": "Controller's pull resistor missing",
  "wiper-open": "Wiper open",
  "track-open": "Track open",
  "track-worn": "Track worn",
  "output-dead": "Output dead",
  "output-stuck-high": "Output stuck high",
  "output-stuck-low": "Output stuck low",
};

/** As a clause of a sentence; {at} is replaced by the cavities with their roles. */
const CLAUSES: Readonly<Record<FaultCode, { readonly one: string; readonly noPlace: string }>> = {
  none: { one: "the wiring and the device are sound", noPlace: "the wiring and the device are sound" },
  "wire-open": { one: "the wire of cavity {at} is open", noPlace: "a wire is open" },
  "wire-resistive": { one: "the wire of cavity {at} has a corroded joint", noPlace: "a wire has a corroded joint" },
  "short-to-ground": { one: "the wire of cavity {at} is shorted to ground", noPlace: "a wire is shorted to ground" },
  "short-to-battery": { one: "the wire of cavity {at} is shorted to battery", noPlace: "a wire is shorted to battery" },
  "wires-shorted": { one: "the wires of cavities {at} are shorted together", noPlace: "two wires are shorted together" },
  "wires-swapped": { one: "the wires of cavities {at} are exchanged between controller and connector", noPlace: "two wires are exchanged" },
  "connector-damp": { one: "the connector is damp: it leaks between cavities {at}", noPlace: "the connector is damp and leaks between two cavities" },
  "contact-open": { one: "contact {at} of the mated connector does not touch", noPlace: "a contact of the mated connector does not touch" },
  "supply-missing": { one: "the controller feeds no supply to cavity {at}", noPlace: "the controller feeds no supply" },
  "pull-missing": { one: "the controller's signal input at cavity {at} has lost its pull resistor", noPlace: "the controller's signal input has lost its pull resistor" },
  "wiper-open": { one: "the wiper of the device is open at pin {at}", noPlace: "the wiper of the device is open" },
  "track-open": { one: "the track of the device is open at pin {at}", noPlace: "the track of the device is open" },
  "track-worn": { one: "the track of the device is worn", noPlace: "the track of the device is worn" },
  "output-dead": { one: "the device's output is dead", noPlace: "the device's output is dead" },
  "output-stuck-high": { one: "the device's output is stuck high", noPlace: "the device's output is stuck high" },
  "output-stuck-low": { one: "the device's output is stuck low", noPlace: "the device's output is stuck low" },
};

/** With their article, for sentences. */
export const KIND_WORDS: Readonly<Record<Kind, string>> = { potentiometer: "a potentiometer", pwm: "a PWM device", voltage: "an analogue voltage device" };

/** For lists and filters. */
export const KIND_TITLES: Readonly<Record<Kind, string>> = { potentiometer: "Potentiometer", pwm: "PWM", voltage: "Analogue voltage" };

const isCode = (code: string): code is FaultCode => Object.hasOwn(FINDING_TITLES, code);
const isKind = (kind: string): kind is Kind => Object.hasOwn(KIND_TITLES, kind);

/** Title of a stored finding code; the code itself when a later version wrote one unknown here. */
export function findingTitle(code: string): string {
  return isCode(code) ? FINDING_TITLES[code] : code;
}

/** Title of a stored kind; the word itself when unknown here. */
export function kindTitle(kind: string): string {
  return isKind(kind) ? KIND_TITLES[kind] : kind;
}

/** Role of a pin under an assignment. */
export function roleOf(pins: PinAssignment, pin: PinNumber): Role {
  return pins.supply === pin ? "supply" : pins.ground === pin ? "ground" : "signal";
}

/** "B (signal)", or "A (supply) and B (signal)"; without the roles when the pins are not known. */
export function placeWords(places: readonly PinNumber[], labels: Labels, pins: PinAssignment | null): string {
  return places.map((pin) => `${labels[pin - 1]}${pins ? ` (${roleOf(pins, pin)})` : ""}`).join(" and ");
}

/** A finding as a clause, e.g. "the wire of cavity B (signal) is open". Roles are named only where `pins` is given. */
export function findingClause(fault: Fault, labels: Labels, pins: PinAssignment | null): string {
  const clause = CLAUSES[fault.code];
  const places = fault.pins ?? [];
  return places.length === 0 ? clause.noPlace : clause.one.replace("{at}", placeWords(places, labels, pins));
}

/** A finding with its place for headings and lists, in the engine's words, e.g. "Wire to B open". */
export function findingHeading(fault: Fault, labels: Labels): string {
  const words = faultText(fault, labels);
  return words.charAt(0).toUpperCase() + words.slice(1);
}

/** The same after "if": "wire to B open", "all is sound". */
export function ifFinding(fault: Fault, labels: Labels): string {
  return fault.code === "none" ? "all is sound" : faultText(fault, labels);
}
