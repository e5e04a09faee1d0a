import { answerRequest, type Answer, type Reading } from "@/lib/diagnosis";
import { sameFault, samePins, type BenchCase, type Named } from "../support/bench";
import { effortOf, followCheck, FIXED_ORDER } from "../support/run-check";

/** One bench case followed to the end, judged by the bench's own rules (its README and run.mjs). */
export interface BenchRow {
  readonly id: string; readonly task: BenchCase["task"]; readonly healthy: boolean; readonly saysHealthy: boolean; readonly done: boolean;
  readonly readings: number; readonly effort: number; readonly invalid: string | null;
  readonly kind: boolean; readonly pins: boolean; readonly top: boolean; readonly inSet: boolean; readonly said: number; readonly truth: string; readonly verdict: string;
}

/** How a case is followed: readings taken before the first question, and what answers instead of the engine itself (a clock around it). */
export interface Following { readonly taken?: readonly Reading[]; readonly engine?: typeof answerRequest }

export function benchRow(c: BenchCase, order?: readonly string[], { taken = [], engine = answerRequest }: Following = {}): BenchRow {
  const run = followCheck((readings): Answer => {
    const answer = engine({ id: c.id, setup: c.setup, readings });
    if ("error" in answer) throw new Error(`${c.id}: ${answer.error.message}`);
    return answer;
  }, (check) => c.readings[check], taken, order);
  return { ...judged(c, run.last), readings: run.readings.length, effort: effortOf(run.readings), invalid: run.invalid };
}

/** The same case with the checks in the bench's fixed order. */
export const fixedRow = (c: BenchCase) => benchRow(c, FIXED_ORDER);

const SET_HOLDS = 0.95;
const text = (f: Named | undefined) => (f ? `${f.code}${f.pins ? `:${f.pins.join(",")}` : ""}` : "");

function judged({ id, task, truth }: BenchCase, { kinds, pins, faults, done }: Answer) {
  const kind = Object.entries(kinds).sort((a, b) => b[1] - a[1])[0]?.[0], first = faults[0];
  let held = 0;
  const set = faults.filter(({ p }) => { const open = held < SET_HOLDS; held += p; return open; });
  // Without an entry a faulty potentiometer's ends cannot be told apart on the bench: only its signal pin counts.
  const loose = task === "identify" && truth.kind === "potentiometer" && truth.fault.code !== "none";
  return {
    id, task, done, healthy: truth.fault.code === "none", saysHealthy: first?.code === "none", kind: kind === truth.kind, pins: samePins(pins[0], truth.pins, loose),
    top: sameFault(first, truth.fault), inSet: set.some((f) => sameFault(f, truth.fault)), said: first?.p ?? 0, truth: text(truth.fault), verdict: text(first),
  };
}

const mean = (list: readonly number[]) => (list.length === 0 ? 0 : list.reduce((a, b) => a + b, 0) / list.length);
const percent = (list: readonly boolean[]) => Math.round(1000 * mean(list.map(Number))) / 10;

export interface BenchScores {
  readonly kind: number; readonly pins: number; readonly top1: number; readonly inSet: number; readonly falseAlarm: number; readonly missed: number;
  readonly sureButWrong: number; readonly readings: number; readonly effort: number; readonly invalid: number; readonly undecided: number;
}

/** Scores over rows; shares in percent, as the bench counts them. */
export function benchScores(rows: readonly BenchRow[]): BenchScores {
  const unknown = rows.filter((r) => r.task === "identify"), healthy = rows.filter((r) => r.healthy), faulty = rows.filter((r) => !r.healthy), sure = rows.filter((r) => r.said >= 0.95);
  return {
    kind: percent(unknown.map((r) => r.kind)), pins: percent(unknown.map((r) => r.pins)), top1: percent(rows.map((r) => r.top)), inSet: percent(rows.map((r) => r.inSet)),
    falseAlarm: percent(healthy.map((r) => !r.saysHealthy)), missed: percent(faulty.map((r) => r.saysHealthy)), sureButWrong: percent(sure.map((r) => !r.top)),
    readings: mean(rows.map((r) => r.readings)), effort: mean(rows.map((r) => r.effort)), invalid: rows.filter((r) => r.invalid !== null).length, undecided: percent(rows.map((r) => !r.done)),
  };
}
