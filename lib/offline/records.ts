import type { RunSetup, RunStep } from "@/lib/checks/run";
import type { Assessment, Standing } from "@/lib/diagnosis";

/** The parts of a standing that decide a verdict. */
export type PhoneStanding = Pick<Standing, "kinds" | "others" | "pins" | "faults" | "openFindings" | "done" | "inseparable"> & { readonly state: Assessment["state"] };

/** A run as the phone keeps it, under the person who made it: signing out hides it, signing in shows it again. */
export interface RunRecord {
  readonly id: string;
  readonly personId: string;
  readonly setup: RunSetup;
  /** UTC, ISO 8601. */
  readonly startedAt: string;
  /** True once the server has answered that it knows the run. */
  readonly started: boolean;
  /** asked: a verdict is wanted; abandon: given up without one. Both wait for the server, then are done. */
  readonly finish: "no" | "asked" | "abandon" | "done";
  /** What the phone believed when the verdict was asked for; the server compares it with its own. */
  readonly standing?: PhoneStanding;
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
