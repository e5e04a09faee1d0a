import type { CDPSession, Page } from "playwright-core";
import { yardstick } from "../step-times";

/** How many times slower than this machine the browser's processor is made, as a cheap phone's is. */
export const RATE = 4;
const STEPS = 5_000_000, TRIES = 5, REFUSED_AFTER_MS = 2_000, ASKED = 1;

export async function throttle(cdp: CDPSession, rate: number): Promise<void> {
  await cdp.send("Emulation.setCPUThrottlingRate", { rate });
}

type Place = { readonly evaluate: (work: typeof yardstick, steps: number) => Promise<number> };

/** The least of some tries: what is left when other programs were not in the way. */
async function least(place: Place): Promise<number> {
  const times: number[] = [];
  for (let i = 0; i < TRIES; i++) times.push(await place.evaluate(yardstick, STEPS));
  return Math.min(...times);
}

/** Asks the workers' own targets for the rate too; what the browser answers. */
async function askWorkers(cdp: CDPSession): Promise<string> {
  const answered = new Promise<string>((resolve) => {
    cdp.on("Target.receivedMessageFromTarget", (event) => {
      const { id, error } = JSON.parse(event.message) as { id?: number; error?: { message: string } };
      if (id === ASKED) resolve(error?.message ?? "taken");
    });
    setTimeout(() => resolve("nothing"), REFUSED_AFTER_MS);
  });
  cdp.on("Target.attachedToTarget", ({ sessionId, targetInfo }) => {
    if (targetInfo.type !== "worker") return;
    const message = JSON.stringify({ id: ASKED, method: "Emulation.setCPUThrottlingRate", params: { rate: RATE } });
    void cdp.send("Target.sendMessageToTarget", { sessionId, message });
  });
  await cdp.send("Target.setAutoAttach", { autoAttach: true, waitForDebuggerOnStart: false, flatten: false });
  return answered;
}

export interface Reach { readonly page: number; readonly worker: number; readonly answer: string }

/** How many times slower page and worker really become when the rate is asked for both, by the same arithmetic at 1 and at the rate. Leaves the page at the rate. */
export async function reachOf(page: Page, cdp: CDPSession): Promise<Reach> {
  const [worker] = page.workers();
  if (!worker) throw new Error("the check has no worker");
  await throttle(cdp, 1);
  const full = { page: await least(page), worker: await least(worker) };
  await throttle(cdp, RATE);
  const answer = await askWorkers(cdp);
  return { page: (await least(page)) / full.page, worker: (await least(worker)) / full.worker, answer };
}
