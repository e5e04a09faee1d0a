import { ALL_CHECKS, PLANNED_COUNT } from "../checks";
import { LOOSE_IF_BAD, LOOSE_IF_SOUND } from "../priors";
import type { CheckSpec } from "../types";
import { joinsTwo, SIGNAL, type Candidate } from "./candidate";
import { cavity, looseToGround, parallel, wireOhms, type Thevenin } from "./controller";
import { deviceOhms } from "./device-ohms";
import { METER_OHMS, newMatedVolts, pulses, solveMated } from "./mated";
import { HALF, halfOhmSlack, optionalCheck, WORN_OPEN, wornThere } from "./optional-readings";
import { P } from "./parameters";
import { exp, ln, norm } from "../numerics";

export const CHECK_COUNT = ALL_CHECKS.length;
export const CHECK_INDEX: ReadonlyMap<string, number> = new Map(ALL_CHECKS.map((c, i) => [c.code, i]));

/** Groups of checks that hang on different parts of the machine, so that a fit computes only what it needs. */
export const GROUP = { device: 1, cold: 2, live: 4, mated: 8, wires: 16 } as const;
/** Every group at once. */
export const ALL_GROUPS = 31;

const GROUP_OF: Readonly<Record<CheckSpec["place"], number>> = { device: GROUP.device, harness: 0, wire: GROUP.wires, loose: GROUP.wires, mated: GROUP.mated, contact: GROUP.wires, battery: GROUP.live, colour: 0, controller: 0 };
export const CHECK_GROUP: readonly number[] = ALL_CHECKS.map((c) => GROUP_OF[c.place] || (c.meter === "ohms" ? GROUP.cold : GROUP.live));

/** Predicted outcome of every check for one candidate at one point of its parameters. */
export interface Predictions {
  /** Number expected, in the check's unit; ohms may be Infinity. */
  readonly value: Float64Array;
  /** Chance of the word in place of a number: "OL", "none", "loose"; for a sweep, of "still". */
  readonly word: Float64Array;
  /** For a sweep, the chance of "jumps". */
  readonly jumps: Float64Array;
  /** How far the model itself may be out, standard deviations on the comparison scale (logarithm of ohms, volts). */
  readonly slack: Float64Array;
  /** Log-chance that the device's electronics are in the state the candidate says. */
  logState: number;
  /** True when the electronics do not run, so that junctions and leakage decide the volts. */
  idle: boolean;
}

export function newPredictions(): Predictions {
  return { value: new Float64Array(CHECK_COUNT), word: new Float64Array(CHECK_COUNT), jumps: new Float64Array(CHECK_COUNT), slack: new Float64Array(CHECK_COUNT), logState: 0, idle: false };
}

const MAX_OHMS = 60e6;
/** Ohms through junctions differ between devices of one type and with the meter's source (common practice: a tenth). */
const JUNCTION_OHM_SLACK = 0.1;
/** Volts of a device that is not running hang on leakage and junctions: a few hundredths of them, and some millivolts. */
const IDLE_SLACK = 0.006, IDLE_VOLTS = 0.01;
/** A controller's own leakage shifts an input that is held up by this share of its volts (common practice). */
const HELD_UP_SLACK = 0.006;
/** Change of the mean volts from rest to full that is seen as movement when a display is watched, volts. */
const SEEN_VOLTS = 0.15;
const TRIGGER_VOLTS = 0.8;

const logistic = (z: number) => 1 / (1 + exp(-z));
const roles = new Int8Array(4);
const here: Thevenin = { volts: 0, ohms: 0 }, there: Thevenin = { volts: 0, ohms: 0 };
const mated = newMatedVolts();

interface Item { readonly spec: CheckSpec; readonly index: number; readonly red: number; readonly black: number; readonly full: number }
const ITEMS: readonly Item[] = ALL_CHECKS.map((spec, index) => ({ spec, index, red: spec.red as number, black: spec.black as number, full: spec.position === "full" ? 1 : spec.position === "half" ? 0.5 : 0 }));

/** Which checks to predict, sorted by the part of the machine they hang on. */
export interface Plan {
  readonly groups: number;
  /** Positions of the actuator that matter: 1 rest, 2 full travel, or both. */
  readonly positions: number;
  /** Whether a frequency is among them. */
  readonly hertz: boolean;
  readonly device: readonly Item[];
  readonly cold: readonly Item[];
  readonly live: readonly Item[];
  readonly mated: readonly Item[];
  readonly wires: readonly Item[];
}

