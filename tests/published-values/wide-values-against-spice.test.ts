import { beforeAll, describe, expect, it } from "vitest";
import { meterLimit, vocabulary, type CheckSpec } from "@/lib/diagnosis";
import { P } from "@/lib/diagnosis/circuit/parameters";
import { CHECK_INDEX, newPredictions, predictInto, ALL_GROUPS, WHOLE_PLAN } from "@/lib/diagnosis/circuit/predict";
import { describeMachine } from "../engine/drawn-circuits";
import { solveProbes } from "../engine/solve-probes";
import { deviceProbes, matedProbe, straightProbe, voltsAt, type Probe } from "../engine/spice-checks";
import { drawer } from "../support/draw";
import { ohmsShown, type Description, type Output } from "../support/machine-netlist";
import { SLOW } from "../support/slow";
import { wideMachine } from "../support/wide-machine";
import { DIVIDED, WIDE } from "../support/wide-values";

/**
 * The wide values against SPICE, with what they stand for drawn out in the netlist: two resistors on a divided input, resistors at
 * the ends of a track, a track that goes on past its tap. Sound machines, DC volts and the ohms of tracks, in both positions.
 */
const ROLES = ["supply", "ground", "signal"] as const;
const clampDuty = (duty: number) => Math.min(0.995, Math.max(0.005, duty));

interface Made { readonly name: string; readonly description: Description; readonly x: Float64Array; readonly roleOf: (pin: number) => number; readonly predicted: ReturnType<typeof newPredictions>; readonly family: string }

function make(wanted: (typeof WIDE)[number], i: number): Made[] {
  const { x, drawn: { candidate: c }, truth } = wideMachine(wanted, drawer(500 + i)), predicted = newPredictions();
  if (c.code !== "none") return [];
  predictInto(c, x, WHOLE_PLAN, ALL_GROUPS, predicted);
  const plain = describeMachine(c, x, []), divided = wanted.name.includes("pull-up and pull-down") ? { divided: DIVIDED, rail: DIVIDED.rail, railOff: 2 * x[P.railOff]! } : {};
  // 6.7 k in all: 1 k at each end, the wiper at `share` of the whole.
  const onTrack = (share: number) => (share * 6700 - 1000) / 4700;
  const ends = wanted.name.includes("ends of the track") ? { ends: [1000, 1000] as const, track: 4700, share: [onTrack(x[P.rest]!), onTrack(x[P.full]!)] as const } : {};
  return [{ name: wanted.name, family: c.family, x, predicted, roleOf: (pin) => ROLES.findIndex((role) => truth.pins[role] === pin), description: { ...plain, ...divided, ...ends } }];
}

/** Low and high of a pulse, or the volts of a voltage device at rest and at full. */
const outputs = ({ family, x }: Made): readonly [Output, Output] => (family === "voltage" ? [x[P.rest]!, x[P.full]!] : ["low", family === "open-collector" ? "released" : "high"]);

function probesFor(m: Made, check: CheckSpec): Probe[] {
  const role = check.place === "battery" ? 0 : m.roleOf(check.red as number);
  if (check.place === "harness") return [straightProbe(m.description, check, m.roleOf)];
  if (check.place === "device") return deviceProbes(m.description, check, m.roleOf);
  if (m.family === "potentiometer") return [matedProbe(m.description, role, check.position === "full" ? 1 : 0)];
  return outputs(m).map((output) => matedProbe(m.description, role, { output }));
}

function reference(m: Made, check: CheckSpec, probes: readonly Probe[], volts: (node: string) => number): number {
  const shown = probes.map((p) => voltsAt(p, volts));
  if (check.unit === "ohm") return ohmsShown(shown[0]!, probes[0]!.range);
  if (probes.length === 1) return shown[0]!;
  const full = check.position === "full", duty = clampDuty(m.x[full ? P.full : P.rest]!);
  return m.family === "voltage" ? shown[full ? 1 : 0]! : shown[0]! + duty * (shown[1]! - shown[0]!);
}

const CHECKS = vocabulary().filter((c) => c.meter === "dc-volts" && c.place === "mated" || c.place === "harness" || c.place === "device" && c.red < c.black);

describe("sound machines of wide values against SPICE", () => {
  const made = WIDE.flatMap(make), probes = made.map((m) => CHECKS.filter((c) => c.place !== "device" || m.family === "potentiometer").map((check) => ({ check, list: probesFor(m, check) })));
  let volts: (node: string) => number;
  beforeAll(async () => { volts = await solveProbes(probes.flat().flatMap(({ list }) => list)); }, SLOW.timeout);

  it("has every kind of machine, and tracks with a tap", () => {
    expect(new Set(made.map(({ family }) => family)).size).toBe(4);
    expect(made.filter(({ name }) => name.startsWith("tap at")).length).toBe(4);
    expect(made.filter(({ description }) => description.divided || description.ends).length).toBe(5);
  });

  it.each(made.map((m, i) => [m.name, m, i] as const))("%s", (_, m, i) => {
    for (const { check, list } of probes[i]!) {
      const index = CHECK_INDEX.get(check.code)!, ours = m.predicted.value[index]!, theirs = reference(m, check, list, volts);
      expect(Math.abs(ours - theirs), `${check.code}: ${ours} against ${theirs}`).toBeLessThanOrEqual(meterLimit(check, theirs) + m.predicted.slack[index]! * (check.unit === "ohm" ? theirs : 1));
    }
  });
});
