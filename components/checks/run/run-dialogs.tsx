"use client";

import { useMemo } from "react";
import { Button } from "@/components/ui";
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
import type { WiringFacts } from "./wiring-graph";

interface RunDialogsProps {
  readonly open: ToolName | null;
  readonly run: Run;
  readonly spec: CheckSpec | null;
  readonly facts: WiringFacts;
  readonly actions: RunActions;
  readonly onClose: () => void;
  readonly onVerdict: () => void;
}

/** Every dialog of the check; at most one is open. */
export function RunDialogs({ open, run, spec, facts, actions, onClose, onVerdict }: RunDialogsProps) {
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
      <Dialog open={open === "stop"} title="Stop here?" onClose={onClose}>
        <p className="text-lg">The verdict will say what is known so far and how sure that is. A finished check takes no more readings; start a re-check for those.</p>
        <p className="text-lg">Leave the machine safe: power off, test terminals out, connectors mated.</p>
        <Button tone="main" size="glove" className="w-full text-2xl" onClick={onVerdict}>See the verdict</Button>
      </Dialog>
    </>
  );
}
