import type { Run, RunStep } from "@/lib/checks/run";
import { phoneDatabase } from "./database";
import type { RunRecord, RunStore, StepRecord } from "./records";

/** Strict: the promise settles only when the bytes are on the disk, so that a flat battery costs no reading. */
const STRICT = { durability: "strict" } as const;

const isEnding = (run: RunRecord): boolean => run.finish === "asked" || run.finish === "abandon";

async function stepsOf(runId: string): Promise<readonly StepRecord[]> {
  return (await phoneDatabase()).getAllFromIndex("steps", "run", runId);
}

/** Keeps a new run on the phone. Keeping the same one twice changes nothing. */
export async function keepRun(record: RunRecord): Promise<void> {
  const tx = (await phoneDatabase()).transaction("runs", "readwrite", STRICT);
  if (!(await tx.store.get(record.id))) await tx.store.put(record);
  await tx.done;
}

/** Keeps steps with the run; a step that is there already keeps its mark of having been sent. */
export async function keepSteps(runId: string, steps: readonly RunStep[], sent: boolean): Promise<void> {
  const tx = (await phoneDatabase()).transaction("steps", "readwrite", STRICT);
  for (const step of steps) {
    const known = await tx.store.get(step.id);
    await tx.store.put({ id: step.id, runId, step, sent: sent || (known?.sent ?? false) });
  }
  await tx.done;
}

export interface KeptRun { readonly record: RunRecord; readonly run: Run; readonly unsent: number }

/** The run as this phone has it, or null when it has none or it is another person's. */
export async function keptRun(id: string, personId: string): Promise<KeptRun | null> {
  const record = await (await phoneDatabase()).get("runs", id);
  if (!record || record.personId !== personId) return null;
  const steps = await stepsOf(id);
  const unsent = steps.filter((step) => !step.sent).length + (record.started ? 0 : 1);
  return { record, run: { id, setup: record.setup, steps: steps.map((step) => step.step) }, unsent };
}

/** This person's runs on this phone that are not yet finished on the server, newest first. */
export async function openRuns(personId: string): Promise<readonly RunRecord[]> {
  const runs = await (await phoneDatabase()).getAllFromIndex("runs", "person", personId);
  return runs.filter((run) => run.finish !== "done").sort((a, b) => (a.id < b.id ? 1 : -1));
}

/** What the server said of this person's runs: its sentence for each that it refused, and those it has ended. */
export async function serverAnswers(personId: string): Promise<{ readonly refused: ReadonlyMap<string, string>; readonly ended: ReadonlySet<string> }> {
  const runs = await (await phoneDatabase()).getAllFromIndex("runs", "person", personId);
  return {
    refused: new Map(runs.flatMap((run) => (run.refusal ? [[run.id, run.refusal.message] as const] : []))),
    ended: new Set(runs.filter((run) => run.finish === "done").map((run) => run.id)),
  };
}

/** Things still to be sent for this person: runs not started on the server, steps, and verdicts asked for. */
export async function countUnsent(personId: string): Promise<number> {
  const runs = await phoneRunStore.unsentRuns(personId);
  const counts = await Promise.all(runs.map(async (run) =>
    (run.started ? 0 : 1) + (isEnding(run) ? 1 : 0) + (await phoneRunStore.unsentSteps(run.id)).length));
  return counts.reduce((sum, count) => sum + count, 0);
}

/** The store behind the outbox. */
export const phoneRunStore: RunStore = {
  async unsentRuns(personId) {
    const runs = await (await phoneDatabase()).getAllFromIndex("runs", "person", personId);
    const open = await Promise.all(runs.map(async (run) => {
      if (run.finish === "done") return [];
      const waiting = !run.started || isEnding(run) || (await phoneRunStore.unsentSteps(run.id)).length > 0;
      return waiting ? [run] : [];
    }));
    return open.flat().sort((a, b) => (a.id < b.id ? -1 : 1));
  },
  async unsentSteps(runId) {
    return (await stepsOf(runId)).filter((step) => !step.sent).sort((a, b) => (a.id < b.id ? -1 : 1));
  },
  async updateRun(id, change) {
    const tx = (await phoneDatabase()).transaction("runs", "readwrite", STRICT);
    const record = await tx.store.get(id);
    if (record) await tx.store.put({ ...record, ...change });
    await tx.done;
  },
  async markSent(stepIds) {
    const tx = (await phoneDatabase()).transaction("steps", "readwrite", STRICT);
    for (const id of stepIds) {
      const known = await tx.store.get(id);
      if (known) await tx.store.put({ ...known, sent: true });
    }
    await tx.done;
  },
};
