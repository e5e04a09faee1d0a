import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { exp, ln, log2, norm, square } from "./numerics";

/** Difference in units of the last place of the reference. */
function lastPlaces(value: number, reference: number): number {
  return value === reference ? 0 : Math.abs(value - reference) / Math.max(Math.abs(reference) * 2 ** -52, 5e-324);
}

const any = fc.double({ min: -745, max: 709.7, noNaN: true });
const positive = fc.double({ min: 5e-324, max: 1.7e308, noNaN: true });

describe("exponential and logarithms against the platform's own", () => {
  it("agree within two units in the last place", () => {
    fc.assert(fc.property(any, positive, fc.double({ min: 0.5, max: 2, noNaN: true }), (x, y, near) => {
      expect(lastPlaces(exp(x), Math.exp(x))).toBeLessThanOrEqual(2);
      expect(lastPlaces(exp(x / 1000), Math.exp(x / 1000))).toBeLessThanOrEqual(2);
      expect(lastPlaces(ln(y), Math.log(y))).toBeLessThanOrEqual(2);
      expect(lastPlaces(ln(near), Math.log(near))).toBeLessThanOrEqual(2);
      expect(lastPlaces(log2(near), Math.log2(near))).toBeLessThanOrEqual(2);
    }), { numRuns: 5000 });
  });

  it("have the same ends", () => {
    for (const x of [0, -0, Infinity, -Infinity, NaN, 710, -746]) expect(exp(x)).toBe(Math.exp(x));
    for (const x of [0, -1, 1, Infinity, NaN]) expect(ln(x)).toBe(Math.log(x));
    for (const k of [-1074, -1023, -1022, -1, 0, 1, 10, 1023]) expect(log2(2 ** k)).toBe(k);
    expect(norm(3, 4)).toBe(5);
    expect(norm(2, 3, 6)).toBe(7);
    expect(square(-1.5)).toBe(2.25);
  });
});

describe("the same bits in every JavaScript engine", () => {
  it("have this fingerprint over ten thousand values", () => {
    // Made of rounded operations alone, so a different fingerprint means a different formula, not a different machine.
    let state = 12345;
    const next = () => { state = (Math.imul(state, 1103515245) + 12345) >>> 0; return state / 2 ** 32; };
    const values = Array.from({ length: 10_000 }, () => [exp(60 * next() - 30), ln(1000 * next() + 1e-9), log2(next() + 1e-9)]).flat();
    const view = new DataView(new ArrayBuffer(8));
    const print = values.reduce((hash, value) => {
      view.setFloat64(0, value);
      return (Math.imul(Math.imul(hash, 31) + view.getUint32(0), 31) + view.getUint32(4)) >>> 0;
    }, 0);
    expect(print).toBe(1972435348);
  });
});
