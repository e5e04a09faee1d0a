import { operatingPoint } from "../support/spice";
import type { Probe } from "./spice-checks";

/** Many circuits fit into one netlist; a run of this many takes some tens of milliseconds. */
const BATCH = 150;

/** Node volts of all probes, by the simulator's names. */
export async function solveProbes(probes: readonly Probe[]): Promise<(node: string) => number> {
  const volts = new Map<string, number>();
  for (let from = 0; from < probes.length; from += BATCH) {
    const lines = probes.slice(from, from + BATCH).flatMap((p) => p.circuit.lines);
    for (const [node, v] of await operatingPoint(lines)) volts.set(node, v);
  }
  return (node) => {
    const v = volts.get(node.toLowerCase());
    if (v === undefined) throw new Error(`no node ${node}`);
    return v;
  };
}
