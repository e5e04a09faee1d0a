import { MEASURED, measuredUnit, type Unit } from "./units";

export interface FormatOptions {
  /** Limit of error in the value's own unit (SI; a share for "ratio"): no digit below its first one is shown. */
  readonly limit?: number;
}

const MINUS = "\u2212";
const SPACE = "\u00a0";
/** Without a limit: four significant digits, as a 6000-count display has them, and every whole digit. */
const DIGITS = 4;

function powerOf(value: number): number {
  return value === 0 ? 0 : Number(Math.abs(value).toExponential(12).split("e")[1]);
}

/** Rounded to the place, by decimal exponent so that no binary dust is added. */
function roundTo(value: number, place: number): number {
  return Number(`${Math.round(scaleBy(value, place))}e${place}`);
}

/** Digits down to the given place; zeros at the end stay only when a limit says they are known. */
function digitsOf(value: number, place: number, known: boolean): string {
  const text = (known && place > 0 ? roundTo(value, place) : value).toFixed(Math.min(20, Math.max(0, -place)));
  return known || !text.includes(".") ? text : text.replace(/\.?0+$/, "");
}

type Prefix = readonly [power: number, letter: string];

/** Prefix with one to three digits before the point, and no zeros there that would pretend to be known. */
function prefixFor(value: number, place: number, known: boolean, shown: readonly Prefix[]): Prefix {
  const base: Prefix = shown.find(([power]) => power === 0) ?? [0, ""];
  const size = powerOf(value);
  // Down to a tenth the unit itself reads better than its thousandth: 0.15 V, but 12 mV.
  const small = shown[0] ?? base;
  const fitting = size === -1 ? base : shown.filter(([power]) => power <= size).at(-1) ?? small;
  if (value === 0 || (known && roundTo(value, place) === 0)) return base;
  // 470 known to hundreds is 0.5 kΩ; but no further up than one zero after the point.
  const larger = known && place > fitting[0] ? shown.find(([power]) => power >= place) : undefined;
  return larger && size >= larger[0] - 1 ? larger : fitting;
}

function signed(text: string): string {
  const bare = text.replace(/^-/, "");
  return text.startsWith("-") && /[1-9]/.test(bare) ? MINUS + bare : bare;
}

function scaleBy(value: number, power: number): number {
  return power === 0 ? value : Number((value / 10 ** power).toPrecision(15));
}

/**
 * Writes a value with its unit, no more digits than the limit of error lets anyone know, SI prefixes, a real
 * minus sign, U+03A9 and a no-break space. A share comes out in percent. Unknown (NaN) is "unknown", never 0.
 */
export function formatQuantity(value: number | "OL" | "none", unit: Unit, options: FormatOptions = {}): string {
  if (typeof value === "string") return value;
  if (!Number.isFinite(value)) return "unknown";
  const known = options.limit !== undefined && options.limit > 0 && Number.isFinite(options.limit);
  const measured = measuredUnit(unit);
  const percent = measured === "ratio" ? -2 : 0;
  const shown: readonly Prefix[] = measured ? MEASURED[measured].shown : [[0, ""]];
  const inShown = scaleBy(value, percent);
  const place = known ? powerOf(scaleBy(options.limit ?? 0, percent)) : powerOf(inShown) - (DIGITS - 1);
  const [power, letter] = prefixFor(inShown, place, known, shown);
  const digits = signed(digitsOf(scaleBy(inShown, power), place - power, known));
  const symbol = measured ? letter + MEASURED[measured].symbol : unit === "deg" ? "°" : unit;
  return symbol === "°" ? digits + symbol : digits + SPACE + symbol;
}
