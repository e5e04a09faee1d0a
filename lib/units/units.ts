/**
 * Units a reading or a healthy value is typed in. The measured ones are kept in SI base units
 * (ohm, volt, hertz, metre; a duty or share from 0 to 1); any other text is an engineering unit
 * such as "mm", "bar" or "rpm" and keeps its own scale.
 */
export const MEASURED_UNITS = ["ohm", "volt", "hertz", "ratio", "metre"] as const;
export type MeasuredUnit = (typeof MEASURED_UNITS)[number];

/** A measured unit, or an engineering unit by its symbol; the second half keeps completion working. */
export type Unit = MeasuredUnit | (string & {});

export interface UnitFacts {
  readonly symbol: string;
  /** How a sentence names the reading. */
  readonly name: string;
  /** Powers of ten that may stand before the symbol, by letter. */
  readonly prefixes: ReadonlyMap<string, number>;
  /** Prefixes used when writing a value, smallest first. */
  readonly shown: readonly (readonly [power: number, letter: string])[];
  /** What to type, for error sentences. */
  readonly example: string;
}

const MICRO = [["u", -6], ["μ", -6], ["micro", -6]] as const;
const MILLI = [["m", -3], ["milli", -3]] as const;
const KILO = [["k", 3], ["K", 3], ["kilo", 3]] as const;
const MEGA = [["M", 6], ["meg", 6], ["mega", 6]] as const;

export const MEASURED: Readonly<Record<MeasuredUnit, UnitFacts>> = {
  ohm: {
    symbol: "Ω", name: "ohms", prefixes: new Map([...MICRO, ...MILLI, ...KILO, ...MEGA, ["G", 9], ["giga", 9]]),
    shown: [[-3, "m"], [0, ""], [3, "k"], [6, "M"], [9, "G"]], example: "4.7 kΩ, 4k7 or OL",
  },
  volt: {
    symbol: "V", name: "volts", prefixes: new Map([...MICRO, ...MILLI, ...KILO]),
    shown: [[-3, "m"], [0, ""], [3, "k"]], example: "4.98 V or -12 mV",
  },
  hertz: {
    symbol: "Hz", name: "hertz", prefixes: new Map([...KILO, ...MEGA]),
    shown: [[0, ""], [3, "k"], [6, "M"]], example: "500 Hz, 1.2 kHz or none",
  },
  ratio: { symbol: "%", name: "percent", prefixes: new Map(), shown: [[0, ""]], example: "27.3 % or none" },
  metre: {
    symbol: "m", name: "metres", prefixes: new Map([...MICRO, ...MILLI, ["c", -2], ...KILO]),
    shown: [[-3, "m"], [0, ""], [3, "k"]], example: "2.5 m or 112 mm",
  },
};

/** Spellings of each unit, lower case; the first is the one its group is known by. */
const SPELLINGS: readonly (readonly string[])[] = [
  ["ohm", "ω", "ohms", "r"],
  ["volt", "v", "volts", "vdc", "v dc", "dc v", "volts dc", "dc volts"],
  ["volt-ac", "vac", "v ac", "ac v", "volts ac", "ac volts", "v~"],
  ["hertz", "hz"],
  ["ratio", "%", "percent", "per cent", "pct"],
  ["metre", "m", "metres", "meter", "meters"],
  ["ampere", "a", "amp", "amps", "amperes"],
  ["farad", "f", "farads"], ["henry", "h", "henries"], ["watt", "w", "watts"],
  ["s", "sec", "second", "seconds"],
  ["mm", "millimetre", "millimetres", "millimeter", "millimeters"],
  ["cm", "centimetre", "centimetres", "centimeter", "centimeters"],
  ["deg", "°", "degree", "degrees"],
  ["°c", "degc", "deg c", "celsius"],
  ["bar", "bars"], ["kpa"], ["mpa"], ["psi"],
  ["l", "litre", "litres", "liter", "liters"],
  ["rpm", "r/min", "rev/min"],
  ["l/min", "lpm", "litres per minute", "liters per minute"],
  ["kn"], ["n"], ["nm", "n m", "n·m"], ["kg"], ["t", "tonne", "tonnes"], ["km/h", "kph"], ["m/s"], ["ms"],
];

const GROUP_OF = new Map(SPELLINGS.flatMap((group) => group.map((spelling) => [spelling, group[0] ?? spelling] as const)));

/** Known group of a spelling, or null: "Ohms" -> "ohm", "VAC" -> "volt-ac". */
export function unitGroup(spelling: string): string | null {
  return GROUP_OF.get(spelling.toLowerCase()) ?? null;
}

/** The measured unit that a unit's name or symbol stands for ("V" -> "volt"), or null for an engineering unit. */
export function measuredUnit(unit: Unit): MeasuredUnit | null {
  if (unit === "%") return null;
  const group = unitGroup(unit);
  return MEASURED_UNITS.find((known) => known === group) ?? null;
}
