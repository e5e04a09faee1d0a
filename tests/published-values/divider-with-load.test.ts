import { describe, expect, it } from "vitest";
import { NodalNetwork } from "@/lib/diagnosis/network/solve";

/** Share of the supply at the wiper of a track of 10 kilohm, position x, loaded with track / k, from the engine's network. */
function wiperShare(x: number, k: number): number {
  const track = 10_000;
  const net = new NodalNetwork(2);
  net.reset(2);
  net.source(1, 0, 1, 1e-6);
  net.resistor(1, 2, track * (1 - x));
  net.resistor(2, 0, track * x);
  if (k > 0) net.resistor(2, 0, track / k);
  net.solve();
  return net.volts[2] ?? NaN;
}

/** Largest error against the unloaded divider over the travel, and where. */
function largestError(k: number): { error: number; at: number } {
  let worst = { error: 0, at: 0 };
  for (let step = 1; step < 10_000; step += 1) {
    const at = step / 10_000;
    const error = at - wiperShare(at, k);
    if (error > worst.error) worst = { error, at };
  }
  return worst;
}

describe("potentiometer as a divider with load: v/V = x / (1 + k x (1 - x)), k = track over load", () => {
  // Source: computed from the formula of the component handbooks.
  it.each([
    [0.01, 0.249532, 0.498753, 0.665188, 0.748596], [0.1, 0.245399, 0.487805, 0.652174, 0.736196],
    [0.5, 0.228571, 0.444444, 0.6, 0.685714], [1, 0.210526, 0.4, 0.545455, 0.631579],
  ] as const)("k = %d", (k, quarter, half, twoThirds, threeQuarters) => {
    expect(wiperShare(0.25, k)).toBeCloseTo(quarter, 6);
    expect(wiperShare(0.5, k)).toBeCloseTo(half, 6);
    expect(wiperShare(2 / 3, k)).toBeCloseTo(twoThirds, 6);
    expect(wiperShare(0.75, k)).toBeCloseTo(threeQuarters, 6);
  });

  it.each([[0.01, 0.001478, 0.667], [0.1, 0.014493, 0.669], [0.5, 0.066726, 0.678], [1, 0.121585, 0.689]] as const)("largest error for k = %d", (k, error, at) => {
    const worst = largestError(k);
    expect(worst.error).toBeCloseTo(error, 5);
    expect(worst.at).toBeCloseTo(at, 2);
  });

  it("stays under the published bounds for 10 kilohm: 0.15 % with 1 megohm, 0.75 % with 200 kilohm, 7.5 % with 20 kilohm", () => {
    // Source: component handbook, approximations; exact 0.148, 0.733 and 6.67 %.
    for (const [k, published, exact] of [[0.01, 0.0015, 0.00148], [0.05, 0.0075, 0.00733], [0.5, 0.075, 0.0667]] as const) {
      const { error } = largestError(k);
      expect(error).toBeLessThan(published);
      expect(error).toBeCloseTo(exact, 4);
    }
  });
});

describe("resistances of a potentiometer", () => {
  /** Ohms between two of A (1), W (3) and B (2), the third free: 1 mA fed in, volts read. */
  function between(a: number, b: number, x: number, wiper: number): number {
    const net = new NodalNetwork(4);
    net.reset(4);
    net.resistor(1, 4, 10_000 * (1 - x));
    net.resistor(4, 2, 10_000 * x);
    net.resistor(4, 3, wiper);
    net.resistor(b, 0, 1e-3);
    net.source(a, 0, 1e6, 1e9);
    net.solve();
    return ((net.volts[a] ?? NaN) - (net.volts[b] ?? NaN)) / ((1e6 - (net.volts[a] ?? NaN)) / 1e9);
  }

  it.each([0.05, 0.3, 0.7, 0.95])("R(AW) + R(WB) - R(AB) is twice the wiper's series resistance, at %d", (x) => {
    // Source: identity of three terminals, computed.
    expect(between(1, 3, x, 150) + between(3, 2, x, 150) - between(1, 2, x, 150)).toBeCloseTo(300, 2);
    expect(between(1, 2, x, 150)).toBeCloseTo(10_000, 2);
  });

  it("a voltmeter of 10 megohm reads a source of 2.5, 25 and 250 kilohm low by 0.025, 0.25 and 2.44 %", () => {
    // Source: computed from R / (R + 10 megohm).
    for (const [ohms, percent] of [[2500, 0.025], [25_000, 0.25], [250_000, 2.44]] as const) {
      const net = new NodalNetwork(1);
      net.reset(1);
      net.source(1, 0, 5, ohms);
      net.resistor(1, 0, 10e6);
      net.solve();
      expect(100 * (1 - (net.volts[1] ?? NaN) / 5)).toBeCloseTo(percent, 2);
    }
  });
});
