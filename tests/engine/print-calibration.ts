// npm run calibration: reliability of the engine's verdicts on 2,000 drawn machines and on the bench. A number takes another count of draws.
import { benchCases } from "../support/bench";
import { drawer } from "../support/draw";
import { drawMachine, drawSetup } from "../support/draw-machine";
import { reliabilityTable, verdictOn, type Verdict } from "./calibration";

const SEED = 41_007;
const MOST_ERROR = 0.03;
const count = Number(process.argv[2] ?? 2000), draw = drawer(SEED);
const unknown: Verdict[] = [], entry: Verdict[] = [];
for (let i = 0; i < count; i++) {
  const withEntry = i % 2 === 1;
  (withEntry ? entry : unknown).push(verdictOn(drawMachine(drawSetup(draw, withEntry), draw)));
}
const all = [...unknown, ...entry];
const say = (text: string) => process.stdout.write(`${text}\n`);
say(reliabilityTable("drawn, unknown device", unknown));
say(reliabilityTable("drawn, with an entry", entry));
say(reliabilityTable("drawn, all", all));
say(reliabilityTable("bench", benchCases().map(verdictOn)));
const sure = all.filter((v) => v.said >= 0.95 && !v.right);
say(`sure (0.95) but wrong: ${sure.length}`);
for (const v of sure) say(`  truth ${v.truth}, said ${v.top} ${v.said.toFixed(3)} after ${v.readings}`);
const off = all.reduce((sum, v) => sum + v.said - Number(v.right), 0) / all.length;
say(`mean said minus right: ${off.toFixed(4)}; asked for: error at most ${MOST_ERROR}`);
