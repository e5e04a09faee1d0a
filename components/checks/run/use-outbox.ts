"use client";

import { useCallback, useEffect, useRef, useState } from "react";
import { backoff, flush, type FlushResult } from "@/lib/offline/outbox";
import { countUnsent, phoneRunStore, serverAnswers } from "@/lib/offline/run-store";
import { sendToServer } from "@/lib/offline/send";

export interface OutboxState {
  readonly unsent: number;
  readonly last: FlushResult | null;
  /** The server's sentence for each run that it refused. */
  readonly refused: ReadonlyMap<string, string>;
  /** Runs that the server has ended, with a verdict or without. */
  readonly ended: ReadonlySet<string>;
}

const NOTHING: OutboxState = { unsent: 0, last: null, refused: new Map(), ended: new Set() };

/** One tab sends at a time; another one that finds the lock taken leaves it to that one. */
async function flushAlone(personId: string): Promise<FlushResult | null> {
  const send = () => flush(phoneRunStore, sendToServer, personId);
  if (!("locks" in navigator)) return send();
  return navigator.locks.request("pinwright-outbox", { ifAvailable: true }, (lock) => (lock ? send() : null));
}

/**
 * Sends what the phone keeps: at the start, when the window gets the focus, when the phone comes online, and
 * by a timer that waits longer after each silent try.
 */
export function useOutbox(personId: string) {
  const [state, setState] = useState<OutboxState>(NOTHING);
  const attempt = useRef(0);
  const timer = useRef<ReturnType<typeof setTimeout> | undefined>(undefined);
  const runAgain = useRef<() => void>(() => undefined);

  const run = useCallback(async (): Promise<void> => {
    clearTimeout(timer.current);
    try {
      const last = await flushAlone(personId);
      const unsent = await countUnsent(personId);
      const answers = await serverAnswers(personId);
      setState((before) => ({ unsent, last: last ?? before.last, ...answers }));
      attempt.current = last === "clear" && unsent === 0 ? 0 : attempt.current + 1;
      if (unsent > 0) timer.current = setTimeout(() => runAgain.current(), backoff(attempt.current - 1));
    } catch {
      // Storage blocked: there is nothing kept that could be sent; the run itself says so.
      setState(NOTHING);
    }
  }, [personId]);

  const flushNow = useCallback(() => {
    attempt.current = 0;
    void run();
  }, [run]);

  useEffect(() => {
    runAgain.current = () => void run();
    timer.current = setTimeout(flushNow);
    const onVisible = () => { if (document.visibilityState === "visible") flushNow(); };
    window.addEventListener("focus", flushNow);
    window.addEventListener("online", flushNow);
    document.addEventListener("visibilitychange", onVisible);
    return () => {
      clearTimeout(timer.current);
      window.removeEventListener("focus", flushNow);
      window.removeEventListener("online", flushNow);
      document.removeEventListener("visibilitychange", onVisible);
    };
  }, [run, flushNow]);

  return { ...state, flushNow };
}
