import type { CheckSpec, MachineState, MeterFunction, PinNumber, Position, SymbolValue, Terminal } from "./types";

const PINS = [1, 2, 3] as const satisfies readonly PinNumber[];
const PAIRS = [[1, 2], [2, 3], [1, 3]] as const satisfies readonly (readonly [PinNumber, PinNumber])[];
const POSITIONS = ["rest", "full"] as const satisfies readonly Position[];

/** What each place needs of the machine: a resistance is only ever read with the power off. */
const DEVICE_PARTED: MachineState = { deviceParted: true, controllerParted: null, powerOn: false };
const BOTH_PARTED: MachineState = { deviceParted: true, controllerParted: true, powerOn: false };
const HARNESS_COLD: MachineState = { deviceParted: true, controllerParted: false, powerOn: false };
const HARNESS_LIVE: MachineState = { deviceParted: true, controllerParted: false, powerOn: true };
const MATED_LIVE: MachineState = { deviceParted: false, controllerParted: false, powerOn: true };
const POWERED: MachineState = { deviceParted: null, controllerParted: null, powerOn: true };

const UNIT = { ohms: "ohm", "dc-volts": "volt", hertz: "hertz", duty: "ratio", watch: "word", grip: "word" } as const satisfies Record<MeterFunction, CheckSpec["unit"]>;
const WORDS: Record<MeterFunction, readonly SymbolValue[]> = {
  ohms: ["OL"], "dc-volts": [], hertz: ["none"], duty: ["none"], watch: ["smooth", "jumps", "still"], grip: ["grips", "loose"],
};

interface Build { place: CheckSpec["place"]; meter: MeterFunction; red: Terminal; black: Terminal; position?: Position; state: MachineState }

function spec(code: string, b: Build): CheckSpec {
  return { code, place: b.place, meter: b.meter, unit: UNIT[b.meter], red: b.red, black: b.black, position: b.position ?? null, state: b.state, words: WORDS[b.meter] };
}

function deviceChecks(): CheckSpec[] {
  return POSITIONS.flatMap((position) =>
    PAIRS.flatMap(([a, b]) => [[a, b], [b, a]] as const).map(([red, black]) =>
      spec(`res:device:${red}-${black}@${position}`, { place: "device", meter: "ohms", red, black, position, state: DEVICE_PARTED })));
}

function harnessChecks(): CheckSpec[] {
  return [
    ...PINS.map((red) => spec(`res:harness:${red}-gnd`, { place: "harness", meter: "ohms", red, black: "gnd", state: HARNESS_COLD })),
    ...PINS.map((red) => spec(`volt:harness:${red}-gnd`, { place: "harness", meter: "dc-volts", red, black: "gnd", state: HARNESS_LIVE })),
    ...PAIRS.map(([red, black]) => spec(`volt:harness:${red}-${black}`, { place: "harness", meter: "dc-volts", red, black, state: HARNESS_LIVE })),
  ];
}

function wireChecks(): CheckSpec[] {
  return [
    ...PINS.map((red) => spec(`res:wire:${red}`, { place: "wire", meter: "ohms", red, black: red, state: BOTH_PARTED })),
    ...PINS.map((red) => spec(`res:loose:${red}-gnd`, { place: "loose", meter: "ohms", red, black: "gnd", state: BOTH_PARTED })),
    ...PAIRS.map(([red, black]) => spec(`res:loose:${red}-${black}`, { place: "loose", meter: "ohms", red, black, state: BOTH_PARTED })),
  ];
}

function matedChecks(): CheckSpec[] {
  const at = (code: string, meter: MeterFunction, red: PinNumber, position: Position) => spec(code, { place: "mated", meter, red, black: "gnd", position, state: MATED_LIVE });
  return [
    ...POSITIONS.flatMap((p) => PINS.flatMap((a) => [
      at(`volt:mated:${a}-gnd@${p}`, "dc-volts", a, p), at(`freq:mated:${a}@${p}`, "hertz", a, p), at(`duty:mated:${a}@${p}`, "duty", a, p),
    ])),
    ...PINS.map((a) => spec(`sweep:mated:${a}`, { place: "mated", meter: "watch", red: a, black: "gnd", state: MATED_LIVE })),
  ];
}

/** Every check a three-pin device can be given, in a fixed order. */
export const ALL_CHECKS: readonly CheckSpec[] = [
  spec("volt:battery", { place: "battery", meter: "dc-volts", red: "battery", black: "gnd", state: POWERED }),
  ...deviceChecks(), ...harnessChecks(), ...matedChecks(),
  ...PINS.map((a) => spec(`fit:contact:${a}`, { place: "contact", meter: "grip", red: a, black: a, state: DEVICE_PARTED })),
  ...wireChecks(),
];

const BY_CODE = new Map(ALL_CHECKS.map((c) => [c.code, c]));

/** The check named by a code such as "res:device:1-2@rest", or null when the vocabulary has no such check. */
export function parseCheck(code: string): CheckSpec | null {
  return BY_CODE.get(code) ?? null;
}

/** The checks open to this setup: the whole vocabulary less what cannot be done here. */
export function vocabulary(setup?: { readonly excluded?: readonly string[] }): readonly CheckSpec[] {
  const excluded = new Set(setup?.excluded ?? []);
  return excluded.size === 0 ? ALL_CHECKS : ALL_CHECKS.filter((c) => !excluded.has(c.code));
}
