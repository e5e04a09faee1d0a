"use client";

import { useId, useLayoutEffect, useRef, type ReactNode } from "react";
import { Button } from "@/components/ui";

interface DialogProps {
  readonly open: boolean;
  readonly title: string;
  readonly onClose: () => void;
  readonly children: ReactNode;
}

/** The browser's own modal dialog: it keeps the focus in, gives it back, and Escape closes it. */
export function Dialog({ open, title, onClose, children }: DialogProps) {
  const dialog = useRef<HTMLDialogElement>(null);
  const id = useId();
  // Before other effects: what stands inside measures itself, and a dialog that is not shown yet has no size.
  useLayoutEffect(() => {
    const element = dialog.current;
    if (open && element && !element.open) element.showModal();
    if (!open && element?.open) element.close();
  }, [open]);
  return (
    <dialog
      ref={dialog} aria-labelledby={id} onClose={onClose}
      className="m-auto max-h-[94dvh] w-[min(44rem,100vw)] max-w-none overflow-y-auto overscroll-contain border-2 border-rule bg-paper p-0 text-ink backdrop:bg-black/60"
    >
      {open ? (
        <div className="grid grid-cols-1 gap-4 p-4">
          <div className="flex items-start justify-between gap-4">
            <h2 id={id} tabIndex={-1} autoFocus className="text-2xl leading-tight font-bold outline-none!">{title}</h2>
            <Button size="glove" className="px-5" onClick={onClose}>Close</Button>
          </div>
          {children}
        </div>
      ) : null}
    </dialog>
  );
}
