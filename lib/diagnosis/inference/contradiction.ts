import { ALL_GROUPS, newPredictions, planFor, predictInto } from "../circuit/predict";
import { PARAMETER_COUNT } from "../circuit/parameters";
import type { MeterSpec, Reading } from "../types";
import { physical } from "./misfit";
import { numberLogChance, observe, scalePrediction, wordLogChance, type Observation } from "./observe";
import type { Believed } from "./posterior";
import { norm } from "../numerics";

/** A reading this many standard uncertainties from what the best explanation expects contradicts it. */
export const FAR = 7;
/** Log-chance of a word below which it contradicts (a loose fit in a sound contact, 3 in 100, does not). */
const UNLIKELY_WORD = -6;

const predictions = newPredictions(), x = new Float64Array(PARAMETER_COUNT);

/** How far each reading is from the best explanation: standard uncertainties for numbers, the like for words. */
export function misfits(b: Believed, observations: readonly Observation[], meter: MeterSpec): number[] {
  const { candidate, fit } = b;
  predictInto(candidate, physical(candidate, fit.z, x), planFor(observations.map((o) => o.index)), ALL_GROUPS, predictions);
  return observations.map((o) => {
    if (o.word !== null) return wordLogChance(o, predictions) < UNLIKELY_WORD ? FAR + 1 : 0;
    if (numberLogChance(o, predictions) === null) return FAR + 3;
    const sd = norm(o.sd, predictions.slack[o.index]!);
    return Math.abs(o.scaled - scalePrediction(o.spec, predictions.value[o.index]!, meter)) / sd;
  });
}

/** True when even the best explanation leaves a reading unexplained. */
export function fitsBadly(b: Believed, observations: readonly Observation[], meter: MeterSpec): boolean {
  return misfits(b, observations, meter).some((r) => r > FAR);
}

/** Chance of a slip from which a reading is named. */
const NAMED_FROM = 0.5;

/** Readings to take again, worst first: those most likely entered wrong, and those that the best explanation cannot account for. */
export function contradictions(b: Believed, readings: readonly Reading[], meter: MeterSpec, slips: readonly number[] = []): { check: string; why: string }[] {
  const observations = observe(readings, meter), far = misfits(b, observations, meter), slipped = slips.some((p) => p > NAMED_FROM);
  // Where one slip explains all, what the best explanation is off elsewhere is not held against other readings.
  return observations.map((o, i) => ({ check: o.spec.code, slip: slips[i] ?? 0, far: far[i]! })).filter((s) => (slipped ? s.slip > NAMED_FROM : s.far > FAR))
    .sort((a, b2) => b2.slip - a.slip || b2.far - a.far)
    .map(({ check }) => ({ check, why: "No single explanation fits this reading together with the others. Take it again." }));
}
