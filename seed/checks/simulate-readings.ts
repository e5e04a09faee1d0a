import { type CheckSpec, type MeterSpec, type PinNumber, type Position, type ReadingValue, type Terminal } from "@/lib/diagnosis";
import { operatingPoint } from "@/tests/support/spice";
import { atPosition, contactLines, controllerLines, deviceLines, fedVolts, type Drive, type MachineTruth, node, wireLines } from "./netlist";

/** True value of a check before the meter's own error, SI; or a word. */
export type TrueValue = number | Exclude<ReadingValue, number>;

const METER = "Rmeter";
/** Ohms source of a hand-held meter and its range resistor, as the bench's README states them. */
const SOURCE_VOLTS = 2.5;
const RANGE_RATIO = 1000 / 600;
const RANGES = [600, 6e3, 60e3, 600e3, 6e6, 60e6] as const;
/** Every node keeps a path to ground, as a real machine's insulation does. */
const INSULATION = 1e12;

function leakage(lines: readonly string[]): string[] {
  const nodes = new Set(lines.filter((line) => !line.startsWith(".")).flatMap((line) => line.split(" ").slice(1, 3)).filter((name) => name !== "0"));
  return [...nodes].map((name, index) => `Rins${index} ${name} 0 ${INSULATION}`);
}

async function solve(lines: readonly string[]): Promise<ReadonlyMap<string, number>> {
  return operatingPoint([...lines, ...leakage(lines)]);
}

const voltsAt = (volts: ReadonlyMap<string, number>, name: string): number => (name === "0" ? 0 : volts.get(name) ?? NaN);

async function ohmsBetween(lines: readonly string[], red: string, black: string): Promise<TrueValue> {
  for (const full of RANGES) {
    const range = full * RANGE_RATIO;
    const volts = await solve([...lines, `Vmeter mtr ${black} ${SOURCE_VOLTS}`, `${METER} mtr ${red} ${range}`]);
    const across = voltsAt(volts, red) - voltsAt(volts, black);
    const shown = across / ((SOURCE_VOLTS - across) / range);
    if (shown < full) return shown;
  }
  return "OL";
}

function matedLines(truth: MachineTruth, position: Position, drive: Drive | null): string[] {
  const meters = (["hs", "hg", "ho"] as const).map((name) => `R${METER}${name} ${name} 0 10e6`);
  return [...controllerLines(truth, true), ...wireLines(truth), ...contactLines(truth), ...deviceLines(truth, position, drive), ...meters];
}

function drivesOf(truth: MachineTruth, position: Position): readonly Drive[] {
  const { code } = truth.fault;
  if (code === "output-dead") return ["released"];
  if (code === "output-stuck-high") return [truth.device.output === "open-collector" ? "released" : "high"];
  if (code === "output-stuck-low") return ["low"];
  return truth.device.kind === "pwm" ? ["low", "high"] : [position];
}

interface Mated { readonly mean: number; readonly swing: number; readonly pulses: boolean }

/** One cavity, mated and powered: mean volts, and the swing where it pulses. */
async function mated(truth: MachineTruth, pin: PinNumber, position: Position): Promise<Mated> {
  const at = node(truth, "h", pin);
  const still = async (drive: Drive | null) => voltsAt(await solve(matedLines(truth, position, drive)), at);
  if (truth.device.kind === "potentiometer") return { mean: await still(null), swing: 0, pulses: false };
  const drives = drivesOf(truth, position);
  const first = await solve(matedLines(truth, position, drives[0] ?? null));
  const across = voltsAt(first, "ds") - voltsAt(first, "dg");
  if (across < Math.min(4.3, 0.85 * fedVolts(truth))) return { mean: await still(null), swing: 0, pulses: false };
  const low = voltsAt(first, at);
  const high = drives[1] ? await still(drives[1]) : low;
  const duty = drives.length > 1 ? atPosition(truth.device.duty, position) ?? 0.5 : 0;
  return { mean: low + duty * (high - low), swing: high - low, pulses: drives.length > 1 };
}

async function pulse(truth: MachineTruth, spec: CheckSpec, pin: PinNumber, meter: MeterSpec): Promise<TrueValue> {
  const position = spec.position ?? "rest";
  const { swing, pulses } = await mated(truth, pin, position);
  if (!pulses || Math.abs(swing) < meter.triggerVolts) return "none";
  return spec.meter === "hertz" ? truth.device.frequencyHz ?? 500 : atPosition(truth.device.duty, position) ?? 0.5;
}

async function sweep(truth: MachineTruth, pin: PinNumber): Promise<TrueValue> {
  const moved = Math.abs((await mated(truth, pin, "full")).mean - (await mated(truth, pin, "rest")).mean);
  if (moved < 0.1) return "still";
  return truth.fault.code === "track-worn" && pin === truth.device.pins.signal ? "jumps" : "smooth";
}

const terminalNode = (truth: MachineTruth, kind: "h" | "d", end: Terminal): string => (end === "gnd" ? "0" : end === "battery" ? "bat" : node(truth, kind, end));

/** What a check truly is on this machine, by the simulator. */
export async function trueValue(truth: MachineTruth, spec: CheckSpec, meter: MeterSpec): Promise<TrueValue> {
  const pin: PinNumber = typeof spec.red === "number" ? spec.red : 1;
  switch (spec.place) {
    case "battery": return truth.batteryVolts;
    case "contact": return truth.fault.code === "contact-open" && truth.fault.pins?.includes(pin) ? "loose" : "grips";
    case "device": {
      const [red, black] = [terminalNode(truth, "d", spec.red), terminalNode(truth, "d", spec.black)];
      // A parted device hangs in the air; the simulator wants one of its pins at zero.
      return ohmsBetween([...deviceLines(truth, spec.position ?? "rest", null), `Vzero ${black} 0 0`], red, black);
    }
    case "wire": return ohmsBetween(wireLines(truth), node(truth, "t", pin), node(truth, "h", pin));
    case "loose": return ohmsBetween([...wireLines(truth), "Rbatoff bat 0 5"], terminalNode(truth, "h", spec.red), terminalNode(truth, "h", spec.black));
    case "harness": {
      const lines = [...controllerLines(truth, spec.state.powerOn === true), ...wireLines(truth)];
      const [red, black] = [terminalNode(truth, "h", spec.red), terminalNode(truth, "h", spec.black)];
      if (spec.meter === "ohms") return ohmsBetween(lines, red, black);
      const volts = await solve([...lines, `${METER} ${red} ${black} 10e6`]);
      return voltsAt(volts, red) - voltsAt(volts, black);
    }
    case "colour": case "controller": throw new Error(`${spec.code} is no reading of a circuit`);
    case "mated":
      if (spec.meter === "watch") return sweep(truth, pin);
      return spec.meter === "dc-volts" ? (await mated(truth, pin, spec.position ?? "rest")).mean : pulse(truth, spec, pin, meter);
  }
}
