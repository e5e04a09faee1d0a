import type { Carrying, EvidenceRow, Fault, FaultChance, KindChance, NextCheck, OtherChance, PinsChance } from "@/lib/diagnosis";
import type { Refusal } from "./refusal";

/** What to do about one finding that is still possible, and how to prove that it was mended. */
export interface FindingAdvice {
  readonly finding: FaultChance;
  /** Steps in order, plain imperative sentences. */
  readonly next: readonly string[];
  /** Readings or movements that show the repair has worked. */
  readonly prove: readonly string[];
}

/** The evidence for and against one finding that is still possible, or was until the last. */
export interface Explained { readonly finding: Fault; readonly rows: readonly EvidenceRow[] }

/** What a finished check concludes; computed on the server and stored with the check. */
export interface Verdict {
  /** One sentence a colleague would say, never surer than the evidence. */
  readonly sentence: string;
  /** The finding alone, in a few words for lists. */
  readonly short: string;
  readonly state: "ranked" | "needs-reading" | "contradictory";
  readonly kinds: readonly KindChance[];
  /** Devices that are none of the three kinds, likeliest first; with the kinds they sum to 1. */
  readonly others: readonly OtherChance[];
  /** Set where the readings speak for none of the three kinds, or one is above the limits: then there are no pins, findings and evidence. */
  readonly refusal: (Refusal & { /** What to do next, in order. */ readonly next: readonly string[] }) | null;
  readonly pins: readonly PinsChance[];
  readonly faults: readonly FaultChance[];
  /** Smallest set of findings holding 95 %, best first. */
  readonly openFindings: readonly FaultChance[];
  readonly inseparable: boolean;
  readonly contradictory: boolean;
  /** Readings to take again, when the readings contradict each other. */
  readonly suspects: readonly { readonly check: string; readonly why: string }[];
  /** Readings not yet taken that would tell the open findings apart, best first; empty when none would. */
  readonly tellApart: readonly Pick<NextCheck, "check" | "why">[];
  /** Readings that would tell the kinds apart that are left, best first; empty when none would, null where one kind is settled. */
  readonly tellKindsApart: readonly Pick<NextCheck, "check" | "why">[] | null;
  readonly evidence: readonly EvidenceRow[];
  /** The finding that the evidence table sets against "sound": the best one that is not "none"; null when there is none. */
  readonly evidenceFinding: Fault | null;
  /** Each finding still possible (six at most), the best rival and "sound", with their evidence; likeliest first. */
  readonly explained: readonly Explained[];
  /** The smallest set of readings that by itself leads to this verdict; null when there is none to carry. */
  readonly carrying: Carrying | null;
  readonly advice: readonly FindingAdvice[];
  readonly cautions: readonly string[];
  readonly engineVersion: string;
}
