import type { Assessment, CheckSpec } from "@/lib/diagnosis";
import type { RunSetup } from "@/lib/checks/run";
import { leadWords, stateWords } from "@/lib/checks/check-words";
import { findingHeading, kindTitle, roleOf } from "@/lib/checks/finding-words";
import { refusalOf } from "@/lib/checks/refusal";
import { transition } from "@/lib/checks/run-transition";
import type { MachineState } from "@/lib/diagnosis";
import type { WiringFacts } from "./wiring-graph";

/** From this chance on a belief is drawn; below it the drawing shows only what was seen. */
const DRAWN = 0.7;

/** What the drawing shows: the machine as it is for this reading, and only beliefs that are likely. */
export function wiringFacts(setup: RunSetup, spec: CheckSpec | null, known: MachineState, assessment: Assessment | null): WiringFacts {
  // Pins and findings are beliefs about the three kinds: of another device none is drawn.
  const standing = assessment && assessment.state !== "invalid-input" && !refusalOf(assessment) ? assessment : null;
  const [kind, pins, fault] = [standing?.kinds[0], standing?.pins[0], standing?.faults[0]];
  const sure = pins && pins.p >= DRAWN ? pins : null;
  return {
    spec, labels: setup.cavityLabels, colours: setup.wireColours ?? null,
    state: spec ? transition(known, spec.state)?.end ?? known : known,
    roles: sure ? [roleOf(sure, 1), roleOf(sure, 2), roleOf(sure, 3)] : [null, null, null],
    finding: fault && fault.code !== "none" && fault.p >= DRAWN ? fault : null,
    deviceName: kind && kind.p >= DRAWN ? `Device: ${kindTitle(kind.kind)}` : "Device",
  };
}

/** The drawing in words. */
export function wiringWords(facts: WiringFacts): string {
  const { spec, labels, colours, roles, finding, state } = facts;
  const wires = labels.map((label, i) => [`wire ${label}`, colours?.[i] ?? null, roles[i] ?? null].filter((part) => part !== null).join(" ")).join(", ");
  const leads = spec ? leadWords(spec, labels) : null;
  return [
    `Controller, three wires (${wires}), connector, ${facts.deviceName.toLowerCase()}`,
    stateWords(state).join(", "),
    leads ? `red lead on ${leads.red}, black lead on ${leads.black}` : null,
    finding ? `believed: ${findingHeading(finding, labels)}` : null,
  ].filter((part) => part !== null && part !== "").map((part) => `${(part ?? "").charAt(0).toUpperCase()}${(part ?? "").slice(1)}.`).join(" ");
}
