import type { CheckSpec, Fault, Terminal } from "./types";

const pinName = (t: Terminal, labels: readonly string[]) => (typeof t === "number" ? labels[t - 1]! : t === "gnd" ? "battery negative" : "battery positive");

/** One plain sentence: what a check is good for. `labels` are the cavity labels of pins 1 to 3. */
export function whyText(spec: CheckSpec, labels: readonly string[]): string {
  const red = pinName(spec.red, labels), black = pinName(spec.black, labels);
  switch (spec.place) {
    case "battery": return "Shows what the machine has to feed its devices with.";
    case "device": return `Shows how the device itself conducts between ${red} and ${black}, apart from all wiring.`;
    case "wire": return `Shows whether the wire to cavity ${red} is whole from end to end.`;
    case "loose": return spec.black === "gnd" ? `Shows whether the wire to cavity ${red} touches ground or another line.` : `Shows whether the wires to ${red} and ${black} touch each other.`;
    case "contact": return `Shows whether contact ${red} still grips its terminal.`;
    case "colour": return `The colour of the wire at ${red} is a weak hint at what the pin is.`;
    case "controller": return "The controller's own fault message is a weak hint: a broken and a shorted wire often give the same.";
    case "harness": return spec.meter === "ohms" ? `Shows what the controller and wire put on cavity ${red} with the power off.` : spec.black === "gnd" ? `Shows what the controller feeds to cavity ${red}.` : `Shows the volts between cavities ${red} and ${black}.`;
    case "mated": return matedText(spec, red);
  }
}

function matedText(spec: CheckSpec, red: string): string {
  switch (spec.meter) {
    case "hertz": return `Shows whether the signal on ${red} pulses: only a pulsed output has a frequency.`;
    case "duty": return `Shows the share of each period that ${red} is high.`;
    case "ac-volts": return `Shows how much the signal on ${red} swings about its mean.`;
    case "watch": return `Shows whether ${red} follows the actuator, and smoothly.`;
    default: return `Shows the volts on ${red} with everything connected, actuator ${spec.position === "full" ? "at full travel" : spec.position === "half" ? "half way" : "at rest"}.`;
  }
}

const at = (fault: Fault, labels: readonly string[]) => (fault.pins ?? []).map((p) => labels[p - 1]!);

/** A finding in the words of the trade, without a full stop, e.g. "wire to B open". */
export function faultText(fault: Fault, labels: readonly string[]): string {
  const [a, b] = at(fault, labels);
  switch (fault.code) {
    case "none": return "device and wiring sound";
    case "wire-open": return `wire to ${a} open`;
    case "wire-resistive": return `bad joint in the wire to ${a}`;
    case "short-to-ground": return `wire to ${a} shorted to ground`;
    case "short-to-battery": return `wire to ${a} shorted to battery`;
    case "wires-shorted": return `wires to ${a} and ${b} shorted together`;
    case "connector-damp": return `damp connector: leakage between cavities ${a} and ${b}`;
    case "wires-swapped": return `wires to ${a} and ${b} exchanged`;
    case "contact-open": return `contact ${a} of the connector does not touch`;
    case "supply-missing": return "controller gives no supply";
    case "pull-missing": return "controller's signal input has lost its pull resistor";
    case "wiper-open": return "wiper of the potentiometer open";
    case "track-open": return "track of the potentiometer open";
    case "track-worn": return "track of the potentiometer worn";
    case "output-dead": return "device gives no output";
    case "output-stuck-high": return "device's output stuck high";
    case "output-stuck-low": return "device's output stuck low";
  }
}
