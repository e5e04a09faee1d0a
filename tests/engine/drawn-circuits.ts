import { DEFAULT_METER } from "@/lib/diagnosis";
import { beliefs } from "@/lib/diagnosis/assess";
import type { Candidate } from "@/lib/diagnosis/circuit/candidate";
import { P, PARAMETER_COUNT } from "@/lib/diagnosis/circuit/parameters";
import { ALL_GROUPS, newPredictions, predictInto, WHOLE_PLAN, type Predictions } from "@/lib/diagnosis/circuit/predict";
import { candidatesDamp } from "@/lib/diagnosis/inference/candidates";
import { physical } from "@/lib/diagnosis/inference/misfit";
import { normal } from "../support/draw-machine";
import type { Description } from "../support/machine-netlist";

/** One way the machine may be built, its unknowns drawn: as a description for SPICE, and as the engine predicts it. */
export interface DrawnCircuit {
  readonly name: string;
  readonly candidate: Candidate;
  readonly description: Description;
  readonly roleOf: (pin: number) => number;
  readonly predicted: Predictions;
  readonly x: Float64Array;
}

const ROLES = ["supply", "ground", "signal"] as const;

/** Every family, fault place, pull, break and state of the electronics once, each with another order of the pins. */
export function everyBuild(): Candidate[] {
  return oneOfEach(beliefs({ pins: ["1", "2", "3"] }, []).map(({ candidate }) => candidate));
}

/** The same of builds with a damp connector. */
export const everyDampBuild = () => oneOfEach(candidatesDamp({}));

function oneOfEach(builds: readonly Candidate[]): Candidate[] {
  const groups = new Map<string, Candidate[]>();
  for (const c of builds) {
    const key = [c.family, c.code, c.at, c.at2, c.pull, c.breakEnd, c.running].join();
    groups.set(key, [...(groups.get(key) ?? []), c]);
  }
  return [...groups].sort(([a], [b]) => (a < b ? -1 : 1)).map(([, list], i) => [...list].sort((a, b) => (a.hypothesis.id < b.hypothesis.id ? -1 : 1))[i % list.length]!);
}

/** Draws the unknowns within about two standard deviations of their ranges. */
export function drawCircuit(candidate: Candidate, draw: () => number): DrawnCircuit {
  const z = Float64Array.from({ length: PARAMETER_COUNT }, () => Math.max(-2, Math.min(2, normal(draw)))), x = physical(candidate, z, new Float64Array(PARAMETER_COUNT));
  const predicted = newPredictions(), { pins, fault } = candidate.hypothesis;
  const roleOf = (pin: number) => ROLES.findIndex((role) => pins[role] === pin);
  predictInto(candidate, x, WHOLE_PLAN, ALL_GROUPS, predicted);
  return { name: `${candidate.hypothesis.id} ${candidate.family} pull ${candidate.pull}`, candidate, predicted, x, roleOf, description: describeMachine(candidate, x, (fault.pins ?? []).map(roleOf)) };
}

export function describeMachine(c: Candidate, x: Float64Array, at: readonly number[]): Description {
  const value = (place: keyof typeof P) => x[P[place]]!;
  const share = (v: number) => Math.min(0.998, Math.max(0.002, v));
  return {
    family: c.family, pull: c.pull, fault: c.code, at, brokenEnd: c.breakEnd,
    battery: value("battery"), fed: c.suppliedByBattery ? value("battery") : value("supply"), rail: value("rail"),
    supplySource: value("supplySource"), supplyBleed: value("supplyBleed"), pullOhms: value("pull"), railOff: value("railOff"), batteryOff: value("batteryOff"), faultOhms: value("fault"),
    track: value("track"), wiper: value("wiper"), share: c.tap ? [value("rest"), value("full")] : [share(value("rest")), share(value("full"))],
    internal: value("internal"), leak: value("leak"), clamp: value("clamp"), dropSupply: value("dropSupply"), dropSignal: value("dropSignal"),
    loadAmperes: value("load"), driveLow: value("driveLow"), high: value("high"),
  };
}

export const METER = DEFAULT_METER;
