import { describe, expect, it } from "vitest";
import { workOf } from "./work";

// Source of all values: made up by hand in the form that Chromium writes; times there are in microseconds.
const thread = (pid: number, tid: number, name: string) => ({ name: "thread_name", ph: "M", pid, tid, args: { name } });
const piece = (pid: number, tid: number, name: string, tdur: number) => ({ name, ph: "X", pid, tid, tdur });

describe("processor times of a trace", () => {
  it("are those of the page's tasks and of the messages its worker answered", () => {
    const events = [
      piece(7, 1, "ThreadControllerImpl::RunTask", 52_000), piece(7, 1, "ThreadControllerImpl::RunTask", 1_500), piece(7, 1, "HandlePostMessage", 900),
      piece(7, 9, "HandlePostMessage", 28_000), piece(7, 9, "ThreadControllerImpl::RunTask", 28_100),
      piece(8, 1, "ThreadControllerImpl::RunTask", 99_000), thread(7, 1, "CrRendererMain"), thread(7, 9, "DedicatedWorker thread"), thread(8, 1, "CrBrowserMain"),
    ];
    expect(workOf(events)).toEqual({ page: [52, 1.5], engine: [28] });
  });

  it("are none where no thread has a name", () => {
    expect(workOf([piece(7, 1, "ThreadControllerImpl::RunTask", 52_000)])).toEqual({ page: [], engine: [] });
  });
});
