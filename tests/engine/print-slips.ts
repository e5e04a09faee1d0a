// npm run slips: one slip of each kind in every bench case, scored; --show lists the runs that went wrong.
import { benchCases } from "../support/bench";
import { drawer } from "../support/draw";
import { slipLine, slipTable } from "./slip-scores";
import { cleanRun, SLIP_KINDS, slipRun, type SlipRun } from "./slips";

const SEED = 8_251;
const runs: SlipRun[] = [], falsely: string[] = [];
for (const [i, c] of benchCases().entries()) {
  const clean = cleanRun(c), draw = drawer(SEED + i);
  if (clean.named.length > 0) falsely.push(`${c.id} ${clean.named.join(" ")}`);
  for (const kind of SLIP_KINDS) {
    const run = slipRun(c, clean.readings, kind, draw);
    if (run) runs.push(run);
  }
}
process.stdout.write(`${slipTable(runs)}\nsomething named though nothing was wrong: ${falsely.length} of ${benchCases().length} runs: ${falsely.join(", ")}\n`);
if (process.argv.includes("--show")) for (const r of runs) if (r.sureWrong || !r.named) process.stdout.write(`${slipLine(r)}\n`);
