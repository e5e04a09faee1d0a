import type { CheckSpec, PinNumber } from "../types";
import { joinsTwo, SIGNAL, type Candidate } from "./candidate";
import { terminalFor } from "./controller";
import { controllerClass } from "./parameters";

/**
 * A parted harness with the power off falls into parts that have no unknown in common: each cavity with its wire and the
 * controller's terminal behind it, or two cavities together where their wires touch. A part that two candidates share is
 * the same for both, so that its readings need to be fitted once only.
 */
export interface HarnessPart {
  /** Which readings speak of it: a place in SCOPES. */
  readonly scope: number;
  /** Parts of the same name expect the same. */
  readonly key: string;
}

/** Bits of pins 1 to 3. */
const bit = (pin: PinNumber) => 1 << (pin - 1);
/** Every pin. */
export const ALL_PINS = 7;

/** One cavity, the insulation between two, or two that touch. */
export const SCOPES: readonly { readonly pins: number; readonly apart: boolean }[] = [
  ...[1, 2, 4].map((pins) => ({ pins, apart: false })),
  ...[3, 6, 5].map((pins) => ({ pins, apart: true })),
  ...[3, 6, 5].map((pins) => ({ pins, apart: false })),
];

/** Whether a reading of the harness with the power off speaks of a scope. */
export function inScope(spec: CheckSpec, scope: number): boolean {
  const { pins, apart } = SCOPES[scope]!, red = bit(spec.red as PinNumber), black = typeof spec.black === "number" ? bit(spec.black) : red;
  if (apart) return (red | black) === pins && red !== black;
  return ((red | black) & ~pins) === 0;
}

/** The bits of the pins at which an unknown of the harness sits: of the terminal `role`, or of the fault when it is -1. */
export function pinsOf(c: Candidate, role: number): number {
  let pins = 0;
  for (let own = 0; own < 3; own++) if (role < 0 ? c.at === own || c.at2 === own : terminalFor(c, own) === role) pins |= bit(c.pinOf[own]!);
  return pins;
}

function cavityKey(c: Candidate, pin: PinNumber): string {
  const role = c.pinOf.indexOf(pin), terminal = terminalFor(c, role);
  const feed = terminal !== SIGNAL ? terminal : c.code === "pull-missing" ? "lost" : `${c.pull} ${controllerClass(c)}`;
  return `${pin} ${feed} ${c.at === role || c.at2 === role ? c.code : ""}`;
}

const lists = new WeakMap<Candidate, readonly HarnessPart[]>();

/** The parts of a candidate's harness, cavities first. */
export function harnessParts(c: Candidate): readonly HarnessPart[] {
  let list = lists.get(c);
  if (!list) lists.set(c, list = partsOf(c));
  return list;
}

function partsOf(c: Candidate): readonly HarnessPart[] {
  const touching = joinsTwo(c.code) ? pinsOf(c, -1) : 0;
  return SCOPES.flatMap(({ pins, apart }, scope): HarnessPart[] => {
    const held = ([1, 2, 3] as const).filter((pin) => pins & bit(pin));
    if (apart) return pins === touching ? [] : [{ scope, key: `apart ${scope}` }];
    const whole = held.length === 1 ? (pins & touching) === 0 : pins === touching;
    return whole ? [{ scope, key: held.map((pin) => cavityKey(c, pin)).join("+") }] : [];
  });
}
