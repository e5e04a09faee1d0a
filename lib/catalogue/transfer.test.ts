import fc from "fast-check";
import { describe, expect, it } from "vitest";
import type { TransferTable } from "./entry-data";
import { signalAt, tableSpan, valueAt } from "./transfer";

const boom: TransferTable = {
  signal: { name: "Duty", unit: "ratio" }, value: { name: "Height", unit: "mm" },
  points: [{ signal: 0.1, value: 0 }, { signal: 0.5, value: 200 }, { signal: 0.9, value: 800 }],
};

/** Strictly rising signals with values that rise or fall throughout. */
const tables: fc.Arbitrary<TransferTable> = fc
  .record({
    steps: fc.array(fc.record({ signal: fc.double({ min: 0.01, max: 5, noNaN: true }), value: fc.double({ min: 0.01, max: 500, noNaN: true }) }), { minLength: 1, maxLength: 12 }),
    start: fc.record({ signal: fc.double({ min: -5, max: 5, noNaN: true }), value: fc.double({ min: -500, max: 500, noNaN: true }) }),
    falling: fc.boolean(),
  })
  .map(({ steps, start, falling }) => {
    const points = [start];
    for (const step of steps) {
      const last = points.at(-1) ?? start;
      points.push({ signal: last.signal + step.signal, value: last.value + (falling ? -step.value : step.value) });
    }
    return { signal: { name: "s", unit: "volt" }, value: { name: "v", unit: "mm" }, points };
  });

const shares = fc.double({ min: 0, max: 1, noNaN: true });

function answer(conversion: ReturnType<typeof valueAt>): number {
  if (!conversion.ok) throw new Error(conversion.code);
  return conversion.value;
}

describe("transfer table", () => {
  it("interpolates linearly between points (worked by hand)", () => {
    expect(answer(valueAt(boom, 0.3))).toBeCloseTo(100, 9);
    expect(answer(valueAt(boom, 0.7))).toBeCloseTo(500, 9);
    expect(answer(signalAt(boom, 650))).toBeCloseTo(0.8, 9);
  });

  it("says which end lies nearest instead of extrapolating", () => {
    expect(valueAt(boom, 0.05)).toEqual({ ok: false, code: "below-table", nearest: { signal: 0.1, value: 0 } });
    expect(valueAt(boom, 0.95)).toEqual({ ok: false, code: "above-table", nearest: { signal: 0.9, value: 800 } });
    expect(signalAt(boom, 801)).toEqual({ ok: false, code: "above-table", nearest: { signal: 0.9, value: 800 } });
    expect(valueAt(boom, Number.NaN)).toEqual({ ok: false, code: "not-a-number", nearest: null });
  });

  it("gives every point of the table back exactly, both ways", () => {
    fc.assert(fc.property(tables, (table) => {
      for (const point of table.points) {
        expect(answer(valueAt(table, point.signal))).toBe(point.value);
        expect(answer(signalAt(table, point.value))).toBe(point.signal);
      }
    }));
  });

  it("comes back to the signal it started from", () => {
    fc.assert(fc.property(tables, shares, (table, share) => {
      const [low, high] = tableSpan(table).signal;
      const signal = Math.min(high, low + share * (high - low));
      expect(Math.abs(answer(signalAt(table, answer(valueAt(table, signal)))) - signal)).toBeLessThan(1e-6 * (high - low + 1));
    }));
  });

  it("is monotone: a greater signal never turns back", () => {
    fc.assert(fc.property(tables, shares, shares, (table, a, b) => {
      const { signal: [low, high] } = tableSpan(table);
      const at = (share: number) => answer(valueAt(table, Math.min(high, low + share * (high - low))));
      const rises = (table.points.at(-1)?.value ?? 0) > (table.points[0]?.value ?? 0);
      const [first, second] = [at(Math.min(a, b)), at(Math.max(a, b))];
      expect(rises ? second - first : first - second).toBeGreaterThanOrEqual(0);
    }));
  });

  it("stays within the ends of the table", () => {
    fc.assert(fc.property(tables, shares, (table, share) => {
      const { signal: [low, high], value: [least, most] } = tableSpan(table);
      const value = answer(valueAt(table, Math.min(high, low + share * (high - low))));
      expect(value).toBeGreaterThanOrEqual(least);
      expect(value).toBeLessThanOrEqual(most);
    }));
  });
});
