import type { Assessment, Reading, ReadingEffect, Setup } from "@/lib/diagnosis";
import type { EngineAnswer, EngineRequest } from "./engine-messages";

export interface EngineClient {
  assess(setup: Setup, readings: readonly Reading[]): Promise<Assessment>;
  effects(setup: Setup, readings: readonly Reading[]): Promise<readonly ReadingEffect[]>;
  close(): void;
}

/** The engine on the main thread, loaded when needed: for browsers where no worker can be started. */
function mainThreadClient(): EngineClient {
  const engine = import("@/lib/diagnosis");
  return {
    assess: async (setup, readings) => (await engine).assess(setup, readings),
    effects: async (setup, readings) => (await engine).effects(setup, readings),
    close: () => undefined,
  };
}

interface Waiting { readonly resolve: (answer: EngineAnswer) => void; readonly reject: (error: Error) => void; readonly request: EngineRequest }

function workerClient(worker: Worker): EngineClient {
  const waiting = new Map<number, Waiting>();
  let lastId = 0;
  let fallback: EngineClient | null = null;
  worker.addEventListener("message", (event: MessageEvent<EngineAnswer>) => {
    waiting.get(event.data.id)?.resolve(event.data);
    waiting.delete(event.data.id);
  });
  worker.addEventListener("error", () => {
    // The worker's script did not load or failed: answer what is waiting, and all later requests, on this thread.
    fallback ??= mainThreadClient();
    const left = [...waiting.values()];
    waiting.clear();
    for (const { request, resolve, reject } of left) void here(fallback, request).then(resolve, reject);
  });
  function ask(task: EngineRequest["task"], setup: Setup, readings: readonly Reading[]): Promise<EngineAnswer> {
    const request: EngineRequest = { id: ++lastId, task, setup, readings };
    if (fallback) return here(fallback, request);
    return new Promise((resolve, reject) => {
      waiting.set(request.id, { resolve, reject, request });
      worker.postMessage(request);
    });
  }
  return {
    assess: async (setup, readings) => expectTask(await ask("assess", setup, readings), "assess").assessment,
    effects: async (setup, readings) => expectTask(await ask("effects", setup, readings), "effects").effects,
    close: () => worker.terminate(),
  };
}

async function here(engine: EngineClient, { id, task, setup, readings }: EngineRequest): Promise<EngineAnswer> {
  return task === "assess"
    ? { id, task, assessment: await engine.assess(setup, readings) }
    : { id, task, effects: await engine.effects(setup, readings) };
}

function expectTask<T extends EngineRequest["task"]>(answer: EngineAnswer, task: T): Extract<EngineAnswer, { task: T }> {
  if (answer.task === "failed") throw new Error(answer.message);
  if (answer.task !== task) throw new Error(`engine answered ${answer.task} to ${task}`);
  return answer as Extract<EngineAnswer, { task: T }>;
}

/** Starts the engine in a worker, or on this thread where workers are not to be had. Same code, same answers. */
export function startEngine(): EngineClient {
  try {
    return workerClient(new Worker(new URL("./engine-worker.ts", import.meta.url), { type: "module" }));
  } catch {
    return mainThreadClient();
  }
}
