import type { Expect, Fault, Kind, PinAssignment, ReadingValue, Setup } from "@/lib/diagnosis";
import { DEFAULT_METER, meterLimit, vocabulary } from "@/lib/diagnosis";
import { beliefs } from "@/lib/diagnosis/assess";
import type { Candidate } from "@/lib/diagnosis/circuit/candidate";
import { PARAMETER_COUNT } from "@/lib/diagnosis/circuit/parameters";
import { ALL_GROUPS, CHECK_INDEX, newPredictions, predictInto, WHOLE_PLAN, type Predictions } from "@/lib/diagnosis/circuit/predict";
import { physical } from "@/lib/diagnosis/inference/misfit";
import { scalePrediction, unscale } from "@/lib/diagnosis/inference/observe";
import { resolutionAt } from "@/lib/diagnosis/meter";

/** A machine drawn from the engine's own model: a hypothesis by its prior, unknowns by their ranges, readings with a meter's error. */
export interface DrawnMachine {
  readonly setup: Setup;
  readonly truth: { readonly kind: Kind; readonly pins: PinAssignment; readonly fault: Fault };
  readonly readings: Readonly<Record<string, ReadingValue>>;
  /** What was drawn: the candidate and its unknowns, in standard deviations of their ranges. */
  readonly drawn: { readonly candidate: Candidate; readonly z: Float64Array };
}

type Draw = () => number;

/** A standard normal deviate (Box and Muller). */
export const normal = (draw: Draw) => Math.sqrt(-2 * Math.log(1 - draw())) * Math.cos(2 * Math.PI * draw());
export const pick = <T>(list: readonly T[], draw: Draw): T => list[Math.floor(draw() * list.length)]!;
const between = (low: number, high: number, draw: Draw) => low + (high - low) * draw();
const twoPlaces = (v: number) => Math.round(100 * v) / 100;

const PINS = ["1", "2", "3"] as const;
const ORDERS = [[1, 2, 3], [1, 3, 2], [2, 1, 3], [2, 3, 1], [3, 1, 2], [3, 2, 1]] as const;

/** What an entry may state; preferred values and spans of the trade (common practice: duty 5 to 95 %, 0.5 to 4.5 V, 1 k to 10 k). */
export function drawEntry(draw: Draw): Expect {
  const kind = pick(["potentiometer", "pwm", "voltage"] as const, draw), [supply, ground, signal] = pick(ORDERS, draw);
  const pins = { supply, ground, signal }, turned = draw() < 0.3;
  const span = (low: readonly [number, number], high: readonly [number, number]) => {
    const a = twoPlaces(between(...low, draw)), b = twoPlaces(between(...high, draw));
    return turned ? { rest: b, full: a } : { rest: a, full: b };
  };
  if (kind === "potentiometer") {
    const series = draw() < 0.3 ? { wiperSeriesOhms: 1000 } : {};
    return { kind, pins, supplyVolts: pick([5, 8, 10], draw), totalOhms: pick([1000, 2200, 4700, 10_000], draw), tolerancePercent: 20, signalRatio: span([0.05, 0.2], [0.7, 0.95]), ...series };
  }
  if (kind === "voltage") return { kind, pins, supplyVolts: 5, signalVolts: span([0.4, 1], [3.9, 4.6]) };
  return { kind, pins, supplyVolts: pick([5, 8, "battery"] as const, draw), output: pick(["open-collector", "open-collector", "push-pull"] as const, draw), frequencyHz: pick([130, 200, 250, 500, 1000], draw), duty: span([0.05, 0.2], [0.75, 0.93]) };
}

/** A setup: an unknown device, or one with an entry. */
export function drawSetup(draw: Draw, withEntry: boolean): Setup {
  return withEntry ? { pins: PINS, expect: drawEntry(draw) } : { pins: PINS };
}

function drawCandidate(setup: Setup, draw: Draw): Candidate {
  const list = beliefs(setup, []);
  let rest = draw();
  for (const b of list) if ((rest -= b.p) < 0) return b.candidate;
  return list[0]!.candidate;
}

/** A shown value: the range's step of a 6000-count display. */
export function shown(unit: "ohm" | "volt" | "hertz" | "ratio", value: number): number {
  const step = unit === "ratio" ? 0.001 : unit === "volt" ? resolutionAt(1000 * value, 60_000) / 1000 : resolutionAt(value, 6000);
  return Number((Math.round(value / step) * step).toPrecision(6));
}

/** What the meter shows of one check: a word by its chance, else the number with an error evenly inside the meter's limits. */
export function reading(check: ReturnType<typeof vocabulary>[number], p: Predictions, draw: Draw): ReadingValue {
  const i = CHECK_INDEX.get(check.code)!, word = p.word[i]!, luck = draw();
  if (check.meter === "watch") return luck < word ? "still" : luck < word + p.jumps[i]! ? "jumps" : "smooth";
  if (check.meter === "grip") return luck < word ? "loose" : "grips";
  if (check.words.length > 0 && luck < word) return check.words[0]!;
  if (check.unit === "word") throw new Error(`no word for ${check.code}`);
  // The model's own slack is spread on the scale that readings are compared on; leads are within twice their stated middle.
  const middle = p.slack[i]! > 0 ? unscale(check, scalePrediction(check, p.value[i]!, DEFAULT_METER) + p.slack[i]! * normal(draw)) : unscale(check, scalePrediction(check, p.value[i]!, DEFAULT_METER));
  const value = middle + meterLimit(check, middle) * between(-1, 1, draw);
  const least = check.unit === "volt" ? -Infinity : 0;
  return shown(check.unit, Math.min(Math.max(value, least), check.unit === "ratio" ? 1 : Infinity));
}

/** Draws a machine for a setup, with every reading of the vocabulary. */
export function drawMachine(setup: Setup, draw: Draw): DrawnMachine {
  const x = new Float64Array(PARAMETER_COUNT), z = new Float64Array(PARAMETER_COUNT), p = newPredictions();
  for (;;) {
    const candidate = drawCandidate(setup, draw);
    for (let i = 0; i < PARAMETER_COUNT; i++) z[i] = normal(draw);
    predictInto(candidate, physical(candidate, z, x), WHOLE_PLAN, ALL_GROUPS, p);
    // A candidate that says that its electronics run counts only as far as the volts let them.
    if (draw() >= Math.exp(p.logState)) continue;
    const { kind, pins, fault } = candidate.hypothesis;
    return { setup, truth: { kind, pins, fault }, drawn: { candidate, z }, readings: Object.fromEntries(vocabulary().map((check) => [check.code, reading(check, p, draw)])) };
  }
}
