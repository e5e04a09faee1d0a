"use client";

import { useEffect, useMemo, useRef, useState } from "react";
import { vocabulary, type Assessment, type Reading, type Setup } from "@/lib/diagnosis";
import type { Run } from "@/lib/checks/run";
import { effectiveReadings, engineSetup } from "@/lib/checks/run-state";
import { startEngine, type EngineClient } from "./engine-client";
import type { EngineJob, ResultOf } from "./engine-messages";

export interface EngineState {
  /** The answer to exactly the present steps; null while it is worked out. */
  readonly current: Assessment | null;
  /** The last answer there was, shown meanwhile. */
  readonly latest: Assessment | null;
  readonly failed: boolean;
  readonly setup: Setup;
  readonly readings: readonly Reading[];
}

interface Answer<T> { readonly key: string; readonly value: T | null }

let shared: EngineClient | null = null;

/** One engine for the page; it stays so that its script is there when the server no longer is. */
export function sharedEngine(): EngineClient {
  shared ??= startEngine();
  return shared;
}

/** The live standing of a run, worked out on the phone. */
export function useEngine(run: Run): EngineState {
  const setup = useMemo(() => engineSetup(run, vocabulary()), [run]);
  const readings = useMemo(() => effectiveReadings(run.steps), [run.steps]);
  const key = useMemo(() => JSON.stringify([setup, readings]), [setup, readings]);
  const [answer, setAnswer] = useState<Answer<Assessment>>({ key: "", value: null });
  const asked = useRef("");

  useEffect(() => {
    asked.current = key;
    const [askedSetup, askedReadings] = JSON.parse(key) as [Setup, Reading[]];
    const settle = (value: Assessment | null) => { if (asked.current === key) setAnswer((before) => ({ key, value: value ?? before.value })); };
    sharedEngine().ask({ task: "assess" }, askedSetup, askedReadings).then(settle, () => {
      if (asked.current === key) setAnswer({ key: `failed ${key}`, value: null });
    });
  }, [key]);

  return { current: answer.key === key ? answer.value : null, latest: answer.value, failed: answer.key === `failed ${key}`, setup, readings };
}

/** Not asked; being worked out; worked out; or not to be had. */
export type Explained<T> = { readonly state: "idle" | "working" | "failed" } | { readonly state: "ready"; readonly value: T };

/** An explanation of the present readings, worked out on the phone, only while a job is given. */
export function useExplained<Job extends EngineJob>(job: Job | null, setup: Setup, readings: readonly Reading[]): Explained<ResultOf<Job>> {
  const key = job ? JSON.stringify([job, setup, readings]) : "";
  const [answer, setAnswer] = useState<{ readonly key: string; readonly explained: Explained<ResultOf<Job>> }>({ key: "", explained: { state: "idle" } });

  useEffect(() => {
    if (key === "") return;
    let gone = false;
    const [askedJob, askedSetup, askedReadings] = JSON.parse(key) as [Job, Setup, Reading[]];
    void sharedEngine().ask(askedJob, askedSetup, askedReadings).then(
      (value) => { if (!gone) setAnswer({ key, explained: { state: "ready", value } }); },
      () => { if (!gone) setAnswer({ key, explained: { state: "failed" } }); },
    );
    return () => { gone = true; };
  }, [key]);

  if (key === "") return { state: "idle" };
  return answer.key === key ? answer.explained : { state: "working" };
}
