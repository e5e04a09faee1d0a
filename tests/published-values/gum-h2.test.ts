import { describe, expect, it } from "vitest";
import { combinedUncertainty } from "@/lib/units";

/**
 * JCGM 100:2008, H.2: resistance, reactance and impedance from simultaneous readings of voltage, current and phase.
 * Source: inputs and results read in a reproduction; the raw rows are from memory and reproduce every figure.
 */
const ROWS = [[5.007, 19.663, 1.0456], [4.994, 19.639, 1.0438], [5.005, 19.64, 1.0468], [4.99, 19.685, 1.0428], [4.999, 19.678, 1.0433]] as const;

const column = (index: 0 | 1 | 2) => ROWS.map((row) => row[index]);
const mean = (values: readonly number[]) => values.reduce((sum, value) => sum + value, 0) / values.length;

/** Covariance of two means. */
function covariance(a: readonly number[], b: readonly number[]): number {
  const [ma, mb] = [mean(a), mean(b)];
  return a.reduce((sum, value, i) => sum + (value - ma) * ((b[i] ?? NaN) - mb), 0) / (a.length * (a.length - 1));
}

const inputs = [column(0), column(1).map((milliamps) => milliamps / 1000), column(2)] as const;
const u = inputs.map((input) => Math.sqrt(covariance(input, input)));
const correlation = (i: number, j: number) => covariance(inputs[i] ?? [], inputs[j] ?? []) / ((u[i] ?? NaN) * (u[j] ?? NaN));
const [V, I, phi] = inputs.map(mean) as [number, number, number];

function uncertainty(sensitivities: readonly [number, number, number]): number {
  return combinedUncertainty(sensitivities.map((sensitivity, i) => ({ u: u[i] ?? NaN, sensitivity })), correlation);
}

describe("JCGM 100 H.2: correlated inputs", () => {
  it("has the printed means, uncertainties and correlations", () => {
    expect(V).toBeCloseTo(4.999, 3);
    expect(I * 1000).toBeCloseTo(19.661, 3);
    expect(phi).toBeCloseTo(1.04446, 5);
    expect(u[0]).toBeCloseTo(0.0032, 4);
    expect((u[1] ?? NaN) * 1000).toBeCloseTo(0.0095, 4);
    expect(u[2]).toBeCloseTo(0.00075, 5);
    expect(correlation(0, 1)).toBeCloseTo(-0.36, 2);
    expect(correlation(0, 2)).toBeCloseTo(0.86, 2);
    expect(correlation(1, 2)).toBeCloseTo(-0.65, 2);
  });

  it("R = 127.732 (0.071) ohm", () => {
    expect((V / I) * Math.cos(phi)).toBeCloseTo(127.732, 3);
    expect(uncertainty([Math.cos(phi) / I, (-V * Math.cos(phi)) / I ** 2, (-V / I) * Math.sin(phi)])).toBeCloseTo(0.071, 3);
  });

  it("X = 219.847 (0.2956) ohm, printed as 0.295", () => {
    expect((V / I) * Math.sin(phi)).toBeCloseTo(219.847, 3);
    expect(uncertainty([Math.sin(phi) / I, (-V * Math.sin(phi)) / I ** 2, (V / I) * Math.cos(phi)])).toBeCloseTo(0.2956, 3);
  });

  it("Z = 254.260 (0.236) ohm", () => {
    expect(V / I).toBeCloseTo(254.26, 2);
    expect(uncertainty([1 / I, -V / I ** 2, 0])).toBeCloseTo(0.236, 3);
  });
});
