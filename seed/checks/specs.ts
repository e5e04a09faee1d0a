import type { FaultCode, PinNumber } from "@/lib/diagnosis";

/** One demo check: who stood at which machine, before which device, and what was the matter with it. */
export interface DemoCheck {
  /** Number in the order made; ids and readings follow from it. */
  readonly number: number;
  readonly person: "tilda" | "joram" | "edda" | "tomas" | "wim";
  /** Fleet number; null for a device on the bench. */
  readonly machine: string | null;
  /** Part of the slug of the catalogue entry that the device truly is. */
  readonly device: string;
  /** Did the technician know which entry it is? Otherwise the engine must find out. */
  readonly known: boolean;
  readonly fault: { readonly code: FaultCode; readonly pins?: readonly PinNumber[] };
  /** UTC. */
  readonly at: string;
  readonly recheckOf?: number;
  /** Stopped after so many readings, although more would have told more. */
  readonly stoppedAfter?: number;
  /** One number was keyed in with its point one place too far right: the readings contradict each other. */
  readonly slipped?: true;
  readonly running?: true;
  readonly note?: string;
}

const none = { code: "none" } as const;

export const DEMO_CHECKS: readonly DemoCheck[] = [
  { number: 1, person: "tilda", machine: "D-01", device: "bucket-ladder-angle-sensor-45", known: true, fault: { code: "wire-open", pins: [2] }, at: "2026-09-21T08:12:00Z", note: "Ladder angle jumps to full on the display." },
  { number: 2, person: "tilda", machine: "D-01", device: "bucket-ladder-angle-sensor-45", known: true, fault: none, at: "2026-09-21T13:40:00Z", recheckOf: 1 },
  { number: 3, person: "joram", machine: "L-31", device: "ground-paddle-position-sensor-600", known: true, fault: { code: "wire-resistive", pins: [3] }, at: "2026-09-24T09:05:00Z", note: "Paddle reads low after rain." },
  { number: 4, person: "joram", machine: "L-31", device: "ground-paddle-position-sensor-600", known: true, fault: none, at: "2026-09-25T07:30:00Z", recheckOf: 3 },
  { number: 5, person: "edda", machine: "T-05", device: "rear-hitch-position-sensor-bhw", known: false, fault: none, at: "2026-09-28T10:20:00Z", note: "No label left on the housing." },
  { number: 6, person: "tilda", machine: "W-11", device: "weed-cutter-boom-height-sensor-ew", known: true, fault: { code: "track-worn" }, at: "2026-09-30T06:55:00Z" },
  { number: 7, person: "joram", machine: "D-02", device: "excavator-boom-angle", known: false, fault: { code: "contact-open", pins: [3] }, at: "2026-10-02T12:10:00Z" },
  { number: 8, person: "wim", machine: "L-32", device: "lock-chamber-level-probe-5-m", known: true, fault: none, at: "2026-10-05T08:00:00Z" },
  { number: 9, person: "tilda", machine: "L-40", device: "swing-bridge-angle", known: true, fault: { code: "output-stuck-high" }, at: "2026-10-07T09:45:00Z", note: "Bridge stops short of the latch." },
  { number: 10, person: "joram", machine: "T-07", device: "hitch-draught-pin-60", known: true, fault: { code: "supply-missing" }, at: "2026-10-09T14:15:00Z" },
  { number: 11, person: "edda", machine: "H-02", device: "winch-line-pull-pin", known: false, fault: none, at: "2026-10-12T11:00:00Z" },
  { number: 12, person: "tilda", machine: "B-09", device: "throttle-lever-winch-tug", known: false, fault: { code: "pull-missing" }, at: "2026-10-14T07:25:00Z" },
  { number: 13, person: "joram", machine: "W-12", device: "rudder-angle-sensor-35", known: true, fault: { code: "short-to-ground", pins: [3] }, at: "2026-10-16T13:05:00Z" },
  { number: 14, person: "wim", machine: "W-14", device: "loading-conveyor-height", known: true, fault: { code: "wiper-open" }, at: "2026-10-19T08:35:00Z" },
  { number: 15, person: "edda", machine: "T-05", device: "bank-mower-tilt-sensor-250", known: true, fault: { code: "wires-swapped", pins: [2, 3] }, at: "2026-10-21T10:10:00Z", note: "Head was rewired last week." },
  { number: 16, person: "tilda", machine: "D-01", device: "throttle-lever-dredger-pump", known: true, fault: { code: "output-dead" }, at: "2026-10-23T06:50:00Z" },
  { number: 17, person: "tomas", machine: "L-31", device: "gate-paddle-position", known: false, fault: none, at: "2026-10-27T09:20:00Z", note: "Shown to the new starters." },
  { number: 18, person: "tilda", machine: "W-14", device: "chain-tension-sensor", known: true, fault: { code: "wire-open", pins: [3] }, at: "2026-10-29T12:45:00Z" },
  { number: 19, person: "edda", machine: "B-09", device: "rope-tension-sensor-20", known: false, fault: { code: "short-to-battery", pins: [2] }, at: "2026-11-03T08:30:00Z" },
  { number: 20, person: "wim", machine: "D-02", device: "slew-angle-sensor-excavator", known: true, fault: none, at: "2026-11-06T07:15:00Z" },
  { number: 21, person: "tomas", machine: "L-32", device: "gate-paddle-position", known: true, fault: { code: "wires-shorted", pins: [2, 3] }, at: "2026-11-10T13:30:00Z" },
  { number: 22, person: "joram", machine: "W-11", device: "throttle-lever-weed-cutting", known: true, fault: { code: "wire-open", pins: [1] }, at: "2026-11-13T15:10:00Z", stoppedAfter: 1, note: "Called away to the lock." },
  { number: 23, person: "tilda", machine: "T-05", device: "accelerator-pedal", known: true, fault: none, at: "2026-11-18T09:00:00Z", slipped: true },
  { number: 24, person: "wim", machine: null, device: "brake-air-pressure-sensor", known: false, fault: none, at: "2026-11-20T10:40:00Z", note: "Found in the stores without a label." },
  { number: 25, person: "tilda", machine: "W-12", device: "auxiliary-lever-cutter", known: false, fault: none, at: "2026-11-27T08:05:00Z", stoppedAfter: 4, running: true },
  { number: 26, person: "wim", machine: "D-01", device: "ladder-winch-rope-length", known: true, fault: { code: "wire-open", pins: [3] }, at: "2026-11-30T09:50:00Z", stoppedAfter: 2, running: true },
];
