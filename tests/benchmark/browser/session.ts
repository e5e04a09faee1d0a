import { chromium, type Browser, type Page } from "playwright-core";
import { signInByForm } from "../../e2e/support/people";
import { readScreen } from "../../e2e/support/lead-card";
import type { BenchCase } from "../../support/bench";
import { takeAll } from "./drive";
import { observe, type Seen } from "./observer";
import { watched, type Work } from "./work";
import { RATE, reachOf, throttle, type Reach } from "./throttle";

const ARGS = ["--no-sandbox", "--disable-gpu", "--disable-quic", "--no-first-run", "--disable-background-networking", "--disable-component-update", "--disable-sync"];
/** What it takes a person to look at "What do you have?" and press Start. */
const READING_THE_FORM_MS = 4_000;
const PHONE = { viewport: { width: 390, height: 844 }, hasTouch: true };

export interface EngineStep { readonly readings: number; readonly ms: number }

/** What was measured over some checks in the browser; all times in ms. */
export interface Measured {
  /** Each answer of the engine, by its own clock. */
  readonly steps: readonly EngineStep[];
  /** From the last key of a reading to the next screen. */
  readonly waits: readonly number[];
  /** What the page saw from the first screen of a check on. */
  readonly seen: Seen;
  /** Longest frame while a check was opened, before its first screen stood. */
  readonly opening: number;
  /** Presses of a key or button, also those answered too quickly to be listed. */
  readonly presses: number;
  readonly work: Work;
  readonly reach: Reach | null;
}

export function launch(): Promise<Browser> {
  return chromium.launch({ executablePath: process.env.CHROMIUM_PATH ?? "/usr/bin/chromium", args: ARGS });
}

/** Runs where the engine runs: the answers since `from` (ms since 1970) that its own marks tell of. */
const marks = (from: number): EngineStep[] => performance.getEntriesByName("engine assess").filter(({ startTime }) => performance.timeOrigin + startTime >= from)
  .map((entry) => ({ readings: Number((entry as PerformanceMeasure).detail), ms: entry.duration }));

/** Fills in nothing about the device, at a person's pace, and starts; when, in ms since 1970. */
async function start(page: Page): Promise<number> {
  await page.goto("/checks/new");
  await page.getByLabel("Battery voltage").focus();
  await page.waitForTimeout(READING_THE_FORM_MS);
  const from = await page.evaluate(() => performance.timeOrigin + performance.now());
  await page.getByRole("button", { name: "Start the check" }).click();
  await readScreen(page);
  return from;
}

async function oneCheck(browser: Browser, page: Page, machine: BenchCase, inWorker: boolean): Promise<Omit<Measured, "reach">> {
  const started = await start(page);
  const from = await page.evaluate(() => performance.now());
  const { result: waits, work } = await watched(browser, page, () => takeAll(page, machine));
  const [worker] = page.workers();
  if (inWorker !== (worker !== undefined)) throw new Error("the engine does not run where it was to run");
  const steps = await (worker ? worker.evaluate(marks, started) : page.evaluate(marks, started));
  const all = await page.evaluate(async () => {
    // What was observed last is handed over with the next turn.
    await new Promise((resolve) => setTimeout(resolve, 200));
    const { tasks, frames, inputs } = window.bench;
    return { tasks, frames, inputs, presses: (performance as { interactionCount?: number }).interactionCount ?? 0 };
  });
  const late = <T extends { at: number }>(list: readonly T[]) => list.filter(({ at }) => at >= from);
  const opening = Math.max(0, ...all.frames.filter(({ at }) => at < from).map(({ ms }) => ms));
  return { steps, waits, seen: { tasks: late(all.tasks), frames: late(all.frames), inputs: late(all.inputs) }, opening, presses: all.presses, work };
}

function together(parts: readonly Omit<Measured, "reach">[], reach: Reach | null): Measured {
  return {
    steps: parts.flatMap((p) => p.steps), waits: parts.flatMap((p) => p.waits), opening: Math.max(...parts.map((p) => p.opening)), presses: parts.reduce((sum, p) => sum + p.presses, 0), reach,
    work: { page: parts.flatMap((p) => p.work.page), engine: parts.flatMap((p) => p.work.engine) },
    seen: { tasks: parts.flatMap((p) => p.seen.tasks), frames: parts.flatMap((p) => p.seen.frames), inputs: parts.flatMap((p) => p.seen.inputs) },
  };
}

/**
 * Signs in and takes all readings of the machines, one check each, on a phone's screen with a slowed processor.
 * @param inWorker false: as in a browser where no worker can be started, so that the engine runs on the slowed page itself
 */
export async function measure(browser: Browser, address: string, machines: readonly BenchCase[], inWorker: boolean): Promise<Measured> {
  const context = await browser.newContext({ ...PHONE, baseURL: address });
  // The runner that this file is started with names functions by a helper that the page does not have.
  await context.addInitScript("globalThis.__name = (named) => named");
  await context.addInitScript(observe);
  if (!inWorker) await context.addInitScript(() => { Object.assign(window, { Worker: class { constructor() { throw new Error("no worker here"); } } }); });
  const page = await context.newPage();
  await signInByForm(page, "technician");
  const cdp = await context.newCDPSession(page);
  await throttle(cdp, RATE);
  const parts: Omit<Measured, "reach">[] = [];
  for (const machine of machines) parts.push(await oneCheck(browser, page, machine, inWorker));
  const reach = inWorker ? await reachOf(page, cdp) : null;
  await context.close();
  return together(parts, reach);
}
