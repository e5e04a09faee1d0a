import type { Expect, FaultCode } from "@/lib/diagnosis";
import type { Candidate } from "@/lib/diagnosis/circuit/candidate";
import type { Family } from "@/lib/diagnosis/circuit/parameters";
import { candidatesTapped } from "@/lib/diagnosis/inference/candidates";
import type { Wanted } from "./wide-machine";

/** A build by its family and finding; the electronics run where they can. `at` is the role of the finding's place (0 supply, 1 ground, 2 signal). */
const build = (family: Family, code: FaultCode = "none", at = -1, also: (c: Candidate) => boolean = () => true) =>
  (c: Candidate) => c.family === family && c.code === code && c.at === at && c.running !== "no" && also(c);
const battery = (volts: number) => Math.max(volts, 12.6);

/** Supplies from logic level to the upper limit of 24 V systems (common practice: 3.3, 5, 12, 24 and up to 32 V while charging). */
const SUPPLIES: readonly Wanted[] = [3.3, 12, 24, 32].flatMap((supply): Wanted[] => [
  { name: `potentiometer on ${supply} V`, is: build("potentiometer"), values: { supply, battery: battery(supply), rest: 0.1, full: 0.85 } },
  { name: `open collector on ${supply} V, pulled up to its supply`, is: build("open-collector", "none", -1, (c) => c.pull === "up-to-supply"), values: { supply, battery: battery(supply), rest: 0.1, full: 0.85 } },
  { name: `push-pull output that drives up to its ${supply} V, inverted`, is: build("push-pull"), values: { supply, battery: battery(supply), high: supply, rest: 0.9, full: 0.1 } },
  { name: `voltage device on ${supply} V, 10 to 90 % of it or of 10 V`, is: build("voltage"), values: { supply, battery: battery(supply), rest: 0.1 * Math.min(supply, 10), full: 0.9 * Math.min(supply, 10) } },
]);

/** Check values, section 15: duty 5 to 95 %, 500 Hz the usual frequency; old drives at 50 Hz, fast ones at some kilohertz (common practice). */
const FREQUENCIES: readonly Wanted[] = [50, 5000].flatMap((frequency) => (["open-collector", "push-pull"] as const).flatMap((family) => [[0.08, 0.92], [0.92, 0.08]].map(([rest, full]): Wanted => (
  { name: `${family} at ${frequency} Hz, duty ${rest} to ${full}`, is: build(family), values: { frequency, rest: rest!, full: full! } }
))));

/** Tracks (check values, section 5: 100 ohm to 100 k; series resistor by common practice), each sound and with a finding. */
const TRACKS: readonly Wanted[] = [470, 47_000].flatMap((track) => [20, 1000].flatMap((wiper): Wanted[] => [
  { name: `${track} ohm, ${wiper} ohm in series with the wiper`, is: build("potentiometer"), values: { track, wiper, rest: 0.15, full: 0.6 } },
  { name: `${track} ohm, ${wiper} ohm in series with the wiper, which is open`, is: build("potentiometer", "wiper-open"), values: { track, wiper, rest: 0.15, full: 0.6 } },
  { name: `${track} ohm, ${wiper} ohm in series, signal's wire open`, is: build("potentiometer", "wire-open", 2), values: { track, wiper, rest: 0.15, full: 0.6 } },
]));

/** 4.7 k with 1 k in series with each end: 6.7 k in all, and the wiper never leaves 0.15 to 0.85 of it (computed). */
const ENDED: Expect = { kind: "potentiometer", pins: { supply: 2, ground: 3, signal: 1 }, supplyVolts: 5, totalOhms: 4700, endOhms: 2000, tolerancePercent: 20, signalRatio: { rest: 0.16, full: 0.84 } };
const ENDS: readonly Wanted[] = [{ values: {}, label: "unknown" }, { expect: ENDED, label: "with an entry" }].map(({ label, expect }): Wanted => (
  { name: `resistors in series with the ends of the track, ${label}`, is: build("potentiometer"), expect, values: { track: 6700, wiper: 60, rest: 0.16, full: 0.84, supply: 5 } }
));

/** Pull-up and pull-down both there (diagnostic pull-up): 100 k to 5 V and 100 k to ground stand at 2.5 V behind 50 k (Thevenin, computed). */
export const DIVIDED = { up: 100_000, down: 100_000, rail: 5 } as const;
const HELD: readonly Wanted[] = (["potentiometer", "voltage", "push-pull"] as const).flatMap((family) => [["none", -1], ["wire-open", 2]].map(([code, at]): Wanted => (
  { name: `${family} on an input with pull-up and pull-down, ${code}`, is: build(family, code as FaultCode, at as number, (c) => c.pull === "up"), values: { rail: 2.5, pull: 50_000, railOff: 200 } }
)));

const past = (role: 0 | 1, position: 0 | 1) => (c: Candidate) => c.tap?.role === role && c.tap.position === position;
/** Ground or supply at a tap of the track: past it the signal does not move, and the track up to there is in series with the wiper. */
export const TAPPED: readonly Wanted[] = ([[1, 0, -0.4, 0.8], [1, 1, 0.75, -0.15], [0, 0, 1.4, 0.2], [0, 1, 0.1, 1.3]] as const).flatMap(([role, position, rest, full]) => (["none", "wire-open"] as const).map((code): Wanted => (
  { name: `tap at the ${role === 0 ? "supply" : "ground"}, wiper at ${rest} and ${full} of the track between supply and ground, ${code}`, among: candidatesTapped({}), is: build("potentiometer", code, code === "none" ? -1 : 2, past(role, position)), values: { track: 4700, wiper: 60, rest, full } }
)));

/** A dead band at an end of travel: the signal stands at its end stop before the actuator does, which rest and full cannot show. */
const DEAD_BAND: readonly Wanted[] = [{ name: "dead band: the wiper rests on its end stop", is: build("potentiometer"), values: { rest: 0.003, full: 0.7 } }];

export const WIDE: readonly Wanted[] = [...SUPPLIES, ...FREQUENCIES, ...TRACKS, ...ENDS, ...HELD, ...TAPPED, ...DEAD_BAND];
