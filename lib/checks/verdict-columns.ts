import type { Verdict } from "./verdict";
import { kindNamed } from "./verdict-sentence";

/**
 * The columns of a check that its verdict fills; all but the first are copies for the log and its filters.
 * Readings that contradict each other support no finding, so none is filed under one; a kind that the sentence does not name is none to file under either.
 */
export function verdictColumns(verdict: Verdict) {
  const finding = verdict.contradictory ? undefined : verdict.faults[0];
  return { verdict, sentence: verdict.short, kind: kindNamed(verdict.kinds) ? verdict.kinds[0]?.kind ?? null : null, findingCode: finding?.code ?? null, findingChance: finding?.p ?? null };
}
