import { parseCheck } from "./checks";
import type { CheckSpec, Reading, Setup } from "./types";

interface Problem { readonly code: string; readonly message: string; readonly where: string }

/** Widest numbers a hand-held meter can show, by unit: a lower and an upper bound in SI units. */
const BOUNDS: Readonly<Record<Exclude<CheckSpec["unit"], "word">, readonly [number, number]>> = { ohm: [-1, 1e9], volt: [-1000, 1000], hertz: [0, 1e7], ratio: [0, 1] };

/** First thing wrong with a setup and its readings, or null. The words say what to enter instead. */
export function validate(setup: Setup, readings: readonly Reading[]): Problem | null {
  if (setup.pins.length !== 3 || new Set(setup.pins).size !== 3) return { code: "three-pins-needed", message: "Give three different pin labels.", where: "setup.pins" };
  const e = setup.expect;
  if (e && new Set([e.pins.supply, e.pins.ground, e.pins.signal]).size !== 3) return { code: "entry-pins-not-distinct", message: "The entry must name three different pins for supply, ground and signal.", where: "setup.expect.pins" };
  for (let i = 0; i < readings.length; i++) {
    const problem = readingProblem(readings[i]!, `readings.${i}`);
    if (problem) return problem;
  }
  return null;
}

function readingProblem([check, value]: Reading, where: string): Problem | null {
  const spec = parseCheck(check);
  if (!spec) return { code: "unknown-check", message: `There is no check named "${String(check).slice(0, 60)}".`, where };
  if (typeof value === "string") {
    return spec.words.includes(value) ? null : { code: "word-not-of-this-check", message: `"${value.slice(0, 20)}" is no answer to ${check}.${spec.words.length > 0 ? ` Words it takes: ${spec.words.join(", ")}.` : ""}`, where };
  }
  if (spec.unit === "word") return { code: "word-needed", message: `${check} is answered with a word: ${spec.words.join(", ")}.`, where };
  const [low, high] = BOUNDS[spec.unit];
  return Number.isFinite(value) && value >= low && value <= high ? null : { code: "number-out-of-range", message: `${check} takes a number from ${low} to ${high}.`, where };
}
