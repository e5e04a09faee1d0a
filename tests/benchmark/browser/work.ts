import type { Browser, Page } from "playwright-core";

/** How long processors worked on each piece, in ms: waiting for other programs is not in it, as it is in what the clock says. */
export interface Work {
  /** Tasks of the page's main thread, at the rate that it is slowed by. */
  readonly page: readonly number[];
  /** Answers of the engine in its worker, not slowed. */
  readonly engine: readonly number[];
}

interface TraceEvent { readonly name: string; readonly ph: string; readonly pid: number; readonly tid: number; readonly tdur?: number; readonly args?: { readonly name?: string } }

const CATEGORIES = ["-*", "toplevel", "devtools.timeline", "__metadata"];
const PAGE = "CrRendererMain", WORKER = "DedicatedWorker";

/** Reads processor times out of a trace: tasks of main threads, messages answered by workers. */
export function workOf(events: readonly TraceEvent[]): Work {
  const threads = new Map(events.filter(({ name, ph }) => ph === "M" && name === "thread_name").map(({ pid, tid, args }) => [`${pid} ${tid}`, args?.name ?? ""]));
  const spent = (thread: string, what: string) => events.filter(({ name, ph, pid, tid }) => ph === "X" && name === what && (threads.get(`${pid} ${tid}`) ?? "").startsWith(thread)).map(({ tdur = 0 }) => tdur / 1000);
  return { page: spent(PAGE, "ThreadControllerImpl::RunTask"), engine: spent(WORKER, "HandlePostMessage") };
}

/** Does something on the page and tells what processors worked on meanwhile. */
export async function watched<T>(browser: Browser, page: Page, act: () => Promise<T>): Promise<{ readonly result: T; readonly work: Work }> {
  await browser.startTracing(page, { categories: CATEGORIES });
  const result = await act();
  const { traceEvents } = JSON.parse((await browser.stopTracing()).toString("utf8")) as { traceEvents: TraceEvent[] };
  return { result, work: workOf(traceEvents) };
}
