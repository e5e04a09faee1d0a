/** A stretch in which the page could not draw: how long, and what ran meanwhile. */
export interface Frame { readonly at: number; readonly ms: number; readonly drawing: number; readonly scripts: readonly { readonly what: string; readonly ms: number }[] }
export interface Input { readonly at: number; readonly name: string; readonly ms: number }

/** What the page has seen so far; times in ms since it was opened. */
export interface Seen { readonly tasks: { readonly at: number; readonly ms: number }[]; readonly frames: Frame[]; readonly inputs: Input[] }

interface Observer extends Seen {
  /** From the press just armed to the next screen of the check, in ms. */
  next: Promise<number>;
  readonly arm: () => void;
}
declare global { interface Window { bench: Observer } }

interface LongFrame extends PerformanceEntry {
  readonly renderStart: number;
  readonly scripts: readonly { readonly invoker: string; readonly sourceFunctionName: string; readonly duration: number }[];
}
interface Interaction extends PerformanceEntry { readonly interactionId: number }

/** Runs in the page before its own scripts: notes long tasks, long frames, slow answers to input, and how long the next screen takes. */
export function observe(): void {
  const seen: Seen = { tasks: [], frames: [], inputs: [] };
  const each = <T extends PerformanceEntry>(options: PerformanceObserverInit & { durationThreshold?: number }, note: (entry: T) => void) =>
    new PerformanceObserver((list) => { for (const entry of list.getEntries()) note(entry as T); }).observe(options);
  each({ type: "longtask", buffered: true }, ({ startTime, duration }) => seen.tasks.push({ at: startTime, ms: duration }));
  each<LongFrame>({ type: "long-animation-frame", buffered: true }, ({ startTime, duration, renderStart, scripts }) => seen.frames.push({
    at: startTime, ms: duration, drawing: renderStart > 0 ? startTime + duration - renderStart : 0,
    scripts: scripts.map((script) => ({ what: `${script.invoker} ${script.sourceFunctionName}`.trim(), ms: script.duration })),
  }));
  each<Interaction>({ type: "event", buffered: true, durationThreshold: 16 }, ({ startTime, name, duration, interactionId }) => {
    if (interactionId > 0) seen.inputs.push({ at: startTime, name, ms: duration });
  });
  const screen = () => `${document.querySelector("main [data-check]")?.getAttribute("data-check") ?? ""} ${document.querySelector("main h1")?.textContent ?? ""}`;
  const arm = () => {
    const before = screen();
    window.bench.next = new Promise((resolve) => {
      let pressed = 0, thinking = false;
      document.addEventListener("click", (event) => { pressed = event.timeStamp; }, { capture: true, once: true });
      const watch = new MutationObserver(() => {
        const now = screen();
        if (/Working out/.test(now)) thinking = true;
        else if (thinking || now !== before) {
          watch.disconnect();
          resolve(performance.now() - pressed);
        }
      });
      watch.observe(document.body, { subtree: true, childList: true, characterData: true, attributes: true, attributeFilter: ["data-check"] });
    });
  };
  window.bench = { ...seen, next: Promise.resolve(0), arm };
}
