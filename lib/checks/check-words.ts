import { parseCheck, type CheckSpec, type MachineState, type Terminal } from "@/lib/diagnosis";

/** Cavity labels of the device, in the order of its pins 1 to 3. */
export type Labels = readonly [string, string, string];

/** Where one meter lead goes, in words; "gnd" is battery negative. */
function terminal(end: Terminal, place: string, labels: Labels): string {
  if (end === "gnd") return "battery negative";
  if (end === "battery") return "battery positive";
  return `${place} ${labels[end - 1]}`;
}

export interface LeadWords { readonly red: string; readonly black: string }

const PLACE: Record<CheckSpec["place"], string> = {
  device: "device pin", harness: "harness cavity", wire: "harness cavity", loose: "harness cavity",
  mated: "back of cavity", contact: "harness contact", battery: "", colour: "", controller: "",
};

/** Whether a check needs a meter with two leads: a grip test does not, nor what is only looked at. */
export const usesLeads = (spec: CheckSpec): boolean => spec.meter !== "grip" && spec.meter !== "look";

/** Where the red and the black lead go, e.g. "device pin 1" and "device pin 2"; null where no lead is used. */
export function leadWords(spec: CheckSpec, labels: Labels): LeadWords | null {
  if (!usesLeads(spec)) return null;
  const place = PLACE[spec.place];
  if (spec.place === "wire") return { red: terminal(spec.red, "controller-side cavity for", labels), black: terminal(spec.black, place, labels) };
  return { red: terminal(spec.red, place, labels), black: terminal(spec.black, place, labels) };
}

const MEASURED: Record<CheckSpec["meter"], string> = {
  ohms: "Resistance", "dc-volts": "Voltage", "ac-volts": "AC voltage", hertz: "Frequency", duty: "Duty", watch: "Sweep", grip: "Grip", look: "Seen",
};

/** What is measured, e.g. "Resistance", "Duty". */
export function measuredWords(spec: CheckSpec): string {
  return MEASURED[spec.meter];
}

const POSITION = { rest: "actuator at rest", half: "actuator half way", full: "actuator at full travel" } as const;

/** Actuator position in words, or null when it does not matter. */
export function positionWords(spec: CheckSpec): string | null {
  if (spec.meter === "watch") return "actuator moved slowly from rest to full";
  if (spec.position === null) return null;
  return POSITION[spec.position];
}

function between(spec: CheckSpec, labels: Labels): string {
  const pin = (end: Terminal): string => (end === "gnd" ? "battery negative" : end === "battery" ? "battery positive" : labels[end - 1] ?? "");
  switch (spec.place) {
    case "battery": return "battery";
    case "colour": return `colour of the wire at ${pin(spec.red)}`;
    case "controller": return "fault message on the controller's display";
    case "contact": return `harness contact ${pin(spec.red)}`;
    case "wire": return `wire ${pin(spec.red)}, end to end`;
    case "device": return `device pin ${pin(spec.red)} to pin ${pin(spec.black)}`;
    case "loose": return spec.black === "gnd" ? `wire ${pin(spec.red)} to battery negative, both ends parted` : `wire ${pin(spec.red)} to wire ${pin(spec.black)}, both ends parted`;
    case "harness": return spec.black === "gnd" ? `harness cavity ${pin(spec.red)} to battery negative` : `harness cavity ${pin(spec.red)} to cavity ${pin(spec.black)}`;
    case "mated": return `cavity ${pin(spec.red)}, back-probed, connector mated`;
  }
}

/** A check in one line, e.g. "Resistance, device pin 1 to pin 2, actuator at rest". */
export function checkTitle(spec: CheckSpec, labels: Labels): string {
  return [MEASURED[spec.meter], between(spec, labels), positionWords(spec)].filter((part) => part !== null).join(", ");
}

/** The same from a check's code; a code that the vocabulary does not know is given back as it is. */
export function checkWords(code: string, labels: Labels): string {
  const spec = parseCheck(code);
  return spec ? checkTitle(spec, labels) : code;
}

/** The check without its measure and position, with a capital: "Device pin 1 to pin 2". */
export function checkPlace(spec: CheckSpec, labels: Labels): string {
  const words = between(spec, labels);
  return words.charAt(0).toUpperCase() + words.slice(1);
}

/** The meter's dial: function, and the range to choose when it does not range by itself. */
export function meterWords(spec: CheckSpec): { readonly dial: string; readonly range: string } {
  switch (spec.meter) {
    case "ohms": return { dial: "Ω", range: "auto or highest" };
    case "dc-volts": return { dial: "V DC", range: "auto or highest" };
    case "ac-volts": return { dial: "V AC", range: "auto" };
    case "look": return { dial: "No meter", range: "" };
    case "hertz": return { dial: "Hz", range: "auto" };
    case "duty": return { dial: "% duty", range: "auto" };
    case "watch": return { dial: "V DC", range: "auto; watch it move" };
    case "grip": return { dial: "No meter", range: "a matching test terminal" };
  }
}

/** State of the machine in short words, known parts only: ["power off", "device connector parted"]. */
export function stateWords(state: MachineState): readonly string[] {
  const words: string[] = [];
  if (state.powerOn !== null) words.push(state.powerOn ? "power on" : "power off");
  if (state.deviceParted !== null) words.push(state.deviceParted ? "device connector parted" : "device connector mated");
  if (state.controllerParted !== null) words.push(state.controllerParted ? "controller connector parted" : "controller connector mated");
  return words;
}
