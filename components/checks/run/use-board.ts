"use client";

import { useEffect, useMemo, useState } from "react";
import type { Assessment } from "@/lib/diagnosis";
import type { Run } from "@/lib/checks/run";
import { nextScreen, whyChosen } from "@/lib/checks/run-screen";
import { machineState } from "@/lib/checks/run-state";
import type { PhoneStanding, RunRecord } from "@/lib/offline/records";
import { runActions } from "./run-actions";
import type { ToolName } from "./run-tools";
import { useDraft } from "./use-draft";
import { useEngine } from "./use-engine";
import type { useOutbox } from "./use-outbox";
import type { useRun } from "./use-run";
import { wiringFacts } from "./wiring-facts";

export interface BoardProps {
  readonly personId: string;
  readonly run: Run;
  readonly record: RunRecord | null;
  readonly kept: boolean;
  readonly outbox: ReturnType<typeof useOutbox>;
  readonly add: ReturnType<typeof useRun>["add"];
  readonly end: ReturnType<typeof useRun>["end"];
}

const judged = (assessment: Assessment | null) => (assessment && assessment.state !== "invalid-input" ? assessment : null);

/** What the phone believes, for the server to compare with its own; nothing while the engine has no answer. */
function phoneStanding(assessment: Assessment | null): PhoneStanding | undefined {
  const standing = judged(assessment);
  if (!standing) return undefined;
  const { state, kinds, others, pins, faults, openFindings, done, inseparable } = standing;
  return { state, kinds, others, pins, faults, openFindings, done, inseparable };
}

/** Asks for the verdict or gives the check up, and leaves for the server's page once the server has answered. */
function useEnding({ run, record, outbox, end }: BoardProps, current: Assessment | null) {
  const ending = record?.finish === "asked" || record?.finish === "abandon" ? record.finish : null;
  const ended = outbox.ended.has(run.id);
  useEffect(() => {
    if (ending && ended) window.location.assign(ending === "asked" ? `/checks/${run.id}` : "/checks");
  }, [ending, ended, run.id]);
  const finish = (how: "asked" | "abandon") => void end(how, how === "asked" ? phoneStanding(current) : undefined).then(outbox.flushNow);
  return { ending, finish };
}

/** Everything the running check's screen is made of. */
export function useBoard(props: BoardProps) {
  const { personId, run, outbox, add } = props;
  const engine = useEngine(run);
  const [draft, changeDraft] = useDraft(personId, run.id);
  const [tool, setTool] = useState<ToolName | null>(null);
  const { ending, finish } = useEnding(props, engine.current);
  const { flushNow } = outbox;
  const addAndSend = useMemo(() => async (steps: Parameters<typeof add>[0]) => {
    await add(steps);
    flushNow();
  }, [add, flushNow]);
  const actions = runActions({ steps: run.steps, add: addAndSend, changeDraft });
  const screen = nextScreen({ steps: run.steps, assessment: engine.current, chosen: draft.chosen, carryOn: draft.carryOn });
  const spec = screen.type === "reading" || screen.type === "state" ? screen.spec : null;
  const onTool = (name: ToolName) => {
    if (name === "undo") void actions.undo();
    else if (name === "proposed") changeDraft({ chosen: null, typed: null });
    else setTool(name);
  };
  return {
    engine, draft, changeDraft, tool, onTool, closeTool: () => setTool(null), actions, screen, spec, ending,
    finish: (how: "asked" | "abandon") => { setTool(null); finish(how); },
    standing: judged(engine.latest), why: spec ? whyChosen(engine.current, spec.code)?.why ?? null : null,
    facts: wiringFacts(run.setup, spec, machineState(run.steps), engine.latest),
  };
}
