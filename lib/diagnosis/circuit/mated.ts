import { NodalNetwork, THERMAL_VOLTS } from "../network/solve";
import { GROUND, joinsTwo, SIGNAL, SUPPLY, type Candidate } from "./candidate";
import { cavity, supplyVolts, WIRE_OHMS_SPREAD, type Thevenin } from "./controller";
import { DROP_AMPERES, EMISSION, wiperOhms, wiperShare } from "./device-ohms";
import { P } from "./parameters";
import { exp } from "../numerics";

/** Input resistance of a voltmeter, ohms (hand-held meters: 10 megohm). */
export const METER_OHMS = 10e6;
/** Output resistance of a driven output and the volts it leaves when low (common practice). */
const OUTPUT_OHMS = 100;
const LOW_VOLTS = 0.05;
/** Volts across the device below which it stops, and the share of a low supply (common practice). */
const RUN_VOLTS = 4.3;
const MIN_SUPPLY_SHARE = 0.85;
/** Nodes: 1 to 3 the cavities by role, then the device's pin behind an open contact, then what is inside the device. */
const PARTED_PIN = 4;
const firstInside = (c: Candidate) => (c.code === "contact-open" ? 5 : 4);

/** Mated and powered: mean volts of each role's cavity, and the swing where the signal pulses; per position. */
export interface MatedVolts {
  readonly volts: Float64Array;
  readonly swing: Float64Array;
  /** How far the volts may be out because sound wires are not all alike, volts (one standard deviation). */
  readonly drop: Float64Array;
  /** Chance that the device's electronics run. */
  running: number;
}

export function newMatedVolts(): MatedVolts {
  return { volts: new Float64Array(6), swing: new Float64Array(6), drop: new Float64Array(6), running: 1 };
}

const net = new NodalNetwork(6);
const scratch: Thevenin = { volts: 0, ohms: 0 };
/** Junction voltages of the networks last solved in full, by network: standing still, and one of each drive. */
const solved = [new Float64Array(3), new Float64Array(3), new Float64Array(3)] as const;
const IDLE = 0;
/** Which of them were solved for the point last asked for in full. */
const isSolved = new Uint8Array(3);
/** The network in hand: which, the junction asked for next, and whether a step from the last full solution will do. */
let which = IDLE, junction = 0, near = false, nudgedPoint = false;

/** Takes a network in hand. One that the point solved in full had no need of is solved in full. */
function takeUp(network: 0 | 1 | 2): void {
  which = network; junction = 0; near = nudgedPoint && isSolved[network] === 1;
}

/** Guess for the next junction: the last solution's where the network is near it. */
const guess = (volts: number) => (near ? solved[which]![junction++]! : volts);

function solveNet(): void {
  if (near) net.solveNear();
  else { net.solve(); net.junctions(solved[which]!); isSolved[which] = 1; }
}

/** Volts and siemens behind each cavity, as last stamped. */
const fedVolts = new Float64Array(3), fedSiemens = new Float64Array(3);

/** Node of the device's own pin: the cavity's node, unless that contact is open. */
const pinNode = (c: Candidate, role: number) => (c.code === "contact-open" && c.at === role ? PARTED_PIN : role + 1);

/** Starts a network with the harness and room for `inside` nodes of the device. */
function stampHarness(c: Candidate, x: Float64Array, inside: number): void {
  net.reset(firstInside(c) - 1 + inside);
  for (let role = 0; role < 3; role++) {
    cavity(c, x, role, true, scratch);
    net.source(role + 1, 0, scratch.volts, scratch.ohms);
    fedVolts[role] = scratch.volts;
    fedSiemens[role] = 1 / scratch.ohms;
    net.resistor(role + 1, 0, METER_OHMS);
  }
  if (joinsTwo(c.code)) net.resistor(c.at + 1, c.at2 + 1, x[P.fault]!);
}

/** Both positions of the actuator; rest is the first bit, full travel the second. */
export const BOTH_POSITIONS = 3;

/**
 * Solves the mated machine for the positions of the actuator that are asked for (bits) into `out` (index position * 3 + role), volts. `nudged`: x is
 * next to where the same candidate was solved last, so that one step from there will do; for derivatives.
 */
export function solveMated(c: Candidate, x: Float64Array, out: MatedVolts, positions = BOTH_POSITIONS, nudged = false): void {
  nudgedPoint = nudged;
  if (!nudged) isSolved.fill(0);
  out.swing.fill(0);
  out.running = 1;
  if (c.family === "potentiometer") solvePotentiometer(c, x, out, positions);
  else solveElectronic(c, x, out, positions);
}

function keep(out: MatedVolts, position: number): void {
  for (let role = 0; role < 3; role++) {
    const place = position * 3 + role, volts = net.volts[role + 1]!;
    out.volts[place] = volts;
    out.drop[place] = WIRE_OHMS_SPREAD * fedSiemens[role]! * Math.abs(fedVolts[role]! - volts);
  }
}

