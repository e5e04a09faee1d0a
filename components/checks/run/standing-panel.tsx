"use client";

import { useState } from "react";
import type { Labels } from "@/lib/checks/check-words";
import { StandingDetails } from "./standing-details";
import { standingSentence, StandingStrip } from "./standing-strip";
import { LazyStandingEvidence, useWarmEvidence } from "./standing-evidence-lazy";
import { useExplained, type EngineState } from "./use-engine";

const EFFECTS = { task: "effects" } as const;

interface StandingPanelProps {
  readonly engine: EngineState;
  readonly labels: Labels;
  /** The engine's reason for the present check. */
  readonly why: string | null;
  readonly chosen: boolean;
}

/** The standing: a strip that stays in sight, all of it on request, and a sentence for those who listen. */
export function StandingPanel({ engine, labels, why, chosen }: StandingPanelProps) {
  const [open, setOpen] = useState(false);
  useWarmEvidence();
  const effects = useExplained(open ? EFFECTS : null, engine.setup, engine.readings);
  const standing = engine.latest && engine.latest.state !== "invalid-input" ? engine.latest : null;
  const reason = why ?? (chosen ? "You picked this one; it is not the one that was proposed." : null);
  return (
    <>
      <div data-standing-strip className="sticky top-0 z-20 lg:static lg:col-start-2 lg:row-start-1">
        <StandingStrip assessment={engine.latest} working={engine.current === null && !engine.failed} labels={labels} open={open} onToggle={() => setOpen(!open)} />
      </div>
      <p role="status" className="sr-only">{standingSentence(engine.current, labels)}</p>
      <div id="standing-details" className="lg:col-start-2 lg:row-start-2">
        {open && standing ? <StandingDetails standing={standing} labels={labels} why={reason} effects={effects} evidence={<LazyStandingEvidence engine={engine} standing={standing} labels={labels} />} /> : null}
      </div>
    </>
  );
}
