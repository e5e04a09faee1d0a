import type { SlipRun } from "./slips";
import { SLIP_KINDS } from "./slips";

export interface SlipScore { readonly runs: number; readonly refusedPercent: number; readonly namedPercent: number; readonly sureWrongPercent: number; readonly wrongVerdictPercent: number; readonly sureWrongHeededPercent: number; readonly heldPercent: number }

const percent = (list: readonly SlipRun[], is: (r: SlipRun) => boolean) => (list.length === 0 ? 0 : Math.round(1000 * list.filter(is).length / list.length) / 10);

export function slipScore(runs: readonly SlipRun[]): SlipScore {
  return {
    runs: runs.length, refusedPercent: percent(runs, (r) => r.refused), namedPercent: percent(runs, (r) => r.named),
    sureWrongPercent: percent(runs, (r) => r.sureWrong), wrongVerdictPercent: percent(runs, (r) => r.wrongVerdict), sureWrongHeededPercent: percent(runs, (r) => r.sureWrongHeeded), heldPercent: percent(runs, (r) => r.held),
  };
}

const row = (name: string, s: SlipScore, other: number) =>
  [name.padEnd(28), s.runs, s.refusedPercent, s.namedPercent, other, s.sureWrongPercent, s.wrongVerdictPercent, s.sureWrongHeededPercent, s.heldPercent].map((v) => String(v).padStart(9)).join(" ");

const family = (check: string) => check.split(":").slice(0, 2).join(":").replace(/^volt:battery$/, "volt:battery");

/** Table of scores: all, by kind of slip, by kind of check. */
export function slipTable(runs: readonly SlipRun[]): string {
  const otherNamed = (list: readonly SlipRun[]) => percent(list, (r) => r.otherNamed);
  const line = (name: string, list: readonly SlipRun[]) => row(name, slipScore(list), otherNamed(list));
  const checks = [...new Set(runs.map((r) => family(r.check)))].sort();
  return [
    `${"".padEnd(28)} ${["runs", "refused", "named", "another", "surewrong", "verdict", "heeded", "held"].map((h) => h.padStart(9)).join(" ")}   (percent; verdict: sure, wrong and given out as a verdict; heeded: sure and wrong though what was named is taken again; held: the true finding first all the same)`,
    line("all", runs), ...SLIP_KINDS.map((kind) => line(kind, runs.filter((r) => r.kind === kind))), ...checks.map((check) => line(check, runs.filter((r) => family(r.check) === check))),
  ].join("\n");
}

/** One line a run, for looking into what went wrong. */
export function slipLine(r: SlipRun): string {
  return `${r.id} ${r.kind} ${r.check}: ${r.right} -> ${r.wrong}; ${r.named ? "named" : r.otherNamed ? "another named" : "not named"}; truth ${r.truth}; says ${r.said} after ${r.readings}${r.sureWrong ? "  SURE WRONG" : ""}`;
}
