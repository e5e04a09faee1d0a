import { DEFAULT_METER, meterLimit, parseCheck, type Reading } from "@/lib/diagnosis";
import type { Candidate } from "@/lib/diagnosis/circuit/candidate";
import { PARAMETER_COUNT } from "@/lib/diagnosis/circuit/parameters";
import { ALL_GROUPS, CHECK_INDEX, newPredictions, planFor, predictInto } from "@/lib/diagnosis/circuit/predict";
import { physical } from "@/lib/diagnosis/inference/misfit";
import { normal } from "./draw-machine";

type Draw = () => number;
type LogLikelihood = (z: Float64Array) => number;

/** Test leads add this to ohms; the model's own error beside the meter's; the offset of the logarithm of ohms (the engine's stated scales). */
const LEADS = 0.25, OHM_SHARE = 0.004, VOLTS = 0.004, VOLT_SHARE = 0.0005, HERTZ_SHARE = 0.0005, DUTY = 0.001, OHM_OFFSET = 2;
const LEAST_WORD = Math.exp(-11);

const gauss = (x: number, mean: number, sd: number) => -0.5 * ((x - mean) / sd) ** 2 - Math.log(sd) - 0.5 * Math.log(2 * Math.PI);

/** Log-density of one number: plainly normal, with the meter's limit a as a / root 3 (JCGM 100:2008, 4.3.7). */
function numberDensity(check: string, value: number, predicted: number, slack: number): number {
  const spec = parseCheck(check)!, u = meterLimit(spec, value, DEFAULT_METER) / Math.sqrt(3);
  if (spec.unit === "ohm") return gauss(Math.log(Math.max(value, 0) + OHM_OFFSET), Math.log(predicted + LEADS + OHM_OFFSET), Math.hypot(Math.hypot(u, OHM_SHARE * value) / (value + OHM_OFFSET), slack));
  if (spec.unit === "volt") return gauss(value, predicted, Math.hypot(u, VOLTS, VOLT_SHARE * value, slack));
  if (spec.unit === "hertz") return gauss(Math.log(value), Math.log(predicted), Math.hypot(u / value, HERTZ_SHARE));
  return gauss(value, predicted, Math.hypot(u, DUTY));
}

/** Log-likelihood of the readings as a function of the unknowns, in standard deviations of their ranges. */
export function likelihoodOf(c: Candidate, readings: readonly Reading[]): LogLikelihood {
  const plan = planFor(readings.map(([check]) => CHECK_INDEX.get(check)!)), p = newPredictions(), x = new Float64Array(PARAMETER_COUNT);
  return (z) => {
    p.logState = 0;
    predictInto(c, physical(c, z, x), plan, ALL_GROUPS, p);
    return readings.reduce((sum, [check, value]) => {
      const i = CHECK_INDEX.get(check)!, word = p.word[i]!;
      if (typeof value === "number") return sum + (word > 0.5 ? -13 : Math.log(1 - word) + numberDensity(check, value, p.value[i]!, p.slack[i]!));
      const chance = value === "jumps" ? p.jumps[i]! : value === "smooth" ? 1 - word - p.jumps[i]! : value === "grips" ? 1 - word : word;
      return sum + Math.log(Math.max(chance, LEAST_WORD));
    }, p.logState);
  };
}

/** Unknowns that the readings speak of, found by trying: does anything change when one of them does? */
function active(f: LogLikelihood, draw: Draw): number[] {
  const at = Array.from({ length: 3 }, () => Float64Array.from({ length: PARAMETER_COUNT }, () => normal(draw)));
  return Array.from({ length: PARAMETER_COUNT }, (_, i) => i).filter((i) => at.some((z) => {
    const moved = Float64Array.from(z);
    moved[i]! += 0.7;
    return f(moved) !== f(z);
  }));
}

interface Particle { readonly z: Float64Array; log: number }

