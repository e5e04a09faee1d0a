import { assess, effects } from "@/lib/diagnosis";
import type { EngineAnswer, EngineRequest } from "./engine-messages";

/** The engine off the main thread, so that a key press is answered at once while a standing is worked out. */
self.addEventListener("message", (event: MessageEvent<EngineRequest>) => {
  const { id, task, setup, readings } = event.data;
  const answer: EngineAnswer = task === "assess"
    ? { id, task, assessment: assess(setup, readings) }
    : { id, task, effects: effects(setup, readings) };
  self.postMessage(answer);
});
