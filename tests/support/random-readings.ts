import { optionalVocabulary, vocabulary, type Reading, type ReadingValue } from "@/lib/diagnosis";
import { pick, type DrawnMachine } from "./draw-machine";

type Draw = () => number;

/** The list in another order (Fisher and Yates). */
export function shuffled<T>(list: readonly T[], draw: Draw): T[] {
  const out = [...list];
  for (let i = out.length - 1; i > 0; i--) {
    const k = Math.floor(draw() * (i + 1));
    [out[i], out[k]] = [out[k]!, out[i]!];
  }
  return out;
}

/** Some readings of a drawn machine, in any order. */
export function someReadings(machine: DrawnMachine, count: number, draw: Draw): Reading[] {
  return shuffled(Object.entries(machine.readings), draw).slice(0, count);
}

const LIMITS = { ohm: [-1, 1e9], volt: [-1000, 1000], hertz: [0, 1e7], ratio: [0, 1] } as const;

/** A value of any size that the keypad takes, evenly over its decades now and then. */
function anyValue(check: ReturnType<typeof vocabulary>[number], draw: Draw): ReadingValue {
  if (check.unit === "word" || (check.words.length > 0 && draw() < 0.3)) return pick(check.words, draw);
  const [low, high] = LIMITS[check.unit];
  if (draw() < 0.2) return pick([low, high, 0], draw);
  return draw() < 0.5 ? low + draw() * (high - low) : Math.min(high, 10 ** (12 * draw() - 3));
}

const EVERY_CHECK = [...vocabulary(), ...optionalVocabulary()];

/** Readings that mean nothing: any check, any value it takes, the same check more than once. */
export function nonsense(count: number, draw: Draw): Reading[] {
  return Array.from({ length: count }, () => {
    const check = pick(EVERY_CHECK, draw);
    return [check.code, anyValue(check, draw)] as const;
  });
}
