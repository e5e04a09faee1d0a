import type { RunSetup, RunStep } from "@/lib/checks/run";
import type { Standing } from "@/lib/diagnosis";

/** A run as the phone keeps it, under the person who made it: signing out hides it, signing in shows it again. */
export interface RunRecord {
  readonly id: string;
  readonly personId: string;
  readonly setup: RunSetup;
  /** UTC, ISO 8601. */
  readonly startedAt: string;
  /** True once the server has answered that it knows the run. */
  readonly started: boolean;
  readonly finish: "no" | "asked" | "done";
  /** What the phone believed when the verdict was asked for; the server compares it with its own. */
  readonly standing?: Pick<Standing, "kinds" | "pins" | "faults">;
  /** A permanent refusal by the server; the run stays on the phone. */
  readonly refusal?: { readonly code: string; readonly message: string };
}

export interface StepRecord {
  readonly id: string;
  readonly runId: string;
  readonly step: RunStep;
  readonly sent: boolean;
}

/** What the outbox needs of a store; IndexedDB on the phone, a plain map in tests. */
export interface RunStore {
  /** Runs of this person with anything still to send, oldest first. */
  unsentRuns(personId: string): Promise<readonly RunRecord[]>;
  unsentSteps(runId: string): Promise<readonly StepRecord[]>;
  updateRun(id: string, change: Partial<Pick<RunRecord, "started" | "finish" | "standing" | "refusal">>): Promise<void>;
  markSent(stepIds: readonly string[]): Promise<void>;
}
