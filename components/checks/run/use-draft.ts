"use client";

import { useCallback, useState } from "react";
import { loadDraft, saveDraft, type Draft } from "@/lib/offline/draft";

/** What is on the screen but not yet a step; kept on the phone at every change. Only for use in the browser. */
export function useDraft(personId: string, runId: string) {
  const [draft, setDraft] = useState<Draft>(() => loadDraft(window.localStorage, personId, runId));
  const change = useCallback((part: Partial<Draft>): void => {
    setDraft((before) => {
      const next = { ...before, ...part };
      saveDraft(window.localStorage, personId, runId, next);
      return next;
    });
  }, [personId, runId]);
  return [draft, change] as const;
}
