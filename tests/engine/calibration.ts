import { assess, type Fault, type ReadingValue, type Setup } from "@/lib/diagnosis";
import { sameFault } from "../support/bench";
import { followCheck } from "../support/run-check";

/** One verdict: how sure the engine said it was of its first finding, and whether that was so. */
export interface Verdict { readonly said: number; readonly right: boolean; readonly readings: number; readonly inSet: boolean; readonly truth: string; readonly top: string }

/** A machine whose truth is known. */
export interface KnownMachine { readonly setup: Setup; readonly truth: { readonly fault: Fault }; readonly readings: Readonly<Record<string, ReadingValue>> }

/** Follows the engine's proposals on a machine until it is done. */
export function verdictOn(machine: KnownMachine): Verdict {
  const run = followCheck((readings) => {
    const a = assess(machine.setup, readings);
    if (a.state === "invalid-input") throw new Error(`${a.message} (${a.where})`);
    return a;
  }, (check) => machine.readings[check]);
  const { faults, openFindings } = run.last, top = faults[0]!;
  return {
    said: top.p, right: sameFault(top, machine.truth.fault), readings: run.readings.length, inSet: openFindings.some((f) => sameFault(f, machine.truth.fault)),
    truth: machine.truth.fault.code, top: top.code,
  };
}

export const BIN_EDGES = [0, 0.6, 0.8, 0.95, 0.99, 1.0000001] as const;

interface Bin { readonly from: number; readonly to: number; readonly count: number; readonly said: number; readonly right: number }

const mean = (list: readonly number[]) => (list.length === 0 ? 0 : list.reduce((a, b) => a + b, 0) / list.length);

/** Verdicts by how sure they were: mean said against share right. */
export function reliability(verdicts: readonly Verdict[]): Bin[] {
  return BIN_EDGES.slice(0, -1).map((from, i) => {
    const to = BIN_EDGES[i + 1]!, list = verdicts.filter((v) => v.said >= from && v.said < to);
    return { from, to: Math.min(1, to), count: list.length, said: mean(list.map((v) => v.said)), right: mean(list.map((v) => Number(v.right))) };
  });
}

/** Expected calibration error: the gap of each bin between said and right, weighted by how many are in it. */
export function calibrationError(verdicts: readonly Verdict[]): number {
  return reliability(verdicts).reduce((sum, b) => sum + b.count / verdicts.length * Math.abs(b.said - b.right), 0);
}

/** The table, for people. `±` is twice the standard error of the share right. */
export function reliabilityTable(name: string, verdicts: readonly Verdict[]): string {
  const lines = reliability(verdicts).map((b) => {
    const error = b.count > 0 ? 2 * Math.sqrt(Math.max(b.said * (1 - b.said), 1e-4) / b.count) : 0;
    return `  ${b.from.toFixed(2)}..${b.to.toFixed(2)}  ${String(b.count).padStart(5)}  said ${b.said.toFixed(3)}  right ${b.right.toFixed(3)}  ±${error.toFixed(3)}`;
  });
  const share = (is: (v: Verdict) => boolean) => (100 * mean(verdicts.map((v) => Number(is(v))))).toFixed(1);
  return [
    `${name}: ${verdicts.length} verdicts, expected calibration error ${calibrationError(verdicts).toFixed(4)}, right ${share((v) => v.right)} %, in the open findings ${share((v) => v.inSet)} %, mean readings ${mean(verdicts.map((v) => v.readings)).toFixed(2)}`,
    ...lines,
  ].join("\n");
}
