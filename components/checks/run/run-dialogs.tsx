"use client";

import { useMemo } from "react";
import { vocabulary, type CheckSpec } from "@/lib/diagnosis";
import { readingWords } from "@/lib/checks/check-name";
import type { Run } from "@/lib/checks/run";
import { excludedChecks, readingSteps } from "@/lib/checks/run-state";
import { ChecksDialog } from "./checks-dialog";
import { Dialog } from "./dialog";
import { Drawing } from "./drawing";
import { HistoryDialog } from "./history-dialog";
import type { RunActions } from "./run-actions";
import type { ToolName } from "./run-tools";
import { SkipDialog } from "./skip-dialog";
import { StopDialog } from "./stop-dialog";
import type { WiringFacts } from "./wiring-graph";

interface RunDialogsProps {
  readonly open: ToolName | null;
  readonly run: Run;
  readonly spec: CheckSpec | null;
  readonly facts: WiringFacts;
  readonly actions: RunActions;
  readonly onClose: () => void;
  readonly onVerdict: () => void;
  readonly onAbandon: () => void;
}

/** Every dialog of the check; at most one is open. */
export function RunDialogs({ open, run, spec, facts, actions, onClose, onVerdict, onAbandon }: RunDialogsProps) {
  const labels = run.setup.cavityLabels;
  const taken = useMemo(() => new Map(readingSteps(run.steps).map((step) => [step.check, readingWords(step.check, step.value, null)])), [run.steps]);
  const excluded = useMemo(() => new Set(excludedChecks(run.steps, vocabulary())), [run.steps]);
  const choose = (check: string) => {
    actions.choose(check);
    onClose();
  };
  return (
    <>
      <Dialog open={open === "drawing"} title="The wiring" onClose={onClose}><Drawing facts={facts} /></Dialog>
      {spec ? <SkipDialog open={open === "skip"} spec={spec} onClose={onClose} onSkip={(reason) => { void actions.skip(spec, reason).then(onClose); }} /> : null}
      <ChecksDialog open={open === "another"} labels={labels} taken={taken} excluded={excluded} onClose={onClose} onChoose={choose} />
      <HistoryDialog open={open === "history"} labels={labels} steps={run.steps} onClose={onClose} onRetract={(step) => void actions.retract(step)} onAgain={choose} />
      <StopDialog open={open === "stop"} anyReading={taken.size > 0} onClose={onClose} onVerdict={onVerdict} onAbandon={onAbandon} />
    </>
  );
}
