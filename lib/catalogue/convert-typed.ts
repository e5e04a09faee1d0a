import { formatQuantity, parseQuantity } from "@/lib/units";
import type { TransferTable } from "./entry-data";
import { type Conversion, signalAt, tableSpan, valueAt } from "./transfer";

export type ConvertedSide = "signal" | "value";

/** What came of a typed quantity: the pair it stands for, the other side in words; or a sentence about what is wrong with it. */
export type TypedConversion =
  | { readonly state: "empty" }
  | { readonly state: "converted"; readonly pair: { readonly signal: number; readonly value: number }; readonly other: string }
  | { readonly state: "refused"; readonly message: string };

/** A table of some points read off a sheet carries no more than about half a percent of its span. */
const DIGITS_SHARE = 1 / 200;

/** A quantity of the table's signal or value with as many digits as the table carries. */
export function tableQuantity(table: TransferTable, side: ConvertedSide, amount: number): string {
  const [low, high] = tableSpan(table)[side];
  return formatQuantity(amount, table[side].unit, { limit: (high - low) * DIGITS_SHARE });
}

function beyond(table: TransferTable, side: ConvertedSide, typed: number, answer: Conversion & { ok: false }): string {
  const other = side === "signal" ? "value" : "signal";
  const end = answer.nearest;
  if (!end) return "Enter a number.";
  const where = answer.code === "below-table" ? "below" : "above";
  const shown = formatQuantity(typed, table[side].unit);
  const ending = `${tableQuantity(table, side, end[side])} (${tableQuantity(table, other, end[other])})`;
  const meaning = side === "signal" ? " A healthy device does not go there: think of the wiring or the device." : "";
  return `${shown} lies ${where} the table, which ends at ${ending}.${meaning}`;
}

/**
 * Converts a quantity as typed ("27.3 %", "112 mm") to the other side of the table; never extrapolates.
 * @param side which side was typed
 */
export function convertTyped(table: TransferTable, side: ConvertedSide, text: string): TypedConversion {
  if (text.trim() === "") return { state: "empty" };
  const parsed = parseQuantity(text, table[side].unit);
  if (!parsed.ok) return { state: "refused", message: parsed.message };
  if (typeof parsed.value !== "number") return { state: "refused", message: `Enter a number; “${text.trim()}” has no place on the curve.` };
  const answer = side === "signal" ? valueAt(table, parsed.value) : signalAt(table, parsed.value);
  if (!answer.ok) return { state: "refused", message: beyond(table, side, parsed.value, answer) };
  const pair = side === "signal" ? { signal: parsed.value, value: answer.value } : { signal: answer.value, value: parsed.value };
  return { state: "converted", pair, other: tableQuantity(table, side === "signal" ? "value" : "signal", answer.value) };
}
