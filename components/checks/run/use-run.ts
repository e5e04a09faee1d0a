"use client";

import { useCallback, useEffect, useRef, useState } from "react";
import { monotonicFactory } from "ulid";
import type { Run, RunStep } from "@/lib/checks/run";
import { orderedSteps } from "@/lib/checks/run-state";
import type { PhoneStanding, RunRecord } from "@/lib/offline/records";
import { keepRun, keepSteps, keptRun, phoneRunStore } from "@/lib/offline/run-store";

/** Each member of the union without the parts that are made here. */
export type NewStep = RunStep extends infer S ? (S extends RunStep ? Omit<S, "id" | "at"> : never) : never;

export type RunState =
  | { readonly state: "loading" } | { readonly state: "missing" }
  | { readonly state: "ready"; readonly run: Run; readonly record: RunRecord | null; /** False where the browser keeps nothing. */ readonly kept: boolean };

const nextId = monotonicFactory();

function stamp(step: NewStep): RunStep {
  return { ...step, id: nextId(), at: new Date().toISOString() };
}

/** What phone and server know together; steps carry their own order. */
async function loadRun(id: string, personId: string, known: Run | null): Promise<RunState> {
  try {
    if (known) {
      await keepRun({ id, personId, setup: known.setup, startedAt: new Date().toISOString(), started: true, finish: "no" });
      await keepSteps(id, known.steps, true);
    }
    const kept = await keptRun(id, personId);
    return kept ? { state: "ready", run: { ...kept.run, steps: orderedSteps(kept.run.steps) }, record: kept.record, kept: true } : { state: "missing" };
  } catch {
    return known ? { state: "ready", run: known, record: null, kept: false } : { state: "missing" };
  }
}

/**
 * A running check: read from the phone, joined with what the server has. `add` resolves once the steps
 * are on the phone's disk; only then does the screen move on. `end` asks for the verdict or gives the run up.
 */
export function useRun(id: string, personId: string, known: Run | null) {
  const [state, setState] = useState<RunState>({ state: "loading" });
  const knownRef = useRef(known);

  useEffect(() => {
    let gone = false;
    void loadRun(id, personId, knownRef.current).then((loaded) => { if (!gone) setState(loaded); });
    return () => { gone = true; };
  }, [id, personId]);

  const add = useCallback(async (steps: readonly NewStep[]): Promise<void> => {
    const stamped = steps.map(stamp);
    const kept = await keepSteps(id, stamped, false).then(() => true, () => false);
    setState((before) => before.state !== "ready" ? before
      : { ...before, kept: before.kept && kept, run: { ...before.run, steps: [...before.run.steps, ...stamped] } });
  }, [id]);

  const end = useCallback(async (finish: "no" | "asked" | "abandon", standing?: PhoneStanding): Promise<void> => {
    await phoneRunStore.updateRun(id, { finish, standing });
    setState((before) => before.state === "ready" && before.record ? { ...before, record: { ...before.record, finish } } : before);
  }, [id]);

  return { state, add, end };
}