const REST = 1, FULL = 2;
const positionBits = (spec: CheckSpec) => (spec.position === "rest" ? REST : spec.position === "full" ? FULL : spec.meter === "watch" || spec.optional ? REST | FULL : 0);

/** A plan for the checks of the given places in the vocabulary. */
export function planFor(indices: readonly number[]): Plan {
  const of = (group: number) => [...new Set(indices)].filter((i) => CHECK_GROUP[i] === group).map((i) => ITEMS[i]!);
  const groups = indices.reduce((mask, i) => mask | CHECK_GROUP[i]!, 0);
  const positions = indices.reduce((mask, i) => mask | positionBits(ALL_CHECKS[i]!), 0), hertz = indices.some((i) => ALL_CHECKS[i]!.meter === "hertz");
  return { groups, positions, hertz, device: of(GROUP.device), cold: of(GROUP.cold), live: of(GROUP.live), mated: of(GROUP.mated), wires: of(GROUP.wires) };
}

/** All checks that are proposed to anybody; and with them the optional ones. */
export const WHOLE_PLAN = planFor(ITEMS.slice(0, PLANNED_COUNT).map((i) => i.index)), WIDEST_PLAN = planFor(ITEMS.map((i) => i.index));

/**
 * Fills `out` for those checks of the plan that are in `groups`. Pure but for `out`; scratch memory is overwritten on every call.
 * `nudged`: x is next to that of the last call for the same candidate that was not nudged; for derivatives.
 */
export function predictInto(c: Candidate, x: Float64Array, plan: Plan, groups: number, out: Predictions, nudged = false): void {
  for (let role = 0; role < 3; role++) roles[c.pinOf[role]!] = role;
  const wanted = groups & plan.groups;
  if (wanted & GROUP.device) for (const k of plan.device) deviceCheck(c, x, k.index, roles[k.red]!, roles[k.black]!, k.full, out);
  if (wanted & GROUP.cold) for (const k of plan.cold) setOhms(out, k.index, coldOhms(c, x, roles[k.red]!));
  if (wanted & GROUP.live) for (const k of plan.live) liveCheck(c, x, k.spec, k.index, out);
  if (wanted & GROUP.mated) matedChecks(c, x, plan, out, nudged);
  if (wanted & GROUP.wires) for (const k of plan.wires) wireCheck(c, x, k.spec, k.index, out);
}

function deviceCheck(c: Candidate, x: Float64Array, index: number, red: number, black: number, position: number, out: Predictions): void {
  setOhms(out, index, deviceOhms(c, x, red, black, position));
  out.slack[index] = c.family !== "potentiometer" ? JUNCTION_OHM_SLACK : position === HALF ? halfOhmSlack(c, x, red, black) : 0;
  if (position === HALF && wornThere(c, red, black)) out.word[index] = WORN_OPEN;
}

function setOhms(out: Predictions, index: number, ohms: number): void {
  out.value[index] = ohms;
  if (ohms < 0.5 * MAX_OHMS) out.word[index] = 0;
  else out.word[index] = ohms > 2 * MAX_OHMS ? 1 : logistic(ln(ohms / MAX_OHMS) / 0.02);
}

/** The partner of a cavity whose wire is shorted to another wire, or -1. */
const shortedTo = (c: Candidate, role: number) => (!joinsTwo(c.code) ? -1 : role === c.at ? c.at2 : role === c.at2 ? c.at : -1);

function joined(c: Candidate, x: Float64Array, role: number, on: boolean, t: Thevenin): void {
  const partner = shortedTo(c, role);
  if (partner >= 0) cavity(c, x, partner, on, t);
  const volts = t.volts, ohms = t.ohms + x[P.fault]!;
  cavity(c, x, role, on, t);
  if (partner >= 0) parallel(t, volts, ohms);
}

function coldOhms(c: Candidate, x: Float64Array, role: number): number {
  joined(c, x, role, false, here);
  return here.ohms;
}

function liveCheck(c: Candidate, x: Float64Array, spec: CheckSpec, index: number, out: Predictions): void {
  const volts = out.value[index] = liveVolts(c, x, spec);
  // Leakage in the controller takes a little off a held-up input; it matters where two volts nearly cancel.
  const pulled = spec.place === "harness" && spec.black !== "gnd" && c.pull !== "down";
  out.slack[index] = pulled ? HELD_UP_SLACK * Math.max(x[P.supply]!, Math.abs(volts)) : 0;
}

