import { MOST_AC_VOLTS, MOST_DC_VOLTS, type OtherDevice, type Standing } from "@/lib/diagnosis";
import { DEFERRAL } from "./advice";
import { checkName, readingWords, type Labels } from "./check-name";
import { STOP_NOW, type Refusal } from "./refusal";

/** As the second half of "it reads like ...". */
const LIKE: Readonly<Record<OtherDevice, string>> = {
  "current-loop": "a two-wire current loop of 4 to 20 mA", "switch-pnp": "a switching output of the PNP kind", "switch-npn": "a switching output of the NPN kind",
  "edge-protocol": "a digital protocol on the signal's wire", "can-pair": "the two lines of a CAN bus", mains: "alternating voltage, of the mains or a transformer",
};

/** From this chance on it is said without "most likely". */
const SURE = 0.95;

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
  mains: STOP_NOW,
};

/** What to do next, in order; the last line says who decides. */
export const refusalSteps = ({ device }: Refusal): readonly string[] => [...(device === null ? STOP_NOW : NEXT[device]), DEFERRAL];

/** The refusal as the verdict's sentence. */
export function refusalSentence({ others, overLimit }: Pick<Standing, "others" | "overLimit">, labels: Labels): string {
  if (overLimit) return `Stop: "${checkName(overLimit.check, labels)}" reads ${readingWords(overLimit.check, overLimit.value)}. Above ${MOST_AC_VOLTS} V a.c. or ${MOST_DC_VOLTS} V d.c. this tool ends.`;
  const best = others[0]!;
  return best.p >= SURE ? `Not one of the three kinds: it reads like ${LIKE[best.device]}.` : `Most likely not one of the three kinds: it reads most like ${LIKE[best.device]}.`;
}
