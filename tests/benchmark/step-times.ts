import { answerRequest } from "@/lib/diagnosis";
import { percentile } from "./figures";
import { against, say, table } from "./table";

/** One answer of the engine: to how many readings, how long it took by the clock, and how long processors worked on it, in ms. */
export interface Step { readonly readings: number; readonly ms: number; readonly worked: number }

const P95_MS = 20;
const YARDSTICK_STEPS = 10_000_000;

/** The engine with a clock around it, that notes every step in `steps`. */
export function timed(steps: Step[]): typeof answerRequest {
  return (request) => {
    const before = process.cpuUsage(), begun = performance.now(), answer = answerRequest(request);
    const ms = performance.now() - begun, { user, system } = process.cpuUsage(before);
    steps.push({ readings: (request as { readings: readonly unknown[] }).readings.length, ms, worked: (user + system) / 1000 });
    return answer;
  };
}

/** Time of a fixed piece of arithmetic, in ms: tells a slow machine from a slow engine. Also runs inside the browser, so it names nothing outside. */
export function yardstick(steps: number): number {
  const begun = performance.now();
  let x = 1;
  for (let i = 1; i < steps; i++) x = Math.sqrt(x + 1 / i);
  return x > 0 ? performance.now() - begun : 0;
}

/** Row of figures over times in ms: number, median, 95th percentile, longest. */
export function timesRow(name: string, ms: readonly number[]): string[] {
  return [name, String(ms.length), ...[percentile(ms, 0.5), percentile(ms, 0.95), percentile(ms, 1)].map((value) => value.toFixed(1))];
}

export const TIMES_HEAD = ["steps", "median ms", "p95 ms", "longest ms"];

/** Rows by number of readings, from the first question on. */
export function byReadings(steps: readonly Pick<Step, "readings" | "ms">[]): string[][] {
  const counts = [...new Set(steps.map((step) => step.readings))].sort((a, b) => a - b);
  return counts.map((count) => timesRow(String(count), steps.filter((step) => step.readings === count).map((step) => step.ms)));
}

/** Section 1: how long an answer of the engine takes in Node. */
export function reportSteps(steps: readonly Step[]): void {
  const ms = steps.map((step) => step.ms), median = percentile(ms, 0.5);
  say(table(["readings", ...TIMES_HEAD], [...byReadings(steps), timesRow("all", ms)]));
  say(against("step at the 95th percentile", percentile(ms, 0.95), "ms", P95_MS));
  say(`processors' work on a step (other programs' share of the clock left out), at the 95th percentile: ${percentile(steps.map((step) => step.worked), 0.95).toFixed(1)} ms`);
  say(`slow to fast steps of this run: p95 is ${(percentile(ms, 0.95) / median).toFixed(1)} times the median, the longest ${(percentile(ms, 1) / median).toFixed(1)} times`);
  say(`yardstick: ${YARDSTICK_STEPS / 1e6} million divisions and square roots take ${yardstick(YARDSTICK_STEPS).toFixed(0)} ms on this machine now`);
}
