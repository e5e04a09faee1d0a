import type { Carrying, EvidenceRow, Fault, Reading, Setup } from "../types";
import { carryingSteps } from "./carrying";
import { evidenceSteps } from "./evidence";

/** All that a verdict shows of its reasons. */
export interface Explanation {
  readonly evidence: readonly { readonly finding: Fault; readonly rows: readonly EvidenceRow[] }[];
  readonly carrying: Carrying | null;
}

/** Evidence for each of the findings, and the readings that carry the verdict, in steps of at most one belief each. */
export function* explainSteps(setup: Setup, readings: readonly Reading[], findings: readonly Fault[]): Generator<void, Explanation> {
  const evidence: { finding: Fault; rows: EvidenceRow[] }[] = [];
  for (const finding of findings) {
    evidence.push({ finding, rows: yield* evidenceSteps(setup, readings, finding) });
    yield;
  }
  return { evidence, carrying: yield* carryingSteps(setup, readings) };
}
