import { MOST_AC_VOLTS, MOST_DC_VOLTS, type OtherChance, type OtherDevice, type Standing } from "@/lib/diagnosis";
import { DEFERRAL } from "./advice";
import { checkName, readingWords, type Labels } from "./check-name";

/** For lists and bars, after "Not one of the three:". */
export const OTHER_SHORT: Readonly<Record<OtherDevice, string>> = {
  "current-loop": "two-wire current loop", "switch-pnp": "switch with PNP output", "switch-npn": "switch with NPN output",
  "edge-protocol": "digital signal of edges", "can-pair": "CAN bus", mains: "alternating voltage",
};

/** As the second half of "it reads like ...". */
const LIKE: Readonly<Record<OtherDevice, string>> = {
  "current-loop": "a two-wire current loop of 4 to 20 mA", "switch-pnp": "a switching output of the PNP kind", "switch-npn": "a switching output of the NPN kind",
  "edge-protocol": "a digital protocol on the signal's wire", "can-pair": "the two lines of a CAN bus", mains: "alternating voltage, of the mains or a transformer",
};

/** Sources: NAMUR NE43 and SAE J2716 for the figures, ISO 11898-2 for the bus; what to do is common practice of the trade. */
const NEXT: Readonly<Record<OtherDevice, readonly string[]>> = {
  "current-loop": [
    "Measure the current: power off, part the minus wire, put the meter's mA input in between, power on. Sound is 3.8 to 20.5 mA; 3.6 mA and less, or 21 mA and more, reports a fault.",
    "Better still, use a loop calibrator, which can also stand in for the device.",
    "Ask whoever looks after the plant's instruments for the range of the loop.",
  ],
  "switch-pnp": ["Find the place where it changes over, and watch the volts there: near the supply when on, near 0 V when off.", "Ask for the maker's data: what it senses, at which distance, and which load the output may carry.", "A switch with a lamp shows its state without any meter."],
  "switch-npn": ["Find the place where it changes over, and watch the volts there: under 2 V when on, at the controller's pull-up when off.", "Ask for the maker's data: what it senses, at which distance, and which load the output may carry.", "A switch with a lamp shows its state without any meter."],
  "edge-protocol": ["A hand meter cannot read it: its duty hardly follows the actuator. Use an oscilloscope, or the maker's tester for this protocol.", "Ask the maker of the machine which signal its controller expects on this wire.", "Supply, ground and wires can be proved all the same, with a check by an entry."],
  "can-pair": ["Power off, everything connected: ohms between the two lines reads about 60 \u03a9 on a whole bus, 120 \u03a9 with one end missing.", "What is said on the bus only shows on an oscilloscope or a bus tester; ask whoever has the machine's service tool.", "Do not load or short the lines: every device on the bus would lose it."],
  mains: ["Stop. Take the test terminals out only after a licensed person has made the circuit dead.", "Ask a licensed electrician; this tool and its steps are not made for it."],
};

const OVER: readonly string[] = ["Stop. Do not touch the terminals or the leads' tips, and take no more readings.", "Have a licensed person make the circuit dead, lock it out and prove it dead.", "Keep others away until that is done."];

/** Why a check ends without a finding: what the readings speak for instead, and what to do about it. */
export interface Refusal {
  /** The device, or null where a reading above the limits ended the check. */
  readonly device: OtherDevice | null;
  readonly next: readonly string[];
}

/** From this chance on, all of them together, the three kinds are no longer what the verdict speaks of. */
const REFUSED = 0.5;
/** From this chance on it is said without "most likely". */
const SURE = 0.95;

const together = (others: readonly OtherChance[]) => others.reduce((sum, { p }) => sum + p, 0);

/** The refusal that a standing asks for, or null while the three kinds are what the readings speak of. */
export function refusalOf({ others, overLimit }: Pick<Standing, "others" | "overLimit">): Refusal | null {
  if (overLimit) return { device: null, next: [...OVER, DEFERRAL] };
  const [best] = others;
  return best && together(others) > REFUSED ? { device: best.device, next: [...NEXT[best.device], DEFERRAL] } : null;
}

/** Whether somebody may be hurt: then the check does not only end, it stops. */
export const isDangerous = ({ device }: Refusal): boolean => device === null || device === "mains";

/** The refusal as the verdict's sentence. */
export function refusalSentence({ others, overLimit }: Pick<Standing, "others" | "overLimit">, labels: Labels): string {
  if (overLimit) return `Stop: "${checkName(overLimit.check, labels)}" reads ${readingWords(overLimit.check, overLimit.value)}. Above ${MOST_AC_VOLTS} V a.c. or ${MOST_DC_VOLTS} V d.c. this tool ends.`;
  const best = others[0]!;
  return best.p >= SURE ? `Not one of the three kinds: it reads like ${LIKE[best.device]}.` : `Most likely not one of the three kinds: it reads most like ${LIKE[best.device]}.`;
}

/** In a few words, for lists. */
export function shortRefusal({ device }: Refusal): string {
  return device === null ? "Stop: above the limits of this tool." : `Not one of the three: ${OTHER_SHORT[device]}.`;
}
