import { beforeAll, describe, expect, it } from "vitest";
import { meterLimit, vocabulary, type CheckSpec } from "@/lib/diagnosis";
import { P } from "@/lib/diagnosis/circuit/parameters";
import { ALL_GROUPS, CHECK_INDEX, newPredictions, predictInto, WHOLE_PLAN } from "@/lib/diagnosis/circuit/predict";
import { drawer } from "../support/draw";
import { autoranged, deviceProbes, STRAIGHT, straightProbe, voltsAt, type Probe } from "../engine/spice-checks";
import { drawCircuit, everyBuild, type DrawnCircuit } from "../engine/drawn-circuits";
import { solveProbes } from "../engine/solve-probes";
import { ohmsShown } from "../support/machine-netlist";
import { SLOW } from "../support/slow";

/**
 * What the engine expects of every straight check, against a general-purpose circuit simulator (SPICE): wires, loose ends, harness
 * cold and live, the parted device. Netlists are written from the description of the machine (tests/support/machine-netlist.ts),
 * not by the engine's network. Every family, fault place and pull, with unknowns drawn by a fixed seed.
 */
const draw = drawer(31_415);
const MAX_OHMS = 60e6, NEAR = 0.12;

/** Ohms through junctions may be out by this many of the standard deviations that the model gives itself. */
const JUNCTIONS_OUT = 2.5;

/** Agreement within the meter's limits at one of the values that the simulator's meter may show; OL on both sides; near the end of all ranges either will do. */
function agrees(check: CheckSpec, circuit: DrawnCircuit, references: readonly number[]): void {
  const i = CHECK_INDEX.get(check.code)!, { predicted } = circuit, ours = predicted.value[i]!, says = `${circuit.name} ${check.code}: ${ours} against ${references}`;
  if (check.unit === "ohm") {
    if (references.some((ohms) => Math.abs(Math.log(ohms / MAX_OHMS)) < NEAR)) return;
    if (references[0]! > MAX_OHMS) return expect(predicted.word[i], says).toBeGreaterThan(0.99);
    expect(predicted.word[i], says).toBeLessThan(0.01);
  }
  const slack = (reference: number) => (check.unit === "ohm" ? JUNCTIONS_OUT * reference : 1) * predicted.slack[i]!;
  expect(references.some((reference) => Math.abs(ours - reference) <= meterLimit(check, reference) + slack(reference)), says).toBe(true);
}

describe("straight checks of every build against SPICE", () => {
  const circuits = everyBuild().map((c) => drawCircuit(c, draw));
  let volts: (node: string) => number;
  const probes = new Map<string, Probe>();
  const key = (k: number, check: CheckSpec) => `${k} ${check.code}`;

  beforeAll(async () => {
    circuits.forEach((c, k) => STRAIGHT.forEach((check) => probes.set(key(k, check), straightProbe(c.description, check, c.roleOf))));
    volts = await solveProbes([...probes.values()]);
  }, SLOW.timeout);

  it("has every finding of every family", () => {
    expect(circuits.length).toBeGreaterThan(250);
    expect(new Set(circuits.map(({ candidate }) => `${candidate.family} ${candidate.code}`)).size).toBe(4 * 10 + 4 * 3);
  });

  it.each(STRAIGHT.map((check) => [check.code, check] as const))("%s", (_, check) => {
    circuits.forEach((c, k) => {
      const probe = probes.get(key(k, check))!, across = voltsAt(probe, volts);
      agrees(check, c, [check.unit === "ohm" ? ohmsShown(across, probe.range) : across]);
    });
  });
});

describe("the end of the ohms ranges", () => {
  // Source: README of the bench, a meter that shows ohms up to 60 megohm; an open collector's leak is all that the meter sees there.
  it.each([[30e6, 0], [55e6, 0], [70e6, 1], [100e6, 1]] as const)("a leak of %d ohm is OL with chance %d", (ohms, chance) => {
    const { candidate, x, roleOf } = drawCircuit(everyBuild().find(({ family, code }) => family === "open-collector" && code === "none")!, draw), p = newPredictions();
    const pin = (role: number) => [1, 2, 3].find((n) => roleOf(n) === role)!;
    x[P.leak] = ohms;
    predictInto(candidate, x, WHOLE_PLAN, ALL_GROUPS, p);
    expect(p.word[CHECK_INDEX.get(`res:device:${pin(2)}-${pin(1)}@rest`)!]).toBeCloseTo(chance, 1);
  });
});

describe("ohms of the parted device against SPICE", () => {
  const bare = ["none", "wiper-open", "track-open"];
  const builds = everyBuild().filter(({ code, pull, family }) => bare.includes(code) && (pull === "down" || family === "open-collector"));
  const circuits = builds.flatMap((c) => Array.from({ length: 6 }, () => drawCircuit(c, draw)));
  const checks = vocabulary().filter(({ place }) => place === "device");
  const probes = circuits.map((c) => checks.map((check) => deviceProbes(c.description, check, c.roleOf)));
  let volts: (node: string) => number;

  beforeAll(async () => { volts = await solveProbes(probes.flat(2)); }, SLOW.timeout);

  it("covers the four families and the breaks of a track", () => {
    expect(new Set(circuits.map(({ candidate: c }) => `${c.family} ${c.code} ${c.breakEnd}`)).size).toBeGreaterThanOrEqual(7);
  });

  it.each(checks.map((check, i) => [check.code, check, i] as const))("%s", (_, check, i) => {
    circuits.forEach((c, k) => agrees(check, c, autoranged(c.description, probes[k]![i]!, volts)));
  });
});
