import { assess, effects } from "@/lib/diagnosis";
import type { EngineAnswer, EngineRequest } from "./engine-messages";

function answerTo({ id, task, setup, readings }: EngineRequest): EngineAnswer {
  try {
    return task === "assess"
      ? { id, task, assessment: assess(setup, readings) }
      : { id, task, effects: effects(setup, readings) };
  } catch (error) {
    return { id, task: "failed", message: String(error) };
  }
}

/** The engine off the main thread, so that a key press is answered at once while a standing is worked out. */
self.addEventListener("message", (event: MessageEvent<EngineRequest>) => self.postMessage(answerTo(event.data)));
