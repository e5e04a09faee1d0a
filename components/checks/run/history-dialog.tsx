"use client";

import { Button } from "@/components/ui";
import { parseCheck } from "@/lib/diagnosis";
import { readingWords } from "@/lib/checks/check-name";
import { checkWords, stateWords, type Labels } from "@/lib/checks/check-words";
import type { RunStep } from "@/lib/checks/run";
import { effectiveSteps, readingSteps } from "@/lib/checks/run-state";
import { Dialog } from "./dialog";

type Standing = ReturnType<typeof effectiveSteps>[number];

interface RowProps { readonly step: Standing; readonly labels: Labels; readonly lastState: boolean; readonly onRetract: (step: Standing) => void; readonly onAgain: (check: string) => void }

function StateRow({ step, lastState, onRetract }: Pick<RowProps, "lastState" | "onRetract"> & { readonly step: Extract<Standing, { type: "state" }> }) {
  return (
    <li className="flex flex-wrap items-center justify-between gap-3 border-t border-quiet py-2 text-quiet">
      <span>Machine: {stateWords(step).join(" · ")}</span>
      {lastState ? <Button size="glove" onClick={() => onRetract(step)}>It is not like this</Button> : null}
    </li>
  );
}

function HistoryRow({ step, labels, lastState, onRetract, onAgain }: RowProps) {
  if (step.type === "state") return <StateRow step={step} lastState={lastState} onRetract={onRetract} />;
  const value = step.type === "reading" ? readingWords(step.check, step.value, null) : "could not be done";
  return (
    <li className="grid gap-2 border-t-2 border-rule py-3">
      <p className="flex flex-wrap items-baseline justify-between gap-x-4">
        <span>{checkWords(step.check, labels)}</span>
        <strong className="font-mono text-2xl">{value}</strong>
      </p>
      <div className="grid grid-cols-2 gap-2">
        <Button size="glove" onClick={() => onAgain(step.check)}>{step.type === "reading" ? "Correct it" : "Take it after all"}</Button>
        <Button size="glove" onClick={() => onRetract(step)}>Take it back</Button>
      </div>
    </li>
  );
}

interface HistoryDialogProps {
  readonly open: boolean;
  readonly labels: Labels;
  readonly steps: readonly RunStep[];
  readonly onClose: () => void;
  readonly onRetract: (step: Standing) => void;
  readonly onAgain: (check: string) => void;
}

/** Everything that stands so far, newest first; any reading may be corrected, taken again or taken back. */
export function HistoryDialog({ open, labels, steps, onClose, onRetract, onAgain }: HistoryDialogProps) {
  const current = new Set(readingSteps(steps).map((step) => step.id));
  const shown = effectiveSteps(steps).filter((step) => step.type !== "reading" || (current.has(step.id) && parseCheck(step.check) !== null));
  const lastState = shown.findLast((step) => step.type === "state");
  return (
    <Dialog open={open} title="Readings so far" onClose={onClose}>
      {shown.length === 0 ? <p>Nothing is read yet.</p> : null}
      <ol className="grid" reversed>
        {[...shown].reverse().map((step) => <HistoryRow key={step.id} step={step} labels={labels} lastState={step === lastState} onRetract={onRetract} onAgain={onAgain} />)}
      </ol>
    </Dialog>
  );
}
