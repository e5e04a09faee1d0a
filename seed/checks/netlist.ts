import type { Expect, Fault, PinNumber, Position, Role } from "@/lib/diagnosis";

/**
 * The circuit of one demo machine as lines for a general-purpose circuit simulator: controller, wires, connector,
 * device. Values are common practice: joints of hundredths of an ohm, pull resistors of kilohms, clamp diodes at
 * every electronic output. Nodes: tX controller terminal, hX harness cavity, dX device pin, X = s, g, o.
 */
export interface MachineTruth {
  readonly device: Expect;
  readonly fault: Fault;
  readonly batteryVolts: number;
}

export type Drive = "low" | "high" | "released" | Position;

const SHORT: Record<Role, string> = { supply: "s", ground: "g", signal: "o" };
const ROLES = ["supply", "ground", "signal"] as const satisfies readonly Role[];
const OPEN = 1e12;
const CORRODED = 2700;

const pinsOf = (truth: MachineTruth): readonly PinNumber[] => truth.fault.pins ?? [];
const letter = (truth: MachineTruth, pin: PinNumber): string => SHORT[ROLES.find((role) => truth.device.pins[role] === pin) ?? "signal"];
const hits = (truth: MachineTruth, code: Fault["code"], role: Role): boolean => truth.fault.code === code && pinsOf(truth).includes(truth.device.pins[role]);

/** Which node of its kind (t, h or d) a pin is. */
export const node = (truth: MachineTruth, kind: "h" | "d" | "t", pin: PinNumber): string => `${kind}${letter(truth, pin)}`;

/** Volts that the controller feeds to a sound device. */
export const fedVolts = (truth: MachineTruth): number => (truth.device.supplyVolts === "battery" ? truth.batteryVolts : truth.device.supplyVolts);

const resistor = (name: string, a: string, b: string, ohms: number): string => `R${name} ${a} ${b} ${ohms}`;

function supplyLines(truth: MachineTruth, on: boolean): string[] {
  if (!on || truth.fault.code === "supply-missing") return [resistor("bleed", "ts", "0", 8200)];
  return [`Vsup sup 0 ${fedVolts(truth)}`, resistor("sup", "sup", "ts", 0.9)];
}

function inputLines(truth: MachineTruth, on: boolean): string[] {
  const leak = resistor("leak", "to", "0", 20e6);
  if (truth.fault.code === "pull-missing") return [leak];
  if (truth.device.output !== "open-collector") return [leak, resistor("pull", "to", "0", 150e3)];
  const rail = on ? [`Vrail rail 0 5`] : [resistor("railoff", "rail", "0", 2000)];
  return [leak, ...rail, resistor("pull", "to", "rail", 3300)];
}

/** Controller with its power on or off. */
export function controllerLines(truth: MachineTruth, on: boolean): string[] {
  const battery = on ? [`Vbat bat 0 ${truth.batteryVolts}`] : [resistor("batoff", "bat", "0", 5)];
  return [...battery, ...supplyLines(truth, on), resistor("gnd", "tg", "0", 0.02), ...inputLines(truth, on)];
}

/** Wires with whatever is wrong with them; the loose wire alone when the controller's connector is parted. */
export function wireLines(truth: MachineTruth): string[] {
  const swapped = truth.fault.code === "wires-swapped" ? pinsOf(truth) : [];
  const wires = ROLES.map((role) => {
    const pin = truth.device.pins[role];
    const from = swapped.includes(pin) ? swapped.find((other) => other !== pin) ?? pin : pin;
    const ohms = hits(truth, "wire-open", role) ? OPEN : hits(truth, "wire-resistive", role) ? CORRODED : 0.07;
    return resistor(`w${pin}`, node(truth, "t", from), node(truth, "h", pin), ohms);
  });
  return [...wires, ...shortLines(truth)];
}

function shortLines(truth: MachineTruth): string[] {
  const [first, second] = pinsOf(truth);
  if (first === undefined) return [];
  const at = node(truth, "h", first);
  if (truth.fault.code === "short-to-ground") return [resistor("short", at, "0", 0.7)];
  if (truth.fault.code === "short-to-battery") return [resistor("short", at, "bat", 0.7)];
  return truth.fault.code === "wires-shorted" && second !== undefined ? [resistor("short", at, node(truth, "h", second), 0.9)] : [];
}

/** The mated connector: every contact touches but the one that does not. */
export function contactLines(truth: MachineTruth): string[] {
  return ROLES.map((role) => resistor(`c${SHORT[role]}`, `h${SHORT[role]}`, `d${SHORT[role]}`, hits(truth, "contact-open", role) ? OPEN : 0.02));
}

/** A value that moves with the actuator; half way lies midway. */
export const atPosition = (span: { readonly rest: number; readonly full: number } | undefined, position: Position): number | undefined =>
  (position === "half" ? span && (span.rest + span.full) / 2 : span?.[position]);

const share = (truth: MachineTruth, position: Position): number => atPosition(truth.device.signalRatio, position) ?? 0.5;

function trackLines(truth: MachineTruth, position: Position): string[] {
  const total = truth.device.totalOhms ?? 5000;
  const x = Math.min(0.998, Math.max(0.002, share(truth, position)));
  const wiper = truth.fault.code === "wiper-open" ? OPEN : (truth.device.wiperSeriesOhms ?? 0) + 40;
  return [resistor("top", "ds", "wip", total * (1 - x)), resistor("bottom", "wip", "dg", total * x), resistor("wip", "wip", "do", wiper)];
}

/** What an electronic device conducts whether it runs or not: supply path, clamps, leakage. */
function passiveLines(truth: MachineTruth): string[] {
  const collector = truth.device.output === "open-collector";
  const models = [".model dsup D(IS=4e-11 N=1)", ".model dsig D(IS=1.8e-13 N=1)"];
  const back = collector ? [] : ["Dback do inner dsig"];
  return [...models, "Dsup ds inner dsup", resistor("inner", "inner", "dg", 52e3), "Dclamp dg cl dsig", resistor("cl", "cl", "do", 60), ...back, resistor("oleak", "do", "dg", collector ? 1.5e6 : 4.6e6)];
}

function driveLines(truth: MachineTruth, drive: Drive): string[] {
  const load = resistor("load", "ds", "dg", fedVolts(truth) / 0.006);
  if (drive === "released") return [load];
  if (truth.device.output === "open-collector") return drive === "low" ? [load, resistor("out", "do", "dg", 42)] : [load];
  const volts = drive === "low" ? 0.05 : drive === "high" ? Math.min(5.1, fedVolts(truth)) - 0.1 : atPosition(truth.device.signalVolts, drive) ?? 2.5;
  return [load, `Vout drv dg ${volts}`, resistor("out", "drv", "do", 100)];
}

/** The device: a track at a position, or electronics; `drive` null leaves the electronics without power to run. */
export function deviceLines(truth: MachineTruth, position: Position, drive: Drive | null): string[] {
  if (truth.device.kind === "potentiometer") return trackLines(truth, position);
  return [...passiveLines(truth), ...(drive ? driveLines(truth, drive) : [])];
}
