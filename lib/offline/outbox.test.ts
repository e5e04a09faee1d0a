import { describe, expect, it } from "vitest";
import { backoff, flush, type SendResult } from "./outbox";
import type { RunRecord, RunStore, StepRecord } from "./records";

const run = (id: string, change: Partial<RunRecord> = {}): RunRecord => ({
  id, personId: "p1", setup: { cavityLabels: ["1", "2", "3"] }, startedAt: "2026-03-02T09:00:00.000Z", started: false, finish: "no", ...change,
});
const step = (id: string, runId: string): StepRecord => ({
  id, runId, sent: false, step: { id, at: "2026-03-02T09:00:00.000Z", type: "reading", check: "volt:battery", value: 12.6, typed: "12.6 V" },
});

function memoryStore(runs: RunRecord[], steps: StepRecord[]): RunStore & { runs: RunRecord[]; steps: StepRecord[] } {
  const waiting = (r: RunRecord) => !r.started || r.finish === "asked" || r.finish === "abandon" || steps.some((s) => s.runId === r.id && !s.sent);
  return {
    runs, steps,
    unsentRuns: async (personId) => runs.filter((r) => r.personId === personId && waiting(r)),
    unsentSteps: async (runId) => steps.filter((s) => s.runId === runId && !s.sent),
    updateRun: async (id, change) => { runs.splice(0, runs.length, ...runs.map((r) => (r.id === id ? { ...r, ...change } : r))); },
    markSent: async (ids) => { steps.splice(0, steps.length, ...steps.map((s) => (ids.includes(s.id) ? { ...s, sent: true } : s))); },
  };
}

/** A server that answers by path and remembers what it was asked. */
function server(answer: (path: string) => SendResult) {
  const asked: string[] = [];
  return { asked, send: async (path: string): Promise<SendResult> => { asked.push(path); return answer(path); } };
}
const ok = (): SendResult => ({ type: "ok" });

describe("flush", () => {
  it("sends start, steps and finish in that order, once", async () => {
    const store = memoryStore([run("r1", { finish: "asked" })], [step("s1", "r1"), step("s2", "r1")]);
    const { asked, send } = server(ok);
    expect(await flush(store, send, "p1")).toBe("clear");
    expect(asked).toEqual(["/api/checks", "/api/checks/r1/steps", "/api/checks/r1/finish"]);
    expect(await flush(store, send, "p1")).toBe("clear");
    expect(asked).toHaveLength(3);
  });

  it("says at start and finish which own checks the phone counted in", async () => {
    const experience = { kinds: {}, findings: { none: 2 } };
    const standing = { state: "ranked", kinds: [], others: [], pins: [], faults: [], openFindings: [], done: true, inseparable: false } as const;
    const store = memoryStore([run("r1", { setup: { cavityLabels: ["1", "2", "3"], experience }, finish: "asked", standing })], []);
    const bodies: unknown[] = [];
    await flush(store, async (_path, body) => { bodies.push(body); return ok(); }, "p1");
    expect(bodies).toMatchObject([{ setup: { experience } }, { standing, experience }]);
  });

  it("gives a run up on the server without asking for a verdict", async () => {
    const store = memoryStore([run("r1", { started: true, finish: "abandon" })], []);
    const { asked, send } = server(ok);
    await flush(store, send, "p1");
    expect(asked).toEqual(["/api/checks/r1/abandon"]);
    expect(store.runs[0]?.finish).toBe("done");
  });

  it("keeps everything while the server is silent and sends it when it answers", async () => {
    const store = memoryStore([run("r1")], [step("s1", "r1")]);
    expect(await flush(store, async () => ({ type: "offline" }), "p1")).toBe("offline");
    expect(store.steps[0]?.sent).toBe(false);
    expect(store.runs[0]?.started).toBe(false);
    expect(await flush(store, server(ok).send, "p1")).toBe("clear");
    expect(store.steps[0]?.sent).toBe(true);
  });

  it("does not start a run again when only the steps failed", async () => {
    const store = memoryStore([run("r1")], [step("s1", "r1")]);
    await flush(store, server((path) => (path.endsWith("/steps") ? { type: "offline" } : ok())).send, "p1");
    const { asked, send } = server(ok);
    await flush(store, send, "p1");
    expect(asked).toEqual(["/api/checks/r1/steps"]);
  });

  it("sends nothing of another person and stops at an ended session", async () => {
    const store = memoryStore([run("r1"), run("r2", { personId: "p2" })], []);
    const { asked, send } = server(() => ({ type: "signed-out" }));
    expect(await flush(store, send, "p1")).toBe("signed-out");
    expect(asked).toEqual(["/api/checks"]);
  });

  it("notes a refusal on its run and goes on to the next run", async () => {
    const store = memoryStore([run("r1"), run("r2")], []);
    let first = true;
    const send = async (): Promise<SendResult> => {
      if (!first) return ok();
      first = false;
      return { type: "refused", code: "invalid-input", message: "Three different labels are needed." };
    };
    expect(await flush(store, send, "p1")).toBe("refused");
    expect(store.runs.map((r) => r.refusal?.code ?? r.started)).toEqual(["invalid-input", true]);
  });

  it("sends a long check in batches", async () => {
    const store = memoryStore([run("r1", { started: true })], Array.from({ length: 230 }, (_, i) => step(`s${i}`, "r1")));
    const { asked, send } = server(ok);
    await flush(store, send, "p1");
    expect(asked).toHaveLength(3);
    expect(store.steps.every((s) => s.sent)).toBe(true);
  });
});

describe("backoff", () => {
  it("doubles from 2 s and never waits over a minute", () => {
    expect([0, 1, 2, 3].map(backoff)).toEqual([2000, 4000, 8000, 16000]);
    expect(backoff(50)).toBe(60_000);
  });
});
