import { Simulation } from "eecircuit-engine";

let started: Promise<Simulation> | null = null;

/** The simulator takes a while to start and holds one circuit at a time: one for the process. */
function simulator(): Promise<Simulation> {
  started ??= (async () => {
    const simulation = new Simulation();
    await simulation.start();
    return simulation;
  })();
  return started;
}

/**
 * Operating point of a netlist in a general-purpose circuit simulator (SPICE), volts by lower-case node name.
 * @throws Error when the simulator reports anything: a failed solve leaves the previous run's data in place, and does not throw itself.
 */
export async function operatingPoint(lines: readonly string[]): Promise<ReadonlyMap<string, number>> {
  const simulation = await simulator();
  // Default tolerances (0.1 %) are as wide as the comparison; the first line of a netlist is its title.
  simulation.setNetList(["drawn networks", ...lines, ".options reltol=1e-7 vntol=1e-9 abstol=1e-15", ".op", ".end", ""].join("\n"));
  const result = await simulation.runSim();
  const problems = simulation.getError().filter((line) => line.trim() !== "");
  if (problems.length > 0 || result.dataType !== "real") throw new Error(`simulator: ${problems.join("; ")}`);
  return new Map(result.data.filter(({ type }) => type === "voltage").map(({ name, values }) => [name.replace(/^v\((.*)\)$/, "$1"), values[0] ?? NaN]));
}
