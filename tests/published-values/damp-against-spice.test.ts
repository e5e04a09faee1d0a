import { beforeAll, describe, expect, it } from "vitest";
import { meterLimit, vocabulary, type CheckSpec } from "@/lib/diagnosis";
import { CHECK_INDEX } from "@/lib/diagnosis/circuit/predict";
import { drawCircuit, everyDampBuild, type DrawnCircuit } from "../engine/drawn-circuits";
import { solveProbes } from "../engine/solve-probes";
import { matedProbe, STRAIGHT, straightProbe, voltsAt, type Probe } from "../engine/spice-checks";
import { drawer } from "../support/draw";
import { ohmsShown } from "../support/machine-netlist";
import { SLOW } from "../support/slow";

/** A resistor between two cavities, 10 kohm to 1 Mohm (common practice for a wet connector), against SPICE: straight checks of every kind, volts of potentiometers when mated. */
const circuits = everyDampBuild().map(((draw) => (c) => drawCircuit(c, draw))(drawer(1_618)));
const MATED = vocabulary().filter((c) => c.place === "mated" && c.meter === "dc-volts");

const probeOf = (c: DrawnCircuit, check: CheckSpec): Probe => (check.place === "mated"
  ? matedProbe(c.description, c.roleOf(check.red as number), check.position === "full" ? 1 : 0) : straightProbe(c.description, check, c.roleOf));

describe("a damp connector against SPICE", () => {
  const cases = [...STRAIGHT, ...MATED].map((check) => ({ check, probes: circuits.filter((c) => check.place !== "mated" || c.candidate.family === "potentiometer").map((circuit) => ({ circuit, probe: probeOf(circuit, check) })) }));
  let volts: (node: string) => number;
  beforeAll(async () => { volts = await solveProbes(cases.flatMap(({ probes }) => probes.map(({ probe }) => probe))); }, SLOW.timeout);

  it("leaks between every pair of cavities, some 10 kohm to 1 Mohm", () => {
    expect(new Set(circuits.map(({ candidate: c }) => `${c.family} ${c.at} ${c.at2}`)).size).toBe(4 * 3);
    for (const { description } of circuits) expect(description.faultOhms > 8_000 && description.faultOhms < 1.2e6).toBe(true);
  });

  it.each(cases.map((c) => [c.check.code, c] as const))("%s", (_, { check, probes }) => {
    for (const { circuit, probe } of probes) {
      const i = CHECK_INDEX.get(check.code)!, across = voltsAt(probe, volts), theirs = check.unit === "ohm" ? ohmsShown(across, probe.range) : across, says = `${circuit.name} ${check.code}`;
      if (check.unit === "ohm" && theirs > 120e6) { expect(circuit.predicted.word[i], says).toBeGreaterThan(0.99); continue; }
      expect(Math.abs(circuit.predicted.value[i]! - theirs), `${says}: ${circuit.predicted.value[i]} against ${theirs}`).toBeLessThanOrEqual(meterLimit(check, theirs) + circuit.predicted.slack[i]!);
    }
  });
});
