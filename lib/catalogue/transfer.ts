import type { TransferTable } from "./entry-data";

interface Point { readonly from: number; readonly to: number }

/** A value read off the table, or which end it lies beyond; `nearest` is that end's pair. */
export type Conversion =
  | { readonly ok: true; readonly value: number }
  | { readonly ok: false; readonly code: "below-table" | "above-table" | "not-a-number"; readonly nearest: { readonly signal: number; readonly value: number } | null };

function between(a: Point, b: Point, at: number): number {
  // The ends are given back as they stand, so that a point of the table survives the way there and back to the last bit.
  if (at === a.from) return a.to;
  if (at === b.from) return b.to;
  const value = a.to + ((at - a.from) / (b.from - a.from)) * (b.to - a.to);
  // Rounding may overshoot an end by a bit, which would turn the curve back at the next point.
  return Math.min(Math.max(value, Math.min(a.to, b.to)), Math.max(a.to, b.to));
}

function interpolate(points: readonly Point[], at: number): { readonly ok: true; readonly value: number } | { readonly ok: false; readonly beyond: "first" | "last" } {
  const sorted = [...points].sort((a, b) => a.from - b.from);
  const first = sorted[0];
  const last = sorted.at(-1);
  if (!first || !last || at < first.from) return { ok: false, beyond: "first" };
  if (at > last.from) return { ok: false, beyond: "last" };
  const right = sorted.findIndex((p) => p.from >= at);
  const b = sorted[right] ?? last;
  return { ok: true, value: between(sorted[right - 1] ?? b, b, at) };
}

function convert(points: readonly Point[], at: number, pair: (p: Point) => { signal: number; value: number }): Conversion {
  if (!Number.isFinite(at)) return { ok: false, code: "not-a-number", nearest: null };
  const answer = interpolate(points, at);
  if (answer.ok) return answer;
  const sorted = [...points].sort((a, b) => a.from - b.from);
  const end = answer.beyond === "first" ? sorted[0] : sorted.at(-1);
  return { ok: false, code: answer.beyond === "first" ? "below-table" : "above-table", nearest: end ? pair(end) : null };
}

/**
 * Engineering value at a signal, linear between the table's points, never extrapolated.
 * @param signal in the table's signal unit: a share 0..1 for "ratio", volts for "volt"
 */
export function valueAt(table: TransferTable, signal: number): Conversion {
  return convert(table.points.map((p) => ({ from: p.signal, to: p.value })), signal, (p) => ({ signal: p.from, value: p.to }));
}

/**
 * Signal at an engineering value: the inverse of `valueAt`. "Below" and "above" speak of the value, which may fall as the signal rises.
 * @param value in the table's value unit
 */
export function signalAt(table: TransferTable, value: number): Conversion {
  return convert(table.points.map((p) => ({ from: p.value, to: p.signal })), value, (p) => ({ signal: p.to, value: p.from }));
}

/** Smallest and greatest signal and value the table covers. */
export function tableSpan(table: TransferTable): { readonly signal: readonly [number, number]; readonly value: readonly [number, number] } {
  const span = (numbers: readonly number[]): readonly [number, number] => [Math.min(...numbers), Math.max(...numbers)];
  return { signal: span(table.points.map((p) => p.signal)), value: span(table.points.map((p) => p.value)) };
}
