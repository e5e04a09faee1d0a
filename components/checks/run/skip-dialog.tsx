"use client";

import { Button } from "@/components/ui";
import type { CheckSpec } from "@/lib/diagnosis";
import { SKIP_REASONS, type SkipReason } from "@/lib/checks/run";
import { usesLeads } from "@/lib/checks/check-words";
import { Dialog } from "./dialog";

const WORDS: Readonly<Record<SkipReason, string>> = {
  "cannot-reach": "I cannot reach it",
  "not-safe-here": "It is not safe here",
  "no-function-on-meter": "My meter has no such function",
  "cannot-part-connector": "The connector cannot be parted",
  "cannot-move-actuator": "The actuator cannot be moved",
  other: "Another reason",
};

/** Reasons that make sense for a check: a connector that stays mated stops no mated reading. */
export function reasonsFor(spec: CheckSpec): readonly SkipReason[] {
  return SKIP_REASONS.filter((reason) => {
    if (reason === "cannot-part-connector") return spec.state.deviceParted === true || spec.state.controllerParted === true;
    if (reason === "cannot-move-actuator") return spec.position === "full" || spec.position === "half" || spec.meter === "watch";
    if (reason === "no-function-on-meter") return usesLeads(spec);
    return true;
  });
}

interface SkipDialogProps { readonly open: boolean; readonly spec: CheckSpec; readonly onClose: () => void; readonly onSkip: (reason: SkipReason) => void }

/** Why a reading cannot be taken; one press, and the check carries on without it. */
export function SkipDialog({ open, spec, onClose, onSkip }: SkipDialogProps) {
  return (
    <Dialog open={open} title="Why can this one not be done?" onClose={onClose}>
      <p>The check carries on without it, and without others that the same reason rules out. You can still take them later under &ldquo;Another reading&rdquo;.</p>
      <div className="grid gap-2">
        {reasonsFor(spec).map((reason) => <Button key={reason} size="glove" className="w-full" onClick={() => onSkip(reason)}>{WORDS[reason]}</Button>)}
      </div>
    </Dialog>
  );
}