function liveVolts(c: Candidate, x: Float64Array, spec: CheckSpec): number {
  if (spec.place === "battery") return x[P.battery]!;
  const red = roles[spec.red as number]!;
  if (spec.black === "gnd") {
    joined(c, x, red, true, here);
    return here.ohms === Infinity ? 0 : here.volts * METER_OHMS / (METER_OHMS + here.ohms);
  }
  return voltsBetween(c, x, red, roles[spec.black as number]!);
}

function voltsBetween(c: Candidate, x: Float64Array, red: number, black: number): number {
  if (shortedTo(c, red) === black) {
    cavity(c, x, red, true, here);
    cavity(c, x, black, true, there);
    const short = x[P.fault]! * METER_OHMS / (x[P.fault]! + METER_OHMS);
    return (here.volts - there.volts) * short / (here.ohms + there.ohms + short);
  }
  joined(c, x, red, true, here);
  joined(c, x, black, true, there);
  const loop = METER_OHMS + here.ohms + there.ohms;
  return loop === Infinity ? 0 : (here.volts - there.volts) * METER_OHMS / loop;
}

function matedChecks(c: Candidate, x: Float64Array, plan: Plan, out: Predictions, nudged: boolean): void {
  solveMated(c, x, mated, plan.positions, nudged);
  out.idle = c.family !== "potentiometer" && mated.running === 0;
  out.logState = c.running === "yes" ? ln(Math.max(mated.running, 1e-4)) : 0;
  for (const k of plan.mated) {
    if (k.spec.optional) { optionalCheck(c, x, k.spec, k.index, roles[k.red]!, mated, out); continue; }
    const role = roles[k.red]!, place = 3 * k.full + role, volts = mated.volts[place]!;
    if (k.spec.meter === "dc-volts") { out.value[k.index] = volts; out.slack[k.index] = norm(mated.drop[place]!, out.idle && Math.abs(volts) > 0.03 ? IDLE_SLACK * Math.abs(volts) + IDLE_VOLTS : 0); }
    else if (k.spec.meter === "watch") watch(c, role, k.index, out);
    else pulseCheck(c, x, k.spec, k.index, place, out);
  }
}

function pulseCheck(c: Candidate, x: Float64Array, spec: CheckSpec, index: number, place: number, out: Predictions): void {
  const swing = mated.swing[place]!;
  const seen = pulses(c) ? mated.running * logistic((Math.abs(swing) - TRIGGER_VOLTS) / 0.04) : 0;
  out.word[index] = 1 - 0.999 * seen;
  if (spec.meter === "hertz") { out.value[index] = x[P.frequency]!; return; }
  const duty = x[spec.position === "full" ? P.full : P.rest]!;
  out.value[index] = swing < 0 ? 1 - duty : duty;
}

function watch(c: Candidate, role: number, index: number, out: Predictions): void {
  const rest = mated.volts[role]!, full = mated.volts[3 + role]!;
  // Two looks at the display differ by its own scatter; only a change beyond that is seen.
  const scatter = 0.004 * Math.max(Math.abs(rest), Math.abs(full)) + 0.01;
  const moves = logistic((Math.abs(full - rest) - SEEN_VOLTS) / (0.6 * scatter));
  const worn = c.code === "track-worn" && role === SIGNAL;
  out.word[index] = clampChance(worn ? 0.05 : 1 - moves);
  out.jumps[index] = clampChance(worn ? 0.95 : 0.002);
}

const clampChance = (p: number) => Math.min(0.995, Math.max(0.002, p));

function wireCheck(c: Candidate, x: Float64Array, spec: CheckSpec, index: number, out: Predictions): void {
  const role = roles[spec.red as number]!;
  if (spec.place === "contact") out.word[index] = c.code === "contact-open" && c.at === role ? LOOSE_IF_BAD : LOOSE_IF_SOUND;
  else if (spec.place === "wire") setOhms(out, index, wireOhms(c, x, role));
  else if (spec.black === "gnd") setOhms(out, index, looseToGround(c, x, role));
  else setOhms(out, index, shortedTo(c, role) === roles[spec.black as number]! ? x[P.fault]! : Infinity);
}

