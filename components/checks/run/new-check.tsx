"use client";

import { useCallback, useEffect, useRef, useState } from "react";
import { ulid } from "ulid";
import { PageHeading } from "@/components/ui";
import type { RunSetup } from "@/lib/checks/run";
import type { SetupChoices, SetupEntry } from "@/lib/checks/setup-form";
import { keepRun } from "@/lib/offline/run-store";
import type { Experience } from "@/lib/diagnosis";
import { LazyCheckRun, warmCheckRun } from "./check-run-lazy";
import { OpenRuns } from "./open-runs";
import { SetupForm } from "./setup-form";

interface NewCheckProps {
  readonly personId: string;
  readonly entry: SetupEntry | null;
  readonly choices: SetupChoices;
  readonly machineId: string;
  /** The workshop's own counts in force, which this check is judged by to its end, on the phone as on the server. */
  readonly experience: Experience;
}

/** Milliseconds after the page is there: long enough for it to be read and used first. */
const WARM_AFTER = 3_000;

/**
 * Fetches the check's screens and engine with the first touch, or a little later without one: the page itself stays
 * light, and the check is there should the server go. The engine is run in, until a check begins.
 */
function useWarmUp(): { readonly warm: () => void; readonly begin: () => void } {
  const warmed = useRef(false), begun = useRef(false);
  const warm = useCallback(() => {
    if (warmed.current) return;
    warmed.current = true;
    warmCheckRun();
    void Promise.all([import("./use-engine"), import("./engine-warm-up")]).then(
      ([{ sharedEngine }, { warmUp }]) => warmUp(sharedEngine(), () => !begun.current).catch(() => undefined), () => { warmed.current = false; },
    );
  }, []);
  useEffect(() => {
    const timer = setTimeout(warm, WARM_AFTER);
    return () => clearTimeout(timer);
  }, [warm]);
  const begin = useCallback(() => { begun.current = true; }, []);
  return { warm, begin };
}

/**
 * Starts a check on the phone and goes straight into it, on the same page: the server need not answer.
 * The address becomes the check's own, so that a reload comes back to it.
 */
export function NewCheck({ personId, entry, choices, machineId, experience }: NewCheckProps) {
  const [started, setStarted] = useState<string | null>(null);

  const { warm, begin } = useWarmUp();

  const start = async (setup: RunSetup) => {
    begin();
    const id = ulid();
    await keepRun({ id, personId, setup: { ...setup, experience }, startedAt: new Date().toISOString(), started: false, finish: "no" });
    window.history.replaceState(null, "", `/checks/${id}`);
    setStarted(id);
  };

  if (started) return <LazyCheckRun id={started} personId={personId} known={null} />;
  return (
    <div onFocusCapture={warm} onPointerDownCapture={warm}>
      <PageHeading title="What do you have?" lead="Only the three labels are needed. Whatever else you can see shortens the check." />
      <OpenRuns personId={personId} />
      <SetupForm entry={entry} choices={choices} machineId={machineId} draftKey={`pinwright:new:${personId}`} onStart={start} />
    </div>
  );
}
