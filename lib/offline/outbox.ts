import type { RunRecord, RunStore } from "./records";

/** ok: taken. offline: no answer or a passing fault. signed-out: sign in first. refused: will never be taken like this. */
export type SendResult =
  | { readonly type: "ok" } | { readonly type: "offline" } | { readonly type: "signed-out" }
  | { readonly type: "refused"; readonly code: string; readonly message: string };

export type Send = (path: string, body: unknown) => Promise<SendResult>;
export type FlushResult = "clear" | "offline" | "signed-out" | "refused";

/** Steps in one request; the server takes bodies up to 256 KB. */
const BATCH = 100;

async function sendSteps(store: RunStore, send: Send, run: RunRecord): Promise<SendResult> {
  for (;;) {
    const batch = (await store.unsentSteps(run.id)).slice(0, BATCH);
    if (batch.length === 0) return { type: "ok" };
    const result = await send(`/api/checks/${run.id}/steps`, { steps: batch.map((record) => record.step) });
    if (result.type !== "ok") return result;
    await store.markSent(batch.map((record) => record.id));
  }
}

/** The verdict asked for, or giving the run up. */
async function sendEnd(send: Send, run: RunRecord): Promise<SendResult> {
  if (run.finish === "abandon") return send(`/api/checks/${run.id}/abandon`, {});
  const { standing, setup: { experience } } = run;
  return send(`/api/checks/${run.id}/finish`, standing ? { standing, ...(experience ? { experience } : {}) } : {});
}

/** Start, steps, end: in that order, each marked only after the server's answer, so that a replay does no harm. */
async function sendRun(store: RunStore, send: Send, run: RunRecord): Promise<SendResult> {
  if (!run.started) {
    const started = await send("/api/checks", { id: run.id, setup: run.setup, startedAt: run.startedAt });
    if (started.type !== "ok") return started;
    await store.updateRun(run.id, { started: true });
  }
  const steps = await sendSteps(store, send, run);
  if (steps.type !== "ok" || run.finish === "no" || run.finish === "done") return steps;
  const ended = await sendEnd(send, run);
  if (ended.type === "ok") await store.updateRun(run.id, { finish: "done" });
  return ended;
}

/**
 * Sends everything of one person that the server does not have yet. A refused run does not hold up the
 * others; a silent server or an ended session does. Never throws for an answer of the server.
 */
export async function flush(store: RunStore, send: Send, personId: string): Promise<FlushResult> {
  let worst: FlushResult = "clear";
  for (const run of await store.unsentRuns(personId)) {
    const result = await sendRun(store, send, run);
    if (result.type === "offline" || result.type === "signed-out") return result.type;
    if (result.type === "ok" && run.refusal) await store.updateRun(run.id, { refusal: undefined });
    if (result.type === "refused") {
      worst = "refused";
      await store.updateRun(run.id, { refusal: { code: result.code, message: result.message } });
    }
  }
  return worst;
}

/** Milliseconds to wait before try number `attempt` (from 0): 2 s doubling to 60 s. */
export function backoff(attempt: number): number {
  return Math.min(60_000, 2_000 * 2 ** Math.min(attempt, 10));
}
