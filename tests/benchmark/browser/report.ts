import type { BenchCase } from "../../support/bench";
import { percentile } from "../figures";
import { byReadings, timesRow, TIMES_HEAD } from "../step-times";
import { against, say, table } from "../table";
import type { Frame } from "./observer";
import { startApp } from "./server";
import { launch, measure, type Measured } from "./session";
import { RATE } from "./throttle";

const STEP_MS = 60, FRAME_MS = 100, INPUT_MS = 100, CASES_A_KIND = 3, WORST = 3;

/** Unknown devices of every kind, spread over the bench. */
function machinesOf(cases: readonly BenchCase[]): BenchCase[] {
  const unknown = cases.filter(({ task }) => task === "identify"), kinds = [...new Set(unknown.map(({ truth }) => truth.kind))];
  return kinds.flatMap((kind) => unknown.filter(({ truth }) => truth.kind === kind).slice(0, CASES_A_KIND));
}

const frameLine = ({ ms, drawing, scripts }: Frame): string =>
  `  ${ms.toFixed(0)} ms: drawing ${drawing.toFixed(0)} ms; ${[...scripts].sort((a, b) => b.ms - a.ms).slice(0, WORST).map((s) => `${s.what} ${s.ms.toFixed(0)} ms`).join("; ") || "no script over 5 ms"}`;

/** Steps of the engine by number of readings, and what a person waits. The engine is fresh in every check: its first steps are the slowest. */
function reportTimes(steps: Measured["steps"], waits: Measured["waits"]): void {
  say(table(["readings", ...TIMES_HEAD], [...byReadings(steps), timesRow("all steps", steps.map(({ ms }) => ms)), timesRow("last key to next screen", waits)]));
}

function reportWorker({ steps, waits, seen, opening, presses, reach, work }: Measured): void {
  say("\nThe engine in its worker, as people use it:");
  if (reach) {
    say(`Slowed ${RATE} times by the DevTools protocol: the page became ${reach.page.toFixed(1)} times slower, the worker ${reach.worker.toFixed(1)} times; asked for the same, the worker's own target answers: ${reach.answer}.`);
    say(`So a step on a slowed processor is reckoned: processor's work on it, which other programs do not lengthen, times ${RATE}.`);
  }
  reportTimes(steps, waits);
  say(table(["", ...TIMES_HEAD], [timesRow("processor's work on a step", work.engine), timesRow(`the same times ${RATE}`, work.engine.map((ms) => RATE * ms))]));
  say(against("step in the worker, by the clock of this machine, at the 95th percentile", percentile(steps.map(({ ms }) => ms), 0.95), "ms", STEP_MS));
  say(against(`step in the worker, processor's work times ${RATE}, at the 95th percentile`, RATE * percentile(work.engine, 0.95), "ms", STEP_MS));
  const frames = seen.frames.map(({ ms }) => ms), tasks = seen.tasks.map(({ ms }) => ms), inputs = seen.inputs.map(({ ms }) => ms);
  say(against(`longest frame in a running check (${frames.length} of 50 ms or more)`, Math.max(0, ...frames), "ms", FRAME_MS, 0));
  say(against(`longest task of the page (${tasks.length} of 50 ms or more)`, Math.max(0, ...tasks), "ms", FRAME_MS, 0));
  say(against(`longest task of the page, processor's work at ${RATE} times slowed`, Math.max(0, ...work.page), "ms", FRAME_MS, 0));
  say(against(`input to next paint, slowest of ${presses} presses (${inputs.length} events of 16 ms or more)`, Math.max(0, ...inputs), "ms", INPUT_MS, 0));
  say(`  of these events the median took ${percentile(inputs, 0.5).toFixed(0)} ms, the 95th percentile ${percentile(inputs, 0.95).toFixed(0)} ms; ${inputs.filter((ms) => ms > INPUT_MS).length} took longer than asked for (the browser tells them in steps of 8 ms)`);
  say(`longest frame while a check is opened: ${opening.toFixed(0)} ms`);
  if (frames.length > 0) say(`longest frames:\n${[...seen.frames].sort((a, b) => b.ms - a.ms).slice(0, WORST).map(frameLine).join("\n")}`);
}

function reportPage({ steps, waits }: Measured): void {
  say(`\nThe engine on the page itself, as where no worker can be started, so that it runs ${RATE} times slowed:`);
  reportTimes(steps, waits);
  say(against("step on a slowed processor at the 95th percentile", percentile(steps.map(({ ms }) => ms), 0.95), "ms", STEP_MS));
}

/** Section 4: the running check of the built app in Chromium, on a phone's screen with a slowed processor. */
export async function reportBrowser(cases: readonly BenchCase[]): Promise<void> {
  const machines = machinesOf(cases), app = await startApp();
  try {
    const browser = await launch();
    try {
      say(`Chromium ${browser.version()}, 390 x 844, processor slowed ${RATE} times, ${machines.length} unknown devices: ${machines.map(({ id }) => id).join(" ")}`);
      reportWorker(await measure(browser, app.address, machines, true));
      reportPage(await measure(browser, app.address, machines, false));
    } finally {
      await browser.close();
    }
  } finally {
    await app.stop();
  }
}
