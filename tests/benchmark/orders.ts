import type { Reading } from "@/lib/diagnosis";
import { benchRow, benchScores, type BenchRow, type BenchScores } from "../engine/bench-scores";
import type { BenchCase } from "../support/bench";
import { drawer } from "../support/draw";
import { FIXED_ORDER, MOST_READINGS } from "../support/run-check";
import { randomOrder } from "./drawn";
import { timed, type Step } from "./step-times";
import { against, say, table } from "./table";

const SEED = 20_611;
const MOST_MEAN_READINGS = 9, EFFORT_SHARE_PERCENT = 60, TOP_POINTS = 1;

/** Every reading of a machine, in the order of the bench's file. */
const all = (c: BenchCase) => Object.entries(c.readings) as Reading[];

/** The engine's own order on the cases, with the time of each step. */
export function engineOrder(cases: readonly BenchCase[]): { readonly rows: BenchRow[]; readonly steps: Step[] } {
  const steps: Step[] = [], [first] = cases;
  // The first run of any code is slow; that is another question than how long a step takes.
  if (first) benchRow(first);
  return { rows: cases.map((c) => benchRow(c, undefined, { engine: timed(steps) })), steps };
}

function line(name: string, rows: readonly BenchRow[], scores: BenchScores): string[] {
  return [name, String(rows.length), scores.readings.toFixed(2), scores.effort.toFixed(2), scores.top1.toFixed(1), (100 - scores.undecided).toFixed(1), scores.sureButWrong.toFixed(1)];
}

/** Section 2: what the engine's choice of readings saves, beside a fixed order, a random one and all readings at once. */
export function reportOrders(cases: readonly BenchCase[], ours: readonly BenchRow[]): void {
  const runs = {
    "the engine's": ours,
    "fixed": cases.map((c) => benchRow(c, FIXED_ORDER)),
    "random": cases.map((c, i) => benchRow(c, randomOrder(c.readings, drawer(SEED + i)))),
    "all at once": cases.map((c) => benchRow(c, undefined, { taken: all(c) })),
  };
  const scores = Object.fromEntries(Object.entries(runs).map(([name, rows]) => [name, benchScores(rows)])) as Record<keyof typeof runs, BenchScores>;
  const names = Object.keys(runs) as (keyof typeof runs)[];
  say(table(["order", "cases", "mean readings", "mean effort", "top finding right %", "done %", "sure but wrong %"], names.map((name) => line(name, runs[name], scores[name]))));
  say(`An order ends when the engine says that enough is known, at the latest after ${MOST_READINGS} readings; "all at once" ends with the first answer.`);
  say(`Effort: 1 a reading, and the bench's price of parting, mating and switching. Random orders drawn from seed ${SEED}.`);
  say(against("mean readings", scores["the engine's"].readings, "readings", MOST_MEAN_READINGS, 2));
  say(against("mean effort of fixed order", 100 * scores["the engine's"].effort / scores.fixed.effort, "%", EFFORT_SHARE_PERCENT));
  say(against("mean effort of random order", 100 * scores["the engine's"].effort / scores.random.effort, "%", EFFORT_SHARE_PERCENT));
  say(against("top finding less often right than with all at once, by", scores["all at once"].top1 - scores["the engine's"].top1, "points", TOP_POINTS));
}
