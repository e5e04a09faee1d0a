import type { EvidenceRow, FaultChance, KindChance, PinsChance } from "@/lib/diagnosis";

/** What a finished check concludes; computed on the server and stored with the check. */
export interface Verdict {
  /** One sentence a colleague would say. */
  readonly sentence: string;
  readonly kinds: readonly KindChance[];
  readonly pins: readonly PinsChance[];
  readonly faults: readonly FaultChance[];
  readonly openFindings: readonly FaultChance[];
  readonly inseparable: boolean;
  readonly contradictory: boolean;
  readonly evidence: readonly EvidenceRow[];
  readonly nextActions: readonly string[];
  readonly proveRepair: readonly string[];
  readonly engineVersion: string;
}
