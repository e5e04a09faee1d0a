"use client";

import { Notice } from "@/components/ui";
import type { Assessment, CheckSpec } from "@/lib/diagnosis";
import type { RunSetup } from "@/lib/checks/run";
import type { RunScreen } from "@/lib/checks/run-screen";
import type { Draft } from "@/lib/offline/draft";
import { ClosingScreen } from "./closing-screen";
import { LeadCard } from "./lead-card";
import { ReadingEntry } from "./reading-entry";
import type { RunActions } from "./run-actions";
import { ScreenHeading } from "./screen-heading";
import { StateScreen } from "./state-screen";
import { WordKeys } from "./word-keys";

interface GuideProps {
  readonly screen: RunScreen;
  /** The engine gave no answer at all. */
  readonly failed: boolean;
  readonly setup: RunSetup;
  readonly standing: Exclude<Assessment, { state: "invalid-input" }> | null;
  readonly actions: RunActions;
  readonly onVerdict: () => void;
  readonly onCarryOn: () => void;
}

/** What to do now: place the leads, change the machine's state, or take the verdict. */
export function ScreenGuide({ screen, failed, setup, standing, actions, onVerdict, onCarryOn }: GuideProps) {
  switch (screen.type) {
    case "reading": return <LeadCard spec={screen.spec} setup={setup} />;
    case "state": return <StateScreen key={`${screen.spec.code} ${screen.transition.actions.join(" ")}`} spec={screen.spec} transition={screen.transition} onConfirm={actions.confirmState} />;
    case "enough": case "exhausted":
      return standing ? <ClosingScreen reason={screen.type} standing={standing} labels={setup.cavityLabels} onVerdict={onVerdict} onCarryOn={onCarryOn} /> : null;
    case "invalid": return <Notice tone="stop" title="These readings cannot be judged" live="assertive">{screen.message} Correct it under &ldquo;Readings so far&rdquo;.</Notice>;
    case "thinking":
      return failed
        ? <Notice tone="stop" title="The next reading cannot be worked out" live="assertive">Take any reading under &ldquo;Another reading&rdquo;; what you enter is kept and judged by the server.</Notice>
        : <section className="min-h-44"><ScreenHeading screen="thinking">Working out the next reading &hellip;</ScreenHeading></section>;
  }
}

interface AnswerProps {
  readonly spec: CheckSpec;
  readonly typed: Draft["typed"];
  readonly onTyped: (typed: Draft["typed"]) => void;
  readonly actions: RunActions;
}

/** Where the reading goes in: the keypad, or the words of a sweep or a grip test. */
export function ScreenAnswer({ spec, typed, onTyped, actions }: AnswerProps) {
  if (spec.unit === "word") return <WordKeys spec={spec} busy={false} onWord={(word) => void actions.read(spec, word, word)} />;
  return <ReadingEntry key={spec.code} spec={spec} typed={typed} onTyped={onTyped} onReading={(value, text) => actions.read(spec, value, text)} />;
}
