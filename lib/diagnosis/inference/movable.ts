import { SIGNAL, SUPPLY, type Candidate } from "../circuit/candidate";
import { ALL_PINS, pinsOf } from "../circuit/harness-parts";
import { P } from "../circuit/parameters";
import { GROUP, type Plan } from "../circuit/predict";

const HAS_FAULT_OHMS = new Set(["wire-resistive", "short-to-ground", "short-to-battery", "wires-shorted", "connector-damp"]);
const cache = new WeakMap<Candidate, Map<number, readonly number[]>>();

/** Which unknowns the checks of a plan, taken at the given pins of the harness (bits), can speak of, for this candidate; ascending places. */
export function movedBy(c: Candidate, plan: Plan, pins = ALL_PINS): readonly number[] {
  let lists = cache.get(c);
  if (!lists) cache.set(c, lists = new Map());
  const key = ((plan.groups * 4 + plan.positions) * 2 + (plan.hertz ? 1 : 0)) * (ALL_PINS + 1) + pins;
  let list = lists.get(key);
  if (!list) lists.set(key, list = listFor(c, plan, pins));
  return list;
}

function listFor(c: Candidate, { groups, positions, hertz }: Plan, pins: number): readonly number[] {
  const set = new Set<number>(), faulty = (pinsOf(c, -1) & pins) !== 0;
  const add = (...places: number[]) => places.forEach((p) => set.add(p));
  if (groups & GROUP.cold) {
    if (pinsOf(c, SUPPLY) & pins) add(P.supplyBleed);
    if (pinsOf(c, SIGNAL) & pins && c.code !== "pull-missing") add(P.pull, ...(c.pull === "down" ? [] : [P.railOff]));
  }
  if (groups & (GROUP.live | GROUP.mated)) {
    add(P.battery, P.supply, P.supplySource, P.pull);
    if (c.pull === "up") add(P.rail);
    if (c.code === "supply-missing") add(P.supplyBleed);
  }
  if (groups & GROUP.device) add(...deviceUnknowns(c));
  if (groups & GROUP.mated) add(P.rest, P.full, ...deviceUnknowns(c), ...runningUnknowns(c));
  if (faulty && HAS_FAULT_OHMS.has(c.code) && groups & ~GROUP.device) add(P.fault);
  if (faulty && c.code === "short-to-battery" && groups & (GROUP.cold | GROUP.wires)) add(P.batteryOff);
  if (c.suppliedByBattery) set.delete(P.supply);
  if (!hertz) set.delete(P.frequency);
  if (!(positions & 1)) set.delete(P.rest);
  if (!(positions & 2)) set.delete(P.full);
  return [...set].sort((a, b) => a - b);
}

const LINES = GROUP.live | GROUP.mated;
const DEVICE_LINES = GROUP.device | GROUP.mated;

/** Groups of checks that one unknown can move; `idle`: the electronics do not run, so what leaks and conducts decides. */
export function reachOf(c: Candidate, parameter: number, idle: boolean): number {
  switch (parameter) {
    case P.battery: case P.supply: case P.supplySource: case P.rail: return LINES;
    case P.supplyBleed: return c.code === "supply-missing" ? GROUP.cold | LINES : GROUP.cold;
    case P.pull: return GROUP.cold | LINES;
    case P.railOff: return GROUP.cold;
    case P.fault: return GROUP.cold | LINES | GROUP.wires;
    case P.batteryOff: return GROUP.cold | GROUP.wires;
    case P.load: case P.driveLow: case P.high: case P.frequency: return GROUP.mated;
    case P.rest: case P.full: return c.family === "potentiometer" ? DEVICE_LINES : GROUP.mated;
    default: return c.family === "potentiometer" || idle ? DEVICE_LINES : GROUP.device;
  }
}

function deviceUnknowns(c: Candidate): readonly number[] {
  if (c.family === "potentiometer") return [P.track, P.wiper, P.rest, P.full];
  return [P.internal, P.leak, P.dropSupply, P.dropSignal, P.clamp];
}

function runningUnknowns(c: Candidate): readonly number[] {
  switch (c.family) {
    case "potentiometer": return [];
    case "open-collector": return [P.load, P.driveLow, P.frequency];
    case "push-pull": return [P.load, P.high, P.frequency];
    case "voltage": return [P.load, P.high];
  }
}