/** Next temperature: as far as half of the particles still carry weight. */
function nextBeta(list: readonly Particle[], beta: number): number {
  const share = (to: number) => {
    const w = weights(list, to - beta), sum = w.reduce((a, b) => a + b, 0), squares = w.reduce((a, b) => a + b * b, 0);
    return sum * sum / squares / w.length;
  };
  if (share(1) > 0.5) return 1;
  let low = beta, high = 1;
  for (let i = 0; i < 40; i++) { const middle = (low + high) / 2; if (share(middle) > 0.5) low = middle; else high = middle; }
  return low > beta ? low : high;
}

function weights(list: readonly Particle[], step: number): number[] {
  const most = list.reduce((max, { log }) => Math.max(max, log), -Infinity);
  return list.map(({ log }) => Math.exp(step * (log - most)));
}

/** Draws anew by weight, evenly spaced (systematic resampling). */
function resampled(list: readonly Particle[], w: readonly number[], draw: Draw): Particle[] {
  const sum = w.reduce((a, b) => a + b, 0), out: Particle[] = [], start = draw();
  let k = 0, up = w[0]!;
  for (let i = 0; i < list.length; i++) {
    while (up < (i + start) * sum / list.length && k < list.length - 1) up += w[++k]!;
    out.push({ z: Float64Array.from(list[k]!.z), log: list[k]!.log });
  }
  return out;
}

/** Random walks in the direction between two other particles, whose spread tells the scale; prior and tempered likelihood kept in balance. */
function walk(list: Particle[], f: LogLikelihood, places: readonly number[], beta: number, draw: Draw): void {
  const any = () => list[Math.floor(draw() * list.length)]!.z, reach = 1.6 / Math.sqrt(2 * places.length);
  for (const p of list) {
    const a = any(), b = any(), scale = draw() < 0.1 ? 1 : reach, z = Float64Array.from(p.z);
    for (const i of places) z[i]! += scale * (a[i]! - b[i]!) + 0.01 * scale * normal(draw) * Math.abs(a[i]! - b[i]!);
    const log = f(z), prior = places.reduce((sum, i) => sum + 0.5 * (p.z[i]! ** 2 - z[i]! ** 2), 0);
    if (Math.log(draw()) < beta * (log - p.log) + prior) { p.z.set(z); p.log = log; }
  }
}

/**
 * Log-evidence by brute force: particles from the prior are led to the posterior by degrees, and the mean weights on the way multiply
 * up to the integral (annealed importance sampling with resampling). No derivative, no fit, nothing of the engine's inference.
 */
export function bruteLogEvidence(c: Candidate, readings: readonly Reading[], draw: Draw, particles = 800, moves = 8): number {
  const f = likelihoodOf(c, readings), places = active(f, draw);
  let list: Particle[] = Array.from({ length: particles }, () => {
    const z = new Float64Array(PARAMETER_COUNT);
    for (const i of places) z[i] = normal(draw);
    return { z, log: f(z) };
  });
  let total = 0;
  for (let beta = 0; beta < 1;) {
    const to = nextBeta(list, beta), most = list.reduce((max, { log }) => Math.max(max, log), -Infinity), w = weights(list, to - beta);
    total += (to - beta) * most + Math.log(w.reduce((a, b) => a + b, 0) / w.length);
    list = resampled(list, w, draw);
    beta = to;
    for (let m = 0; m < moves; m++) walk(list, f, places, beta, draw);
  }
  return total;
}

/** Log-evidence where one unknown alone matters: a sum over a fine grid of the normal density (trapezoids, computed). */
export function gridLogEvidence(c: Candidate, readings: readonly Reading[], place: number, reach = 7, steps = 200_000): number {
  const f = likelihoodOf(c, readings), z = new Float64Array(PARAMETER_COUNT), h = 2 * reach / steps;
  const logs = Array.from({ length: steps + 1 }, (_, k) => { z[place] = k * h - reach; return f(z) - 0.5 * z[place]! ** 2; });
  const most = logs.reduce((max, log) => Math.max(max, log), -Infinity);
  return most + Math.log(logs.reduce((sum, log) => sum + Math.exp(log - most), 0) * h) - 0.5 * Math.log(2 * Math.PI);
}
