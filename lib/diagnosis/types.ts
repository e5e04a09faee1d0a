/**
 * The engine's vocabulary. Pins are numbered 1..3 in the order of `Setup.pins`; the labels themselves
 * (cavity "A", "2", "B1") never enter the reasoning. Values are SI: ohms, volts, hertz, duty 0..1.
 */

export const KINDS = ["potentiometer", "pwm", "voltage"] as const;
export type Kind = (typeof KINDS)[number];

/** Things found at a connector that are none of the three kinds; they are recognised, not diagnosed. */
export const OTHER_DEVICES = ["current-loop", "switch-pnp", "switch-npn", "edge-protocol", "can-pair", "mains"] as const;
export type OtherDevice = (typeof OTHER_DEVICES)[number];

export const ROLES = ["supply", "ground", "signal"] as const;
export type Role = (typeof ROLES)[number];

export type PinNumber = 1 | 2 | 3;
export type PinAssignment = Readonly<Record<Role, PinNumber>>;

export const FAULT_CODES = [
  "none", "wire-open", "wire-resistive", "short-to-ground", "short-to-battery", "wires-shorted", "wires-swapped", "connector-damp",
  "contact-open", "supply-missing", "pull-missing", "wiper-open", "track-open", "track-worn",
  "output-dead", "output-stuck-high", "output-stuck-low",
] as const;
export type FaultCode = (typeof FAULT_CODES)[number];

/** A finding: what is wrong and, where it has a place, at which pins (ascending). */
export interface Fault { readonly code: FaultCode; readonly pins?: readonly PinNumber[] }

/** "OL": over range or open. "none": the meter shows no frequency or duty. */
export type SymbolValue = "OL" | "none" | "smooth" | "jumps" | "still" | "grips" | "loose" | WireColour | FaultMessage;
/** Letters of IEC 60757 for the colours that wires of devices carry. */
export const WIRE_COLOURS = ["BK", "BN", "RD", "OG", "YE", "GN", "BU", "VT", "GY", "WH", "PK", "TQ", "GNYE"] as const;
export type WireColour = (typeof WIRE_COLOURS)[number];
/** A controller's own fault message: failure mode indicator of SAE J1939-73, 0 to 31. */
export type FaultMessage = `FMI ${number}`;
export type ReadingValue = number | SymbolValue;
export type Reading = readonly [check: string, value: ReadingValue];

/** What a catalogue entry says of the healthy device. */
export interface Expect {
  readonly kind: Kind;
  readonly pins: PinAssignment;
  /** Volts, or "battery" when the device runs from battery voltage. */
  readonly supplyVolts: number | "battery";
  readonly totalOhms?: number;
  readonly tolerancePercent?: number;
  /** Share of the supply at the wiper, 0..1, with the actuator at rest and at full travel. */
  readonly signalRatio?: { readonly rest: number; readonly full: number };
  readonly wiperSeriesOhms?: number;
  /** Resistors in series with the ends of the track, together, ohms; `totalOhms` is then the track without them. */
  readonly endOhms?: number;
  readonly output?: "open-collector" | "push-pull";
  readonly frequencyHz?: number;
  /** High share of the period, 0..1. */
  readonly duty?: { readonly rest: number; readonly full: number };
  readonly signalVolts?: { readonly rest: number; readonly full: number };
}

/** The workshop's own confirmed checks, counted: whole numbers from 0. */
export interface Experience {
  readonly kinds: Readonly<Partial<Record<Kind, number>>>;
  readonly findings: Readonly<Partial<Record<FaultCode, number>>>;
}

export interface Setup {
  readonly pins: readonly [string, string, string];
  readonly expect?: Expect;
  /** The meter in hand; the bench meter of `meter.ts` when absent. */
  readonly meter?: MeterSpec;
  /** Shifts the chances before the first reading; the published ones alone when absent. */
  readonly experience?: Experience;
  /** Proposes optional readings as well: half way, and AC volts. */
  readonly proposeOptional?: boolean;
  /** Checks the technician cannot do here; never proposed. */
  readonly excluded?: readonly string[];
  /** State of the machine now, where it is known; else it follows from the readings taken. */
  readonly state?: { readonly deviceParted: boolean; readonly controllerParted: boolean; readonly powerOn: boolean };
}

