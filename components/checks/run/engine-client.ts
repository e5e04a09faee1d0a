import type { Reading, Setup } from "@/lib/diagnosis";
import type { EngineAnswer, EngineJob, EngineRequest, ResultOf } from "./engine-messages";

export interface EngineClient {
  /** Rejects when the engine failed, or gave up because newer readings came in. */
  ask<Job extends EngineJob>(job: Job, setup: Setup, readings: readonly Reading[]): Promise<ResultOf<Job>>;
  /** Whether it runs beside the page, so that the page answers meanwhile. */
  apart(): boolean;
  close(): void;
}

type Answerer = (request: EngineRequest) => Promise<EngineAnswer>;

/** The engine on the main thread, loaded when needed: for browsers where no worker can be started. */
const onThisThread: Answerer = async (request) => (await import("./engine-answer")).answerTo(request);

interface Waiting { readonly resolve: (answer: EngineAnswer) => void; readonly reject: (error: Error) => void; readonly request: EngineRequest }

function inWorker(worker: Worker): { readonly answer: Answerer; readonly apart: () => boolean } {
  const waiting = new Map<number, Waiting>();
  let failed = false;
  worker.addEventListener("message", (event: MessageEvent<EngineAnswer>) => {
    waiting.get(event.data.id)?.resolve(event.data);
    waiting.delete(event.data.id);
  });
  worker.addEventListener("error", () => {
    // The worker's script did not load or failed: answer what is waiting, and all later requests, on this thread.
    failed = true;
    const left = [...waiting.values()];
    waiting.clear();
    for (const { request, resolve, reject } of left) void onThisThread(request).then(resolve, reject);
  });
  const answer: Answerer = (request) => failed ? onThisThread(request) : new Promise((resolve, reject) => {
    waiting.set(request.id, { resolve, reject, request });
    worker.postMessage(request);
  });
  return { answer, apart: () => !failed };
}

function clientOf(answer: Answerer, apart: () => boolean, close: () => void): EngineClient {
  let lastId = 0;
  return {
    apart,
    close,
    async ask<Job extends EngineJob>(job: Job, setup: Setup, readings: readonly Reading[]) {
      const given = await answer({ id: ++lastId, job, setup, readings });
      if (given.state === "failed") throw new Error(given.message);
      // The answer carries its request's id, and so is the result of that job.
      return given.result as ResultOf<Job>;
    },
  };
}

/** Starts the engine in a worker, or on this thread where workers are not to be had. Same code, same answers. */
export function startEngine(): EngineClient {
  try {
    const worker = new Worker(new URL("./engine-worker.ts", import.meta.url), { type: "module" });
    const { answer, apart } = inWorker(worker);
    return clientOf(answer, apart, () => worker.terminate());
  } catch {
    return clientOf(onThisThread, () => false, () => undefined);
  }
}
