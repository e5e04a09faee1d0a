import type { Fault, Kind } from "@/lib/diagnosis";
import type { Labels } from "./check-name";

/** What a check turned out to be, with the names that a page shows. Times are ISO 8601, UTC. */
export interface ConfirmationView {
  readonly id: string;
  readonly checkId: string;
  readonly finding: Fault;
  readonly kind: Kind;
  readonly proof: string;
  readonly at: string;
  readonly by: string;
  /** Null while it is in force. */
  readonly withdrawn: { readonly at: string; readonly by: string } | null;
  /** May the person who asked withdraw it? */
  readonly mayWithdraw: boolean;
  /** Of the check itself. */
  readonly labels: Labels;
  readonly machine: string | null;
  /** What the verdict had said, in a few words. */
  readonly verdict: string;
  /** Was the verdict's first finding the right one? */
  readonly asVerdict: boolean;
}

export interface ConfirmationPage {
  readonly rows: readonly ConfirmationView[];
  /** Give it as `before` for the next page; null on the last one. */
  readonly next: string | null;
}
