"use client";

import { Button } from "@/components/ui";
import { Dialog } from "./dialog";

interface StopDialogProps {
  readonly open: boolean;
  readonly anyReading: boolean;
  readonly onClose: () => void;
  readonly onVerdict: () => void;
  readonly onAbandon: () => void;
}

/** Ends the check early: with a verdict on what is known, or without one. */
export function StopDialog({ open, anyReading, onClose, onVerdict, onAbandon }: StopDialogProps) {
  return (
    <Dialog open={open} title="Stop here?" onClose={onClose}>
      <p className="text-lg">Leave the machine safe: power off, test terminals out, connectors mated.</p>
      {anyReading ? (
        <>
          <p className="text-lg">The verdict says what is known so far and how sure that is. A finished check takes no more readings; a re-check does.</p>
          <Button tone="main" size="glove" className="w-full text-2xl" onClick={onVerdict}>See the verdict</Button>
        </>
      ) : <p className="text-lg">Nothing is read yet, so there is nothing to judge.</p>}
      <Button tone="stop" size="glove" className="w-full flex-col gap-0" onClick={onAbandon}>
        Give this check up
        <span className="text-base font-normal">no verdict; it stays in your log as abandoned</span>
      </Button>
    </Dialog>
  );
}
