import { vocabulary, type Expect, type Setup } from "@/lib/diagnosis";
import { beliefs } from "@/lib/diagnosis/assess";
import type { Candidate } from "@/lib/diagnosis/circuit/candidate";
import { P, PARAMETER_COUNT } from "@/lib/diagnosis/circuit/parameters";
import { ALL_GROUPS, newPredictions, predictInto, WHOLE_PLAN } from "@/lib/diagnosis/circuit/predict";
import { physical } from "@/lib/diagnosis/inference/misfit";
import { normal, pick, reading, type DrawnMachine } from "./draw-machine";

/** What a test wants of a machine: which build, and values by their place in the engine's list of unknowns, SI units. */
export interface Wanted {
  readonly name: string;
  readonly is: (c: Candidate) => boolean;
  readonly values: Readonly<Partial<Record<keyof typeof P, number>>>;
  readonly expect?: Expect;
  /** Builds to choose from; those of an unknown device, or of the entry, when absent. */
  readonly among?: readonly Candidate[];
}

/** A machine as wanted: the order of its pins is drawn, and what is not stated lies within one standard deviation of the usual. */
export function wideMachine(w: Wanted, draw: () => number): DrawnMachine & { readonly x: Float64Array } {
  const setup: Setup = { pins: ["1", "2", "3"], ...(w.expect ? { expect: w.expect } : {}) };
  const candidate = pick((w.among ?? beliefs(setup, []).map((b) => b.candidate)).filter(w.is), draw);
  const z = Float64Array.from({ length: PARAMETER_COUNT }, () => Math.max(-1, Math.min(1, normal(draw)))), x = physical(candidate, z, new Float64Array(PARAMETER_COUNT));
  for (const [name, value] of Object.entries(w.values)) x[P[name as keyof typeof P]] = value;
  const p = newPredictions(), { kind, pins, fault } = candidate.hypothesis;
  predictInto(candidate, x, WHOLE_PLAN, ALL_GROUPS, p);
  return { setup, x, truth: { kind, pins, fault }, drawn: { candidate, z }, readings: Object.fromEntries(vocabulary().map((check) => [check.code, reading(check, p, draw)])) };
}
