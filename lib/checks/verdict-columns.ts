import type { Verdict } from "./verdict";
import { kindNamed } from "./verdict-sentence";

/**
 * The columns of a check that its verdict fills; all but the first are copies for the log and its filters.
 * Readings that contradict each other support no finding, so none is filed under one; a kind that the sentence does not name is none to file
 * under either, and a device that is none of the three has no kind here.
 */
export function verdictColumns(verdict: Verdict) {
  const finding = verdict.contradictory ? undefined : verdict.faults[0], kind = verdict.refusal || !kindNamed(verdict.kinds) ? null : verdict.kinds[0]?.kind ?? null;
  return { verdict, sentence: verdict.short, kind, findingCode: finding?.code ?? null, findingChance: finding?.p ?? null };
}
