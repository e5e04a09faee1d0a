// npm run bench: speed, choice of readings, memory and the running check in a browser, in one run. Reports; ends with 1 only when something breaks.
// --every N: each N-th case (quicker); --only steps,orders,memory,browser: these sections alone.
import { cpus, loadavg } from "node:os";
import { benchCases, everyNth } from "../support/bench";
import { reportBrowser } from "./browser/report";
import { engineOrder, reportOrders } from "./orders";
import { reportMemory } from "./memory";
import { options } from "./options";
import { reportSteps } from "./step-times";
import { say } from "./table";

const { every, only } = options(process.argv.slice(2));
const cases = everyNth(benchCases(), every);
/** Other programs make every time longer: how many wanted the processors in the last minute stands beside each section. */
const heading = (text: string) => say(`\n== ${text} ==\n(${cpus().length} processors, ${loadavg()[0]?.toFixed(1)} programs wanted them on average in the last minute)`);

say(`Node ${process.versions.node}, ${cases.length} of the bench's machines`);
if (only.has("steps") || only.has("orders")) {
  const ours = engineOrder(cases);
  if (only.has("steps")) {
    heading("Step time in Node, by number of readings");
    reportSteps(ours.steps);
  }
  if (only.has("orders")) {
    heading("Readings and effort, by order of readings");
    reportOrders(cases, ours.rows);
  }
}
if (only.has("memory")) {
  heading("Memory");
  reportMemory(cases, every);
}
if (only.has("browser")) {
  heading("The running check in Chromium");
  await reportBrowser(cases);
}
