import type { Expect, Fault, FaultCode, Hypothesis, Kind, PinAssignment, PinNumber, Role } from "../types";
import { controllerClass, physicalValue, rangesFor, tappedRanges, type Family, type Pull, type Ranges, type Tap } from "./parameters";

/** Roles as array places: supply 0, ground 1, signal 2. */
export const SUPPLY = 0, GROUND = 1, SIGNAL = 2;
const ROLE_ORDER: readonly Role[] = ["supply", "ground", "signal"];

/** One way the machine may be built: a hypothesis with everything that the circuit model has to know of it. */
export interface Candidate {
  readonly hypothesis: Hypothesis;
  readonly family: Family;
  readonly pull: Pull;
  readonly code: FaultCode;
  /** Places of the fault as roles (0..2); -1 where it has none. */
  readonly at: number;
  readonly at2: number;
  /** Potentiometer with an open track: which end the break is at. */
  readonly breakEnd: typeof SUPPLY | typeof GROUND;
  /** Pin number of each role. */
  readonly pinOf: readonly [PinNumber, PinNumber, PinNumber];
  readonly suppliedByBattery: boolean;
  /** Potentiometer with a tap that the wiper travels past; null for every other device. */
  readonly tap: Tap | null;
  /** Whether the electronics run: known beforehand, or to be found from the volts across the device. */
  readonly running: Running;
  readonly ranges: Ranges;
  /** Middle of every range in physical units: where an unknown stands that no reading speaks of. */
  readonly middle: Float64Array;
  /** Candidates with the same key are alike as seen on the parted device, or on the parted harness. */
  readonly deviceKey: string;
  readonly harnessKey: string;
  readonly logPrior: number;
}

export const FAMILIES: Readonly<Record<Kind, readonly Family[]>> = { potentiometer: ["potentiometer"], pwm: ["open-collector", "push-pull"], voltage: ["voltage"] };

export const PERMUTATIONS: readonly PinAssignment[] = [[1, 2, 3], [1, 3, 2], [2, 1, 3], [2, 3, 1], [3, 1, 2], [3, 2, 1]]
  .map(([supply, ground, signal]) => ({ supply, ground, signal }) as PinAssignment);

export type Running = "yes" | "no" | "by-volts";

/** Where a fault sits, as roles. */
export interface FaultPlace { readonly code: FaultCode; readonly at: number; readonly at2: number }

/** Two cavities joined by some resistance: a short of their wires, or leakage across a damp connector. */
export const joinsTwo = (code: FaultCode) => code === "wires-shorted" || code === "connector-damp";

const each = (code: FaultCode, roles: readonly number[]): FaultPlace[] => roles.map((at) => ({ code, at, at2: -1 }));
const pairs = (code: FaultCode): FaultPlace[] => [[0, 1], [1, 2], [0, 2]].map(([at, at2]) => ({ code, at: at!, at2: at2! }));
const whole = (...codes: FaultCode[]): FaultPlace[] => codes.map((code) => ({ code, at: -1, at2: -1 }));

/** Findings of wires, connector and controller; a ground cavity shorted to ground is no finding, nothing changes. */
const WIRING: readonly FaultPlace[] = [
  ...whole("none"), ...each("wire-open", [0, 1, 2]), ...each("wire-resistive", [0, 1, 2]), ...each("short-to-ground", [0, 2]),
  ...each("short-to-battery", [0, 1, 2]), ...pairs("wires-shorted"), ...pairs("wires-swapped"), ...each("contact-open", [0, 1, 2]),
  ...whole("supply-missing", "pull-missing"),
];

/** Leakage between two cavities of a damp connector: rare, and seldom told from a pull, so it is looked at apart. */
export const DAMP_PLACES: readonly FaultPlace[] = pairs("connector-damp");

/** Every other finding a family can have. */
export const FAULT_PLACES: Readonly<Record<Family, readonly FaultPlace[]>> = {
  potentiometer: [...WIRING, ...whole("wiper-open", "track-open", "track-worn")],
  "open-collector": [...WIRING, ...whole("output-dead", "output-stuck-high", "output-stuck-low")],
  "push-pull": [...WIRING, ...whole("output-dead", "output-stuck-high", "output-stuck-low")],
  voltage: [...WIRING, ...whole("output-dead", "output-stuck-high", "output-stuck-low")],
};

interface Parts { family: Family; kind: Kind; pins: PinAssignment; place: FaultPlace; pull: Pull; breakEnd: 0 | 1; running: Running; logPrior: number; tap?: Tap; expect?: Expect }

/** Findings that show on the parted device (a worn track only half way), and those that leave the parted harness sound. */
const DEVICE_FAULTS = new Set<FaultCode>(["wiper-open", "track-open", "track-worn"]);
const HARNESS_SOUND = new Set<FaultCode>(["none", "wiper-open", "track-open", "track-worn", "output-dead", "output-stuck-high", "output-stuck-low"]);

/** Builds one candidate; two candidates with the same `hypothesis.id` differ only in what nobody asks about. */
export function makeCandidate(p: Parts): Candidate {
  const pinOf = ROLE_ORDER.map((role) => p.pins[role]) as [PinNumber, PinNumber, PinNumber];
  const fault = faultOf(p.place, pinOf), tap = p.tap ?? null, ranges = tap ? tappedRanges(p.pull, p.place.code, tap) : rangesFor(p.family, p.pull, p.place.code, p.expect);
  const { code, at, at2 } = p.place;
  return {
    hypothesis: { id: hypothesisId(p.kind, pinOf, fault), kind: p.kind, pins: p.pins, fault },
    family: p.family, pull: p.pull, code, at, at2, breakEnd: p.breakEnd, running: p.running, pinOf,
    suppliedByBattery: p.expect?.supplyVolts === "battery", tap,
    ranges, middle: ranges.mean.map((_, i) => physicalValue(ranges, i, 0)), logPrior: p.logPrior,
    deviceKey: `${p.family}${tap ? `-${tap.role}${tap.position}` : ""}|${pinOf}|${DEVICE_FAULTS.has(code) ? code + p.breakEnd : ""}|${p.expect ? JSON.stringify(p.expect) : ""}`,
    harnessKey: `${controllerClass(p)}|${p.pull}|${pinOf}|${HARNESS_SOUND.has(code) ? "" : `${code}${at}${at2}`}|${p.expect ? JSON.stringify(p.expect) : ""}`,
  };
}

function faultOf(place: FaultPlace, pinOf: readonly PinNumber[]): Fault {
  const pins = [place.at, place.at2].filter((r) => r >= 0).map((r) => pinOf[r]!).sort();
  return pins.length === 0 ? { code: place.code } : { code: place.code, pins };
}

/** Stable id of a hypothesis, e.g. "pwm/2-3-1/wire-open:2" (supply-ground-signal). */
export function hypothesisId(kind: Kind, pinOf: readonly PinNumber[], fault: Fault): string {
  return `${kind}/${pinOf.join("-")}/${faultId(fault)}`;
}

/** Stable id of a finding, e.g. "wires-swapped:1,3" or "none". */
export function faultId(fault: Fault): string {
  return fault.pins ? `${fault.code}:${fault.pins.join(",")}` : fault.code;
}
