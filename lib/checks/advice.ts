import type { Fault, FaultCode, Kind } from "@/lib/diagnosis";
import type { Labels } from "./check-name";
import { placeWords } from "./finding-words";

/**
 * What to do about a finding and how to prove the repair. {at} is the cavity or the two cavities of the finding.
 * Source of every line: common practice of the trade (repair at the joint, prove with the reading that found it,
 * then under load and in movement); the limits come from the check itself.
 */
interface AdviceLines { readonly next: readonly string[]; readonly prove: readonly string[] }

export const DEFERRAL = "Follow the site's rules, the maker's instructions and local law; a licensed person decides.";

const POWER_OFF = "Switch the power off, lock it out where the site asks for it, and make sure that nothing can move.";
const MOVE_BOTH_ENDS = "Mate the connector, move the device from rest to full travel and watch the signal: it moves smoothly and stays inside its healthy span.";
const WIGGLE = "Wiggle the harness and the connector while somebody watches the reading: it must not jump.";
const CLEAR_CODE = "Clear the controller's fault and run the function once: the fault stays away.";

export const ADVICE: Readonly<Record<FaultCode, AdviceLines>> = {
  none: {
    next: [
      "Leave the device and its wiring alone: nothing in these readings asks for a part.",
      "If the controller still reports a fault, look for one that comes and goes: repeat the check while the harness is moved, warm and wet.",
      "Read which circuit the controller names; another device may share its supply or ground.",
    ],
    prove: [MOVE_BOTH_ENDS, CLEAR_CODE],
  },
  "wire-open": {
    next: [
      POWER_OFF,
      "Follow the wire of cavity {at} from the device's connector to the controller. Look first where it bends, rubs, passes a bulkhead or was joined before.",
      "Halve the wire: read ohms from each end to a joint in between, and go on in the half that is open.",
      "Join it with the method that the maker allows and seal the joint, or lay a new wire of the same gauge and tape the old one off at both ends.",
    ],
    prove: ["Both ends parted: ohms of wire {at} end to end reads well below 1 Ω.", WIGGLE, CLEAR_CODE],
  },
  "wire-resistive": {
    next: [
      POWER_OFF,
      "Follow the wire of cavity {at} and look for green copper, a swollen sleeve, a hard spot or an old joint, first at its terminals.",
      "Cut back to bright copper and renew the terminal or the joint; do not clean and hope.",
    ],
    prove: ["Both ends parted: ohms of wire {at} end to end reads well below 1 Ω.", "Mated and powered: the voltage lost along the wire is below what your meter can show.", WIGGLE],
  },
  "short-to-ground": {
    next: [
      POWER_OFF,
      "Part the harness at each connector on the way until the ohms from wire {at} to battery negative goes to OL: the short lies in the last part taken off.",
      "Look where the harness is clamped, pinched or wet. Renew the wire or its sleeve and fix it clear of the edge.",
      "Find out why the protection did not open before you put the power back on.",
    ],
    prove: ["Both ends parted: ohms from wire {at} to battery negative reads OL.", CLEAR_CODE],
  },
  "short-to-battery": {
    next: [
      "Keep the power off. Wire {at} carries battery voltage, and the controller's input may have been harmed by it.",
      "Part the harness at each connector on the way until the volts on wire {at} goes away: the short lies in the last part taken off.",
      "Look for a wire that feeds from the battery in the same sleeve, and for water in the connectors.",
      "Ask for the controller to be checked by its maker's method before it is trusted again.",
    ],
    prove: ["Connector parted, power on: the volts on cavity {at} is what the entry or the other healthy machine shows.", CLEAR_CODE],
  },
  "wires-shorted": {
    next: [
      POWER_OFF,
      "Look where the wires of cavities {at} lie side by side: a clamp, a rubbed sleeve, a crushed connector, water in the housing.",
      "Part the harness piece by piece until the ohms between them goes to OL, and renew that piece.",
    ],
    prove: ["Both ends parted: ohms between the wires of cavities {at} reads OL.", WIGGLE, CLEAR_CODE],
  },
  "connector-damp": {
    next: [
      POWER_OFF,
      "Part the connector and look into both halves at cavities {at}: water, green or white salts, a seal that is torn, swollen or missing, an empty cavity without its plug.",
      "Dry both halves with clean dry air, clean them with the cleaner that the maker allows, and let it dry away before anything is powered.",
      "Renew the seals, and every terminal that has gone green. Find out where the water came in, or it will come back.",
    ],
    prove: ["Both ends parted: ohms between the wires of cavities {at} reads OL.", "Mated again and wetted as it is in service, or a day later: the same reading still holds.", CLEAR_CODE],
  },
  "wires-swapped": {
    next: [
      POWER_OFF,
      "Read the wires of cavities {at} end to end, and mark each at both ends before anything is taken out.",
      "Exchange them at the end that was last repaired, with the maker's tool for that terminal.",
      "Ask what the wrong voltage has done to the device, and check it afterwards as if it were unknown.",
    ],
    prove: ["Both ends parted: each wire of cavities {at} reads below 1 Ω to its own cavity, and OL to the other.", MOVE_BOTH_ENDS],
  },
  "contact-open": {
    next: [
      POWER_OFF,
      "Look into contact {at} on both halves: spread, pushed back, bent, green, or its lock not home.",
      "Try a matching test terminal for grip. Renew a contact that does not grip; do not squeeze it.",
      "See that the connector latches and that its seal lets it close the whole way.",
    ],
    prove: ["A matching test terminal grips in contact {at}.", "Mated and powered: back-probe cavity {at} while the connector is pushed and pulled; the volts must not change.", CLEAR_CODE],
  },
  "supply-missing": {
    next: [
      "Look for other devices on the same supply: a short in any of them can pull it down. Part them one by one and read again.",
      "Check the controller's own supply, ground and fuse by the maker's instructions.",
      "Only when those are good is the controller's supply output in question. Never bridge it to battery.",
    ],
    prove: ["Connector parted, power on: the supply cavity reads what the entry says, and holds with the device mated.", CLEAR_CODE],
  },
  "pull-missing": {
    next: [
      "Compare with the same input of a healthy controller: volts at the signal cavity, connector parted, power on.",
      "Ask whether this controller needs its input set up for this kind of device; a wrong setting looks the same.",
      "Have the controller checked by its maker's method; do not add a resistor of your own on the machine.",
    ],
    prove: ["Connector parted, power on: the signal cavity rests at the voltage that the entry or a healthy machine shows.", MOVE_BOTH_ENDS],
  },
  "wiper-open": {
    next: ["Renew the device: an open wiper cannot be mended on the machine.", "Keep the old one with its tag until the new one is proved."],
    prove: ["New device, connector parted: ohms from the signal pin to each end changes from rest to full, and the two agree with the total.", MOVE_BOTH_ENDS],
  },
  "track-open": {
    next: ["Renew the device: a broken track cannot be mended.", "Before the new one goes on, read that the supply is not above what the device is made for."],
    prove: ["New device, connector parted: ohms from supply pin to ground pin reads the total resistance and does not depend on the position.", MOVE_BOTH_ENDS],
  },
  "track-worn": {
    next: ["Renew the device; the worn place lies where the machine works most.", "Look why it wore: play in the linkage, a shaft that shakes, water in the housing."],
    prove: ["Move slowly from rest to full travel and watch the volts: it moves smoothly, without jumps.", CLEAR_CODE],
  },
  "output-dead": {
    next: [
      "See once more that supply and ground reach the device with the connector mated; without them every output is dead.",
      "Renew the device.",
    ],
    prove: ["New device, mated and powered: the signal is there at rest and changes at full travel.", CLEAR_CODE],
  },
  "output-stuck-high": {
    next: ["See that the actuator, the magnet or the linkage really moves the device.", "Renew the device."],
    prove: [MOVE_BOTH_ENDS, CLEAR_CODE],
  },
  "output-stuck-low": {
    next: ["See that the actuator, the magnet or the linkage really moves the device.", "Renew the device."],
    prove: [MOVE_BOTH_ENDS, CLEAR_CODE],
  },
};

