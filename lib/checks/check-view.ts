import type { ConfirmationView } from "./confirmation-view";
import type { Run } from "./run";
import type { Verdict } from "./verdict";

export type CheckStateName = "running" | "finished" | "abandoned";

/** One check with the names that a page shows beside its ids. Times are ISO 8601, UTC. */
export interface CheckView extends Run {
  readonly state: CheckStateName;
  readonly person: { readonly id: string; readonly name: string };
  readonly startedAt: string;
  readonly finishedAt: string | null;
  readonly verdict: Verdict | null;
  readonly machine: { readonly id: string; readonly fleetNumber: string; readonly name: string } | null;
  /** The version that the check used, which need not be the one shown today. */
  readonly entry: { readonly id: string; readonly slug: string; readonly name: string; readonly version: number } | null;
  readonly meterName: string | null;
  /** What it was recorded to have been, newest first; at most one is not withdrawn. */
  readonly confirmations: readonly ConfirmationView[];
  readonly recheckOf: string | null;
  /** Finished or running checks that repeat this one after a repair, oldest first; only those the person may open. */
  readonly rechecks: readonly { readonly id: string; readonly state: CheckStateName; readonly startedAt: string }[];
}

/** One row of the log. */
export interface CheckRow {
  readonly id: string;
  readonly state: CheckStateName;
  readonly startedAt: string;
  readonly finishedAt: string | null;
  /** The verdict in a few words. */
  readonly sentence: string | null;
  readonly kind: string | null;
  readonly findingCode: string | null;
  readonly findingChance: number | null;
  readonly person: { readonly id: string; readonly name: string };
  readonly machine: { readonly id: string; readonly fleetNumber: string; readonly name: string } | null;
  readonly entryName: string | null;
  /** What it turned out to be, in a few words; null while nothing is confirmed. */
  readonly confirmed: string | null;
  readonly recheckOf: string | null;
}

export interface CheckPage {
  readonly rows: readonly CheckRow[];
  /** Give it as `after` for the next page; null on the last one. */
  readonly next: string | null;
}

export interface MachineChoice { readonly id: string; readonly fleetNumber: string; readonly name: string }
