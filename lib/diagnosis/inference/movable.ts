import type { Candidate } from "../circuit/candidate";
import { P } from "../circuit/parameters";
import { GROUP } from "../circuit/predict";

const HAS_FAULT_OHMS = new Set(["wire-resistive", "short-to-ground", "short-to-battery", "wires-shorted", "connector-damp"]);
const cache = new WeakMap<Candidate, Map<number, readonly number[]>>();

/** Which unknowns the given groups of checks can speak of, for this candidate; ascending places. */
export function movedBy(c: Candidate, groups: number): readonly number[] {
  let lists = cache.get(c);
  if (!lists) cache.set(c, lists = new Map());
  let list = lists.get(groups);
  if (!list) lists.set(groups, list = listFor(c, groups));
  return list;
}

function listFor(c: Candidate, groups: number): readonly number[] {
  const set = new Set<number>();
  const add = (...places: number[]) => places.forEach((p) => set.add(p));
  if (groups & GROUP.cold) add(P.supplyBleed, P.pull, ...(c.pull === "down" ? [] : [P.railOff]));
  if (groups & (GROUP.live | GROUP.mated)) {
    add(P.battery, P.supply, P.supplySource, P.pull);
    if (c.pull === "up") add(P.rail);
    if (c.code === "supply-missing") add(P.supplyBleed);
  }
  if (groups & GROUP.device) add(...deviceUnknowns(c));
  if (groups & GROUP.mated) add(P.rest, P.full, ...deviceUnknowns(c), ...runningUnknowns(c));
  if (HAS_FAULT_OHMS.has(c.code) && groups & ~GROUP.device) add(P.fault);
  if (c.code === "short-to-battery" && groups & (GROUP.cold | GROUP.wires)) add(P.batteryOff);
  if (c.suppliedByBattery) set.delete(P.supply);
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
