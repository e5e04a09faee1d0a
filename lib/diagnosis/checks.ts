import { WIRE_COLOURS, type CheckSpec, type FaultMessage, type MachineState, type MeterFunction, type PinNumber, type Position, type SymbolValue, type Terminal } from "./types";

const PINS = [1, 2, 3] as const satisfies readonly PinNumber[];
const PAIRS = [[1, 2], [2, 3], [1, 3]] as const satisfies readonly (readonly [PinNumber, PinNumber])[];
const POSITIONS = ["rest", "full"] as const satisfies readonly Position[];

/** What each place needs of the machine: a resistance is only ever read with the power off. */
const DEVICE_PARTED: MachineState = { deviceParted: true, controllerParted: null, powerOn: false };
const BOTH_PARTED: MachineState = { deviceParted: true, controllerParted: true, powerOn: false };
const HARNESS_COLD: MachineState = { deviceParted: true, controllerParted: false, powerOn: false };
const HARNESS_LIVE: MachineState = { deviceParted: true, controllerParted: false, powerOn: true };
const MATED_LIVE: MachineState = { deviceParted: false, controllerParted: false, powerOn: true };
const ANY: MachineState = { deviceParted: null, controllerParted: null, powerOn: null };
const POWERED: MachineState = { deviceParted: null, controllerParted: null, powerOn: true };

const UNIT = { ohms: "ohm", "dc-volts": "volt", "ac-volts": "volt", hertz: "hertz", duty: "ratio", watch: "word", grip: "word", look: "word" } as const satisfies Record<MeterFunction, CheckSpec["unit"]>;
const WORDS: Record<MeterFunction, readonly SymbolValue[]> = {
  ohms: ["OL"], "dc-volts": [], "ac-volts": [], hertz: ["none"], duty: ["none"], watch: ["smooth", "jumps", "still"], grip: ["grips", "loose"], look: [],
};

/** Failure mode indicators run from 0 to 31 (SAE J1939-73). */
const MESSAGES: readonly FaultMessage[] = Array.from({ length: 32 }, (_, i): FaultMessage => `FMI ${i}`);

interface Build { place: CheckSpec["place"]; meter: MeterFunction; red: Terminal; black: Terminal; position?: Position; state: MachineState; optional?: boolean }

function spec(code: string, b: Build): CheckSpec {
  return { code, place: b.place, meter: b.meter, unit: UNIT[b.meter], red: b.red, black: b.black, position: b.position ?? null, state: b.state, optional: b.optional ?? false, words: WORDS[b.meter] };
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

/**
 * Readings that nobody is asked for, but that may be at hand: the actuator half way, and the AC part of a pulsing signal,
 * taken at rest.
 */
function optionalChecks(): CheckSpec[] {
  const mated = (code: string, meter: MeterFunction, red: PinNumber, position: Position) => spec(code, { place: "mated", meter, red, black: "gnd", position, state: MATED_LIVE, optional: true });
  return [
    ...PAIRS.flatMap(([a, b]) => [[a, b], [b, a]] as const).map(([red, black]) => spec(`res:device:${red}-${black}@half`, { place: "device", meter: "ohms", red, black, position: "half", state: DEVICE_PARTED, optional: true })),
    ...PINS.flatMap((a) => [mated(`volt:mated:${a}-gnd@half`, "dc-volts", a, "half"), mated(`duty:mated:${a}@half`, "duty", a, "half")]),
    ...PINS.map((a) => mated(`ac:mated:${a}`, "ac-volts", a, "rest")),
  ];
}

/** Every check that may be proposed to anybody, in a fixed order. */
const PLANNED: readonly CheckSpec[] = [
  spec("volt:battery", { place: "battery", meter: "dc-volts", red: "battery", black: "gnd", state: POWERED }),
  ...deviceChecks(), ...harnessChecks(), ...matedChecks(),
  ...PINS.map((a) => spec(`fit:contact:${a}`, { place: "contact", meter: "grip", red: a, black: a, state: DEVICE_PARTED })),
  ...wireChecks(),
];

/** What is seen without a meter: weak evidence, weighed apart from the circuits (hints.ts). */
const HINTS: readonly CheckSpec[] = [
  ...PINS.map((a): CheckSpec => ({ ...spec(`colour:${a}`, { place: "colour", meter: "look", red: a, black: a, state: ANY, optional: true }), words: WIRE_COLOURS })),
  { ...spec("fmi:controller", { place: "controller", meter: "look", red: "gnd", black: "gnd", state: ANY, optional: true }), words: MESSAGES },
];

/** How many of the checks are proposed to anybody: the first ones of the list. */
export const PLANNED_COUNT = PLANNED.length;

/** Every check that is compared with circuits, the optional ones last. */
export const ALL_CHECKS: readonly CheckSpec[] = [...PLANNED, ...optionalChecks()];

const BY_CODE = new Map([...ALL_CHECKS, ...HINTS].map((c) => [c.code, c]));

/** The check named by a code such as "res:device:1-2@rest", or null when the vocabulary has no such check. */
export function parseCheck(code: string): CheckSpec | null {
  return BY_CODE.get(code) ?? null;
}

/** The checks that may be proposed to this setup: the vocabulary less what cannot be done here. */
export function vocabulary(setup?: { readonly excluded?: readonly string[]; readonly proposeOptional?: boolean }): readonly CheckSpec[] {
  const excluded = new Set(setup?.excluded ?? []), open = setup?.proposeOptional ? ALL_CHECKS : PLANNED;
  return excluded.size === 0 ? open : open.filter((c) => !excluded.has(c.code));
}

/** Readings that may be entered although nobody is asked for them. */
export const optionalVocabulary = (): readonly CheckSpec[] => [...ALL_CHECKS.slice(PLANNED_COUNT), ...HINTS];
