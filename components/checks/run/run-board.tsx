"use client";

import { useEffect, useMemo, useState } from "react";
import type { Assessment } from "@/lib/diagnosis";
import type { Run } from "@/lib/checks/run";
import { nextScreen, whyChosen } from "@/lib/checks/run-screen";
import { machineState, undoable } from "@/lib/checks/run-state";
import type { RunRecord } from "@/lib/offline/records";
import { ContradictionBanner } from "./contradiction-banner";
import { Drawing } from "./drawing";
import { FinishingScreen } from "./finishing-screen";
import { typeAhead } from "./reading-entry";
import { runActions } from "./run-actions";
import { RunDialogs } from "./run-dialogs";
import { ScreenAnswer, ScreenGuide } from "./run-screen-view";
import { RunTools, type ToolName } from "./run-tools";
import { SentMark } from "./sent-mark";
import { StandingPanel } from "./standing-panel";
import { useDraft } from "./use-draft";
import { useEngine } from "./use-engine";
import type { useOutbox } from "./use-outbox";
import type { useRun } from "./use-run";
import { wiringFacts } from "./wiring-facts";

interface RunBoardProps {
  readonly personId: string;
  readonly run: Run;
  readonly record: RunRecord | null;
  readonly kept: boolean;
  readonly outbox: ReturnType<typeof useOutbox>;
  readonly add: ReturnType<typeof useRun>["add"];
  readonly askFinish: ReturnType<typeof useRun>["askFinish"];
}

const judged = (assessment: Assessment | null) => (assessment && assessment.state !== "invalid-input" ? assessment : null);

/** Tools that make sense on a screen. */
function toolsFor(spec: boolean, chosen: boolean): readonly ToolName[] {
  return [...(spec ? ["skip"] as const : []), ...(chosen ? ["proposed"] as const : []), "another", "undo", "history", "drawing", "stop"];
}

/** The running check: what to do now, where the reading goes in, and what is believed so far. */
export function RunBoard({ personId, run, record, kept, outbox, add, askFinish }: RunBoardProps) {
  const engine = useEngine(run);
  const [draft, changeDraft] = useDraft(personId, run.id);
  const [tool, setTool] = useState<ToolName | null>(null);
  const { flushNow } = outbox;
  const sendingAdd = useMemo(() => async (steps: Parameters<typeof add>[0]) => {
    await add(steps);
    flushNow();
  }, [add, flushNow]);
  const actions = runActions({ steps: run.steps, add: sendingAdd, changeDraft });
  const finishing = record?.finish === "asked";
  const screen = nextScreen({ steps: run.steps, assessment: engine.current, chosen: draft.chosen, carryOn: draft.carryOn });
  const spec = screen.type === "reading" || screen.type === "state" ? screen.spec : null;
  const facts = wiringFacts(run.setup, spec, machineState(run.steps), engine.latest);
  const standing = judged(engine.latest);

  useEffect(() => {
    // The server has the verdict: its page takes over.
    if (finishing && outbox.last === "clear" && outbox.unsent === 0) window.location.assign(`/checks/${run.id}`);
  }, [finishing, outbox.last, outbox.unsent, run.id]);

  const verdict = () => {
    setTool(null);
    const { kinds = [], pins = [], faults = [] } = judged(engine.current) ?? {};
    void askFinish(engine.current ? { kinds, pins, faults } : undefined).then(flushNow);
  };
  const onTool = (name: ToolName) => {
    if (name === "undo") void actions.undo();
    else if (name === "proposed") changeDraft({ chosen: null, typed: null });
    else setTool(name);
  };

  return (
    <div onKeyDown={typeAhead} className="mx-auto max-w-lg lg:grid lg:max-w-6xl lg:grid-cols-[minmax(0,1fr)_minmax(0,27rem)] lg:grid-rows-[auto_auto_1fr] lg:gap-x-10">
      <StandingPanel engine={engine} labels={run.setup.cavityLabels} why={spec ? whyChosen(engine.current, spec.code)?.why ?? null : null} chosen={draft.chosen !== null} />
      <div className="grid content-start gap-4 py-3 lg:col-start-1 lg:row-span-3 lg:row-start-1">
        {engine.current?.state === "contradictory" && !finishing ? <ContradictionBanner assessment={engine.current} labels={run.setup.cavityLabels} onAgain={actions.choose} /> : null}
        {finishing
          ? <FinishingScreen outbox={outbox} refusal={outbox.last === "refused" ? record?.refusal?.message ?? "" : null} onRetry={flushNow} />
          : <ScreenGuide screen={screen} failed={engine.failed} setup={run.setup} standing={standing} actions={actions} onVerdict={verdict} onCarryOn={() => changeDraft({ carryOn: true })} />}
        <div className="hidden border-t-2 border-rule pt-3 lg:block"><Drawing facts={facts} /></div>
      </div>
      <div className="grid content-start gap-4 pb-6 lg:col-start-2 lg:row-start-2 lg:pt-3">
        {screen.type === "reading" && !finishing ? <ScreenAnswer spec={screen.spec} typed={draft.typed} onTyped={(typed) => changeDraft({ typed })} actions={actions} /> : null}
        {finishing ? null : <RunTools tools={toolsFor(spec !== null, draft.chosen !== null)} canUndo={undoable(run.steps) !== null} onTool={onTool} />}
        <SentMark outbox={outbox} kept={kept} />
      </div>
      <RunDialogs open={tool} run={run} spec={spec} facts={facts} actions={actions} onClose={() => setTool(null)} onVerdict={verdict} />
    </div>
  );
}
