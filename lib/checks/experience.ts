import { FAULT_CODES, KINDS, type Experience } from "@/lib/diagnosis";

/** What the phone says when it judged by the published chances alone. */
export const NO_EXPERIENCE: Experience = { kinds: {}, findings: {} };

function counted<Code extends string>(codes: readonly Code[], counts: Readonly<Partial<Record<Code, number>>>): Partial<Record<Code, number>> {
  return Object.fromEntries(codes.flatMap((code) => ((counts[code] ?? 0) > 0 ? [[code, counts[code]]] : []))) as Partial<Record<Code, number>>;
}

/**
 * Counts in one form: codes in the engine's order, zeros left out; undefined where nothing is counted, so that a
 * workshop without confirmations judges as if there were no such thing. The same counts always give the same text.
 */
export function tidyExperience(counts: Experience | null | undefined): Experience | undefined {
  if (!counts) return undefined;
  const tidy = { kinds: counted(KINDS, counts.kinds), findings: counted(FAULT_CODES, counts.findings) };
  return Object.keys(tidy.kinds).length + Object.keys(tidy.findings).length > 0 ? tidy : undefined;
}

/** Are these the same counts? Nothing and nothing are. */
export function sameExperience(one: Experience | null | undefined, other: Experience | null | undefined): boolean {
  return JSON.stringify(tidyExperience(one)) === JSON.stringify(tidyExperience(other));
}

/** How many of the workshop's own checks these counts hold. Each has one finding; not each counts for a kind. */
export function ownChecks(counts: Experience | null | undefined): number {
  return Object.values(counts?.findings ?? {}).reduce((sum, count) => sum + count, 0);
}

export interface CountedOutcome { readonly kind: string; readonly findingCode: string; readonly countsKind: boolean }

function tally<Code extends string>(codes: readonly Code[], seen: readonly string[]): Partial<Record<Code, number>> {
  return Object.fromEntries(codes.map((code) => [code, seen.filter((one) => one === code).length])) as Partial<Record<Code, number>>;
}

/** Counts of these outcomes; a code that this version does not know counts for nothing. */
export function countOutcomes(outcomes: readonly CountedOutcome[]): Experience | undefined {
  return tidyExperience({
    kinds: tally(KINDS, outcomes.filter((outcome) => outcome.countsKind).map((outcome) => outcome.kind)),
    findings: tally(FAULT_CODES, outcomes.map((outcome) => outcome.findingCode)),
  });
}
