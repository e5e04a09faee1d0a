import type { ReadingValue } from "@/lib/diagnosis";
import { unitOf } from "../../support/run-check";

/** Keys of the check's keypad by their labels, in the order pressed; the last one ends the reading. */
export type Keys = readonly string[];

const WORD_KEYS: Readonly<Record<string, string>> = { smooth: "Smooth", jumps: "Jumps", still: "Still", grips: "Grips", loose: "Loose" };
const LABELS: Readonly<Record<string, string>> = { ".": "Decimal point", "-": "Plus or minus" };

/** What a technician reads off and presses for a value: kilohms from 1,000 ohms on, hertz, volts, percent. */
export function keysFor(check: string, value: ReadingValue): Keys {
  if (value === "OL") return ["OL, over range", "Enter"];
  if (value === "none") return ["No reading", "Enter"];
  if (typeof value === "string") return [WORD_KEYS[value] ?? value];
  const unit = unitOf(check), kilo = unit === "ohm" && Math.abs(value) >= 1000;
  const shown = Math.abs(unit === "ratio" ? value * 100 : kilo ? value / 1000 : value), text = String(Number(shown.toPrecision(6)));
  const digits = [...text].map((sign) => LABELS[sign] ?? sign);
  return [...digits, ...(value < 0 ? ["Plus or minus"] : []), ...(kilo ? ["Unit k\u03a9"] : []), "Enter"];
}
