import type { Assessment, Carrying, EvidenceRow, Fault, Possibility, Reading, ReadingEffect, Setup, TellingCheck } from "@/lib/diagnosis";

/** What the engine can be asked. Only "assess" is asked with every reading; the others explain, on demand. */
export type EngineJob =
  | { readonly task: "assess" }
  | { readonly task: "effects" }
  | { readonly task: "evidence"; readonly finding: Fault }
  | { readonly task: "carrying" }
  | { readonly task: "apart"; readonly among: readonly Possibility[] };

export interface EngineResults {
  readonly assess: Assessment;
  readonly effects: readonly ReadingEffect[];
  readonly evidence: readonly EvidenceRow[];
  readonly carrying: Carrying | null;
  readonly apart: readonly TellingCheck[];
}

export type ResultOf<Job extends EngineJob> = EngineResults[Job["task"]];

export interface EngineRequest { readonly id: number; readonly job: EngineJob; readonly setup: Setup; readonly readings: readonly Reading[] }

/** `given up`: newer readings came in while it was worked out, and nobody waits for it any more. */
export type EngineAnswer =
  | { readonly id: number; readonly state: "answered"; readonly result: EngineResults[keyof EngineResults] }
  | { readonly id: number; readonly state: "failed"; readonly message: string };
