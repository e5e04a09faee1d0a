import { answerTo } from "./engine-answer";
import type { EngineRequest } from "./engine-messages";

/** The engine off the main thread, so that a key press is answered at once while a standing is worked out. */
self.addEventListener("message", (event: MessageEvent<EngineRequest>) => { void answerTo(event.data).then((answer) => self.postMessage(answer)); });