/** Limit of error = percent of reading + a fixed part, as JCGM 100 4.3.7 takes a maker's limits. */
export interface LimitSpec { readonly percent: number; readonly fixed: number }

export interface MeterSpec {
  /** Full count of the display, e.g. 6000. */
  readonly counts: number;
  /** Percent of reading plus counts. */
  readonly ohms: { readonly percent: number; readonly counts: number; readonly leadOhms: number; readonly maxOhms: number };
  readonly volts: { readonly percent: number; readonly fixedVolts: number; readonly inputOhms: number };
  readonly hertz: { readonly percent: number };
  readonly duty: { readonly percent: number; readonly fixed: number };
  /** Smallest swing at which frequency and duty are shown, volts. */
  readonly triggerVolts: number;
}

export type Terminal = PinNumber | "gnd" | "battery";
export type Position = "rest" | "half" | "full";
export type MeterFunction = "ohms" | "dc-volts" | "ac-volts" | "hertz" | "duty" | "watch" | "grip" | "look";

/** State of the machine a check needs; null where it does not matter. */
export interface MachineState {
  readonly deviceParted: boolean | null;
  readonly controllerParted: boolean | null;
  readonly powerOn: boolean | null;
}

/** A check of the vocabulary, taken apart. */
export interface CheckSpec {
  readonly code: string;
  /** What the leads touch: the device's own pins, the harness's cavities, wire ends, mated and back-probed, one contact, the battery; or what is looked at: a wire's colour, the controller's display. */
  readonly place: "device" | "harness" | "wire" | "loose" | "mated" | "contact" | "battery" | "colour" | "controller";
  readonly meter: MeterFunction;
  readonly unit: "ohm" | "volt" | "hertz" | "ratio" | "word";
  readonly red: Terminal;
  readonly black: Terminal;
  readonly position: Position | null;
  readonly state: MachineState;
  /** Never proposed unless the setup asks for it; may be entered out of turn at any time. */
  readonly optional: boolean;
  /** Words that may be answered beside, or instead of, a number. */
  readonly words: readonly SymbolValue[];
}

/** kind x pins x finding: one thing that may be true of the machine. */
export interface Hypothesis {
  /** Stable text id, e.g. "pwm/2-3-1/wire-open:2"; the numbers are supply-ground-signal. */
  readonly id: string;
  readonly kind: Kind;
  readonly pins: PinAssignment;
  readonly fault: Fault;
}

export interface KindChance { readonly kind: Kind; readonly p: number }
export interface OtherChance { readonly device: OtherDevice; readonly p: number }
export interface PinsChance extends PinAssignment { readonly p: number }
export interface FaultChance extends Fault { readonly p: number }
export interface HypothesisChance { readonly hypothesis: Hypothesis; readonly p: number }

export interface NextCheck {
  readonly check: string;
  /** Plain sentence: why this reading now. */
  readonly why: string;
  /** Expected gain, bits, and effort in the vocabulary's units (a reading counts 1). */
  readonly gainBits: number;
  readonly effort: number;
}

export interface Standing {
  /** With `others` they sum to 1. */
  readonly kinds: readonly KindChance[];
  /** Devices that are not one of the three kinds, likeliest first. Pins, findings and hypotheses hold on the condition that it is none of these. */
  readonly others: readonly OtherChance[];
  /** A reading above 30 V a.c. or 60 V d.c.: the check ends there. */
  readonly overLimit: { readonly check: string; readonly value: number } | null;
  readonly pins: readonly PinsChance[];
  readonly faults: readonly FaultChance[];
  readonly hypotheses: readonly HypothesisChance[];
  /** Smallest set of findings holding 95 %; more than one means "cannot be told apart so far". */
  readonly openFindings: readonly FaultChance[];
  readonly done: boolean;
  /** True when done and no check of the vocabulary would separate the open findings further. */
  readonly inseparable: boolean;
  readonly next: readonly NextCheck[];
}

export type Assessment =
  | ({ readonly state: "ranked" | "needs-reading" } & Standing)
  | ({ readonly state: "contradictory"; readonly suspects: readonly { readonly check: string; readonly why: string }[] } & Standing)
  | { readonly state: "invalid-input"; readonly code: string; readonly message: string; readonly where: string };

export * from "./explained-types";
