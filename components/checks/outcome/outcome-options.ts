import type { Labels } from "@/lib/checks/check-name";
import { findingHeading } from "@/lib/checks/finding-words";
import { OUTCOME_GROUPS, outcomeId } from "@/lib/checks/outcome-choices";
import type { Verdict } from "@/lib/checks/verdict";

export interface OutcomeGroup { readonly title: string; readonly options: readonly { readonly id: string; readonly name: string }[] }

/** What a check may have turned out to be, in words with its cavities: first what the verdict left open, then everything else. */
export function outcomeGroups(verdict: Verdict, labels: Labels): readonly OutcomeGroup[] {
  const open = verdict.contradictory ? [] : verdict.openFindings;
  const first = new Set(open.map(outcomeId));
  const groups = [{ title: "As the verdict says", faults: open }, ...OUTCOME_GROUPS.map(({ title, faults }) => ({ title, faults: faults.filter((fault) => !first.has(outcomeId(fault))) }))];
  return groups.filter((group) => group.faults.length > 0)
    .map(({ title, faults }) => ({ title, options: faults.map((fault) => ({ id: outcomeId(fault), name: findingHeading(fault, labels) })) }));
}
