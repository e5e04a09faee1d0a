import { NodalNetwork, THERMAL_VOLTS } from "../network/solve";
import { GROUND, SIGNAL, SUPPLY, type Candidate } from "./candidate";
import { cavity, supplyVolts, type Thevenin } from "./controller";
import { clampShare, DROP_AMPERES, EMISSION } from "./device-ohms";
import { P } from "./parameters";

/** Input resistance of a voltmeter, ohms (hand-held meters: 10 megohm). */
export const METER_OHMS = 10e6;
/** Output resistance of a driven output and the volts it leaves when low (common practice). */
const OUTPUT_OHMS = 100;
const LOW_VOLTS = 0.05;
/** Volts across the device below which it stops, and the share of a low supply (common practice). */
const RUN_VOLTS = 4.3;
const MIN_SUPPLY_SHARE = 0.85;
const INNER = 4, PARTED_PIN = 5, CLAMPED = 6;

/** Mated and powered: mean volts of each role's cavity, and the swing where the signal pulses; per position. */
export interface MatedVolts {
  readonly volts: Float64Array;
  readonly swing: Float64Array;
  /** Chance that the device's electronics run. */
  running: number;
}

export function newMatedVolts(): MatedVolts {
  return { volts: new Float64Array(6), swing: new Float64Array(6), running: 1 };
}

const net = new NodalNetwork(6);
const scratch: Thevenin = { volts: 0, ohms: 0 };

/** Node of the device's own pin: the cavity's node, unless that contact is open. */
const pinNode = (c: Candidate, role: number) => (c.code === "contact-open" && c.at === role ? PARTED_PIN : role + 1);

function stampHarness(c: Candidate, x: Float64Array): void {
  net.reset(c.family === "potentiometer" ? PARTED_PIN : CLAMPED);
  for (let role = 0; role < 3; role++) {
    cavity(c, x, role, true, scratch);
    net.source(role + 1, 0, scratch.volts, scratch.ohms);
    net.resistor(role + 1, 0, METER_OHMS);
  }
  if (c.code === "wires-shorted") net.resistor(c.at + 1, c.at2 + 1, x[P.fault]!);
}

/** Solves the mated machine for both positions of the actuator into `out` (index position * 3 + role), volts. */
export function solveMated(c: Candidate, x: Float64Array, out: MatedVolts): void {
  out.swing.fill(0);
  out.running = 1;
  if (c.family === "potentiometer") solvePotentiometer(c, x, out);
  else solveElectronic(c, x, out);
}

function keep(out: MatedVolts, position: number): void {
  for (let role = 0; role < 3; role++) out.volts[position * 3 + role] = net.volts[role + 1]!;
}

function solvePotentiometer(c: Candidate, x: Float64Array, out: MatedVolts): void {
  const track = x[P.track]!;
  for (let position = 0; position < 2; position++) {
    const share = clampShare(x[position === 0 ? P.rest : P.full]!);
    stampHarness(c, x);
    const broken = c.code === "track-open" ? c.breakEnd : -1;
    if (broken !== SUPPLY) net.resistor(pinNode(c, SUPPLY), INNER, track * (1 - share));
    if (broken !== GROUND) net.resistor(INNER, pinNode(c, GROUND), track * share);
    if (c.code !== "wiper-open") net.resistor(INNER, pinNode(c, SIGNAL), x[P.wiper]!);
    net.solve();
    keep(out, position);
  }
}

const saturation = (drop: number) => DROP_AMPERES * Math.exp(-drop / (EMISSION * THERMAL_VOLTS));

/** The parts of an electronic device that conduct whether it runs or not. */
function stampPassive(c: Candidate, x: Float64Array): void {
  const supply = pinNode(c, SUPPLY), ground = pinNode(c, GROUND), signal = pinNode(c, SIGNAL);
  net.diode(supply, INNER, saturation(x[P.dropSupply]!), EMISSION);
  net.resistor(INNER, ground, x[P.internal]!);
  net.diode(ground, CLAMPED, saturation(x[P.dropSignal]!), EMISSION);
  net.resistor(CLAMPED, signal, x[P.clamp]!);
  if (c.family !== "open-collector") net.diode(signal, INNER, saturation(x[P.dropSignal]!), EMISSION);
  net.resistor(signal, ground, x[P.leak]!);
}

type Drive = "released" | "low" | "high" | "rest" | "full";

function stampRunning(c: Candidate, x: Float64Array, drive: Drive): void {
  const supply = pinNode(c, SUPPLY), ground = pinNode(c, GROUND), signal = pinNode(c, SIGNAL);
  const fed = supplyVolts(c, x);
  net.resistor(supply, ground, fed / x[P.load]!);
  if (drive === "released") return;
  if (c.family === "open-collector") { if (drive === "low") net.resistor(signal, ground, x[P.driveLow]!); return; }
  const level = drive === "low" ? LOW_VOLTS : drive === "high" ? Math.min(x[P.high]!, fed) - 0.1 : x[drive === "rest" ? P.rest : P.full]!;
  net.source(signal, ground, level, OUTPUT_OHMS);
}

function solveDrive(c: Candidate, x: Float64Array, drive: Drive | null): void {
  stampHarness(c, x);
  stampPassive(c, x);
  if (drive) stampRunning(c, x, drive);
  net.solve();
}

const acrossDevice = (c: Candidate) => net.volts[pinNode(c, SUPPLY)]! - net.volts[pinNode(c, GROUND)]!;

function solveElectronic(c: Candidate, x: Float64Array, out: MatedVolts): void {
  const drives = drivesOf(c);
  solveDrive(c, x, c.running === "no" ? null : drives[0]);
  out.running = c.running === "no" ? 0 : chanceOfRunning(acrossDevice(c), supplyVolts(c, x));
  if (c.running === "by-volts" && out.running < 0.5) solveDrive(c, x, null);
  if (c.running !== "yes" && out.running < 0.5) { keep(out, 0); keep(out, 1); out.running = 0; return; }
  keep(out, 0);
  solveDrive(c, x, drives[1]);
  keep(out, 1);
  if (pulses(c)) mixPulses(x, out);
}

function chanceOfRunning(across: number, fed: number): number {
  return 1 / (1 + Math.exp(-(across - Math.min(RUN_VOLTS, MIN_SUPPLY_SHARE * fed)) / 0.12));
}

/** What the output does in the two networks: low and high of a pulse, rest and full of a voltage, or one stuck state. */
function drivesOf(c: Candidate): readonly [Drive, Drive] {
  if (c.code === "output-dead") return ["released", "released"];
  if (c.code === "output-stuck-high") return c.family === "open-collector" ? ["released", "released"] : ["high", "high"];
  if (c.code === "output-stuck-low") return ["low", "low"];
  return c.family === "voltage" ? ["rest", "full"] : ["low", "high"];
}

export function pulses(c: Candidate): boolean {
  return (c.family === "open-collector" || c.family === "push-pull") && !c.code.startsWith("output-");
}

/** A meter on DC volts shows the mean: high share of the period times high, the rest times low. */
function mixPulses(x: Float64Array, out: MatedVolts): void {
  for (let role = 0; role < 3; role++) {
    const low = out.volts[role]!, high = out.volts[3 + role]!;
    const rest = clampDuty(x[P.rest]!), full = clampDuty(x[P.full]!);
    out.volts[role] = low + rest * (high - low);
    out.volts[3 + role] = low + full * (high - low);
    out.swing[role] = out.swing[3 + role] = high - low;
  }
}

export function clampDuty(duty: number): number {
  return Math.min(0.995, Math.max(0.005, duty));
}
