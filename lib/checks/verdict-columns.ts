import type { Verdict } from "./verdict";

/**
 * The columns of a check that its verdict fills; all but the first are copies for the log and its filters.
 * Readings that contradict each other support no finding, so none is filed under one; a device that is none of the three has no kind here either.
 */
export function verdictColumns(verdict: Verdict) {
  const finding = verdict.contradictory ? undefined : verdict.faults[0];
  return { verdict, sentence: verdict.short, kind: verdict.refusal ? null : verdict.kinds[0]?.kind ?? null, findingCode: finding?.code ?? null, findingChance: finding?.p ?? null };
}