function solvePotentiometer(c: Candidate, x: Float64Array, out: MatedVolts, positions: number): void {
  const track = x[P.track]!;
  for (let position = 0; position < 2; position++) {
    if (!(positions & (position + 1))) continue;
    const stands = x[position === 0 ? P.rest : P.full]!, share = wiperShare(c, stands);
    stampHarness(c, x, 1);
    const wiper = firstInside(c);
    const broken = c.code === "track-open" ? c.breakEnd : -1;
    if (broken !== SUPPLY) net.resistor(pinNode(c, SUPPLY), wiper, track * (1 - share));
    if (broken !== GROUND) net.resistor(wiper, pinNode(c, GROUND), track * share);
    if (c.code !== "wiper-open") net.resistor(wiper, pinNode(c, SIGNAL), wiperOhms(c, x, stands));
    net.solve();
    keep(out, position);
  }
}

const saturation = (drop: number) => DROP_AMPERES * exp(-drop / (EMISSION * THERMAL_VOLTS));

/** Junction voltage from which the solution is sought, volts: near where a conducting junction ends up. */
const GUESS_VOLTS = 0.45;

/** The parts of an electronic device that conduct when it does not run: junctions into its inner supply, and leakage. */
function stampIdle(c: Candidate, x: Float64Array): void {
  const ground = pinNode(c, GROUND), signal = pinNode(c, SIGNAL), inner = firstInside(c);
  net.diode(pinNode(c, SUPPLY), inner, saturation(x[P.dropSupply]!), EMISSION, guess(GUESS_VOLTS));
  net.resistor(inner, ground, x[P.internal]!);
  if (c.family !== "open-collector") net.diode(signal, inner, saturation(x[P.dropSignal]!), EMISSION, guess(0));
  stampClamp(c, x, inner + 1);
  net.resistor(signal, ground, x[P.leak]!);
}

/** The clamp from ground to signal; it conducts only where ground stands above the signal. */
function stampClamp(c: Candidate, x: Float64Array, node: number): void {
  net.diode(pinNode(c, GROUND), node, saturation(x[P.dropSignal]!), EMISSION, guess(GUESS_VOLTS));
  net.resistor(node, pinNode(c, SIGNAL), x[P.clamp]!);
}

/** Below this forward voltage a clamp carries next to nothing, volts. */
const CLAMP_FROM_VOLTS = 0.25;

type Drive = "released" | "low" | "high" | "rest" | "full";

function stampRunning(c: Candidate, x: Float64Array, drive: Drive): void {
  const supply = pinNode(c, SUPPLY), ground = pinNode(c, GROUND), signal = pinNode(c, SIGNAL);
  const fed = supplyVolts(c, x);
  net.resistor(supply, ground, fed / x[P.load]!);
  net.resistor(signal, ground, x[P.leak]!);
  if (drive === "released") return;
  if (c.family === "open-collector") { if (drive === "low") net.resistor(signal, ground, x[P.driveLow]!); return; }
  const level = drive === "low" ? LOW_VOLTS : drive === "high" ? Math.min(x[P.high]!, fed) - 0.1 : x[drive === "rest" ? P.rest : P.full]!;
  net.source(signal, ground, level, OUTPUT_OHMS);
}

function solveIdle(c: Candidate, x: Float64Array): void {
  takeUp(IDLE);
  stampHarness(c, x, 2);
  stampIdle(c, x);
  solveNet();
}

/** A running device: its load hides the junctions to its inner supply, so the network is linear unless the clamp conducts. */
function solveDrive(c: Candidate, x: Float64Array, drive: Drive, network: 1 | 2): void {
  takeUp(network);
  stampHarness(c, x, 0);
  stampRunning(c, x, drive);
  net.solve();
  if (net.volts[pinNode(c, GROUND)]! - net.volts[pinNode(c, SIGNAL)]! < CLAMP_FROM_VOLTS) return;
  stampHarness(c, x, 1);
  stampRunning(c, x, drive);
  stampClamp(c, x, firstInside(c));
  solveNet();
}

const acrossDevice = (c: Candidate) => net.volts[pinNode(c, SUPPLY)]! - net.volts[pinNode(c, GROUND)]!;

function solveElectronic(c: Candidate, x: Float64Array, out: MatedVolts, positions: number): void {
  const drives = drivesOf(c);
  if (c.running === "no") out.running = 0;
  else { solveDrive(c, x, drives[0], 1); out.running = chanceOfRunning(acrossDevice(c), supplyVolts(c, x)); }
  if (c.running !== "yes" && out.running < 0.5) { solveIdle(c, x); keep(out, 0); keep(out, 1); out.running = 0; return; }
  keep(out, 0);
  // The mean of a pulse takes both networks; a level that does not change, or that nobody asks for at full travel, one.
  if (pulses(c)) { solveDrive(c, x, drives[1], 2); keep(out, 1); mixPulses(x, out); return; }
  if (drives[0] !== drives[1] && positions > 1) solveDrive(c, x, drives[1], 2);
  keep(out, 1);
}

function chanceOfRunning(across: number, fed: number): number {
  return 1 / (1 + exp(-(across - Math.min(RUN_VOLTS, MIN_SUPPLY_SHARE * fed)) / 0.12));
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
    const rest = x[P.rest]!, full = x[P.full]!;
    out.volts[role] = low + rest * (high - low);
    out.volts[3 + role] = low + full * (high - low);
    out.swing[role] = out.swing[3 + role] = high - low;
  }
}
