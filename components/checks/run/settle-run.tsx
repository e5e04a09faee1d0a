"use client";

import { useEffect } from "react";
import { phoneRunStore } from "@/lib/offline/run-store";

/** On the page of a check that has ended: this phone need not offer it any more, wherever it was ended. */
export function SettleRun({ id }: { readonly id: string }) {
  useEffect(() => {
    // Blocked storage has nothing to settle.
    void phoneRunStore.updateRun(id, { started: true, finish: "done" }).catch(() => undefined);
  }, [id]);
  return null;
}
