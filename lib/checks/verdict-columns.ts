import type { Verdict } from "./verdict";

/** The columns of a check that its verdict fills; all but the first are copies for the log's filters. */
export function verdictColumns(verdict: Verdict) {
  const [finding] = verdict.faults;
  return { verdict, sentence: verdict.sentence, kind: verdict.kinds[0]?.kind ?? null, findingCode: finding?.code ?? null, findingChance: finding?.p ?? null };
}
