import type { ConfirmationView } from "@/lib/checks/confirmation-view";
import { momentWords } from "@/lib/checks/date-words";
import { findingHeading, kindTitle } from "@/lib/checks/finding-words";

/** How it compares with what the verdict had put first. */
export function againstVerdict({ asVerdict, verdict }: Pick<ConfirmationView, "asVerdict" | "verdict">): string {
  return asVerdict ? "As the verdict said." : `The verdict had said: ${verdict}`;
}

/** What it was, how that was proved, and by whom: the record in words. */
export function OutcomeWords({ one }: { readonly one: ConfirmationView }) {
  return (
    <>
      <p className="text-lg font-bold">{findingHeading(one.finding, one.labels)} · {kindTitle(one.kind)}</p>
      <p>{againstVerdict(one)}</p>
      <p className="break-words">Proved: {one.proof}</p>
      <p className="text-quiet">Recorded by {one.by}, {momentWords(one.at)}{one.withdrawn ? `; withdrawn by ${one.withdrawn.by}, ${momentWords(one.withdrawn.at)}` : ""}</p>
    </>
  );
}
