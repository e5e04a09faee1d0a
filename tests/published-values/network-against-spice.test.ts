import { beforeAll, describe, expect, it } from "vitest";
import { NodalNetwork } from "@/lib/diagnosis/network/solve";
import { drawer } from "../support/draw";
import { operatingPoint } from "../support/spice";

/**
 * The engine's network solver against a general-purpose circuit simulator (SPICE in WebAssembly, default temperature 27 °C,
 * default junction conductance, emission coefficients from 1 to 2). Networks are drawn with a fixed seed.
 */
type Part =
  | { readonly type: "resistor"; readonly a: number; readonly b: number; readonly ohms: number }
  | { readonly type: "source"; readonly a: number; readonly b: number; readonly volts: number; readonly ohms: number }
  | { readonly type: "diode"; readonly a: number; readonly b: number; readonly saturation: number; readonly emission: number };
interface Network { readonly nodes: number; readonly parts: readonly Part[] }

const NETWORKS = 260;
const MOST_NODES = 8;
const draw = drawer(20_601);
const whole = (from: number, to: number) => from + Math.floor(draw() * (to - from + 1));
/** Evenly over the decades. */
const decades = (from: number, to: number) => from * (to / from) ** draw();

function pair(nodes: number): { a: number; b: number } {
  const a = whole(1, nodes);
  const b = whole(0, nodes - 1);
  return { a, b: b >= a ? b + 1 : b };
}

/** A tree of resistors, so that nothing floats, then more resistors, sources behind a resistance, and up to four diodes. */
function drawNetwork(index: number): Network {
  const nodes = whole(2, MOST_NODES);
  const tree = Array.from({ length: nodes }, (_, i): Part => ({ type: "resistor", a: i + 1, b: whole(0, i), ohms: decades(0.05, 10e6) }));
  const more = Array.from({ length: whole(0, 4) }, (): Part => ({ type: "resistor", ...pair(nodes), ohms: decades(0.05, 10e6) }));
  const sources = Array.from({ length: whole(1, 3) }, (): Part => ({ type: "source", ...pair(nodes), volts: 32 * draw() - 4, ohms: decades(0.02, 50e3) }));
  // Every third network is linear; saturation currents from a power diode's to a band-gap drop of several junctions.
  const diodes = Array.from({ length: index % 3 === 0 ? 0 : whole(1, 4) }, (): Part => ({ type: "diode", ...pair(nodes), saturation: decades(1e-18, 1e-8), emission: 1 + draw() }));
  return { nodes, parts: [...tree, ...more, ...sources, ...diodes] };
}

function solveOurs(network: Network): { settled: boolean; volts: number[] } {
  const net = new NodalNetwork(MOST_NODES);
  net.reset(network.nodes);
  for (const part of network.parts) {
    if (part.type === "resistor") net.resistor(part.a, part.b, part.ohms);
    else if (part.type === "source") net.source(part.a, part.b, part.volts, part.ohms);
    else net.diode(part.a, part.b, part.saturation, part.emission);
  }
  return { settled: net.solve(), volts: Array.from(net.volts.subarray(1, network.nodes + 1)) };
}

function netlist(network: Network, index: number): string[] {
  const node = (n: number) => (n === 0 ? "0" : `n${index}_${n}`);
  return network.parts.flatMap((part, k) => {
    const id = `${index}_${k}`;
    if (part.type === "resistor") return [`R${id} ${node(part.a)} ${node(part.b)} ${part.ohms}`];
    if (part.type === "source") return [`V${id} s${id} ${node(part.b)} ${part.volts}`, `R${id} s${id} ${node(part.a)} ${part.ohms}`];
    return [`.model m${id} D(IS=${part.saturation} N=${part.emission})`, `D${id} ${node(part.a)} ${node(part.b)} m${id}`];
  });
}

describe(`${NETWORKS} drawn networks against SPICE`, () => {
  const networks = Array.from({ length: NETWORKS }, (_, index) => drawNetwork(index));
  const theirs: (readonly number[])[] = [];

  beforeAll(async () => {
    for (let from = 0; from < NETWORKS; from += 20) {
      const batch = networks.slice(from, from + 20);
      const volts = await operatingPoint(batch.flatMap((network, k) => netlist(network, from + k)));
      batch.forEach((network, k) => theirs.push(Array.from({ length: network.nodes }, (_, n) => volts.get(`n${from + k}_${n + 1}`) ?? NaN)));
    }
  });

  it("has diodes in most of them, some conducting and some blocking", () => {
    const diodes = networks.flatMap(({ parts }, index) => parts.flatMap((part) => (part.type === "diode" ? [{ ...part, index }] : [])));
    const across = diodes.map(({ a, b, index }) => (a > 0 ? theirs[index]?.[a - 1] ?? NaN : 0) - (b > 0 ? theirs[index]?.[b - 1] ?? NaN : 0));
    expect(new Set(diodes.map(({ index }) => index)).size).toBeGreaterThan(NETWORKS / 2);
    expect(across.filter((volts) => volts > 0.2).length).toBeGreaterThan(50);
    expect(across.filter((volts) => volts < -0.2).length).toBeGreaterThan(50);
  });

  it.each(networks.map((network, index) => [index, network] as const))("network %d agrees within 0.1 % or 1 mV at every node", (index, network) => {
    const ours = solveOurs(network);
    expect(ours.settled).toBe(true);
    ours.volts.forEach((volts, n) => {
      const reference = theirs[index]?.[n] ?? NaN;
      expect(Math.abs(volts - reference), `node ${n + 1}: ${volts} against ${reference}`).toBeLessThanOrEqual(Math.max(0.001, Math.abs(reference) * 0.001));
    });
  });
});