const NEEDS_DEFERRAL: ReadonlySet<FaultCode> = new Set<FaultCode>(["short-to-ground", "short-to-battery", "supply-missing", "pull-missing", "wires-swapped"]);

/** Steps for one finding at its place; lines that name a cavity belong to findings that have one. */
export function adviceFor(fault: Fault, labels: Labels): { next: string[]; prove: string[] } {
  const lines = ADVICE[fault.code];
  const place = placeWords(fault.pins ?? [], labels, null);
  const fill = (line: string) => line.replaceAll("{at}", place);
  return { next: [...lines.next.map(fill), ...(NEEDS_DEFERRAL.has(fault.code) ? [DEFERRAL] : [])], prove: lines.prove.map(fill) };
}

/** Cautions that go with any work after a check, and those of the kind of device. */
export function cautionsFor(kind: Kind | null): string[] {
  const common = [
    "Before ohms: power off, connector parted, capacitors given time. Never put ohms on a live circuit.",
    "Before power on with leads in place: nobody near what can move, loads lowered or blocked, stored hydraulic pressure relieved.",
    "Never pierce insulation. Never bridge a controller's supply to battery.",
    DEFERRAL,
  ];
  return kind === "potentiometer" ? common : ["Ohms through electronics depends on the meter and on the way round of the leads; it proves little about a powered device.", ...common];
}
