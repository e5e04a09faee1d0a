import type { ConfirmationView } from "@/lib/checks/confirmation-view";
import { momentWords } from "@/lib/checks/date-words";
import { findingHeading, kindTitle } from "@/lib/checks/finding-words";

/** What it was, how that was proved, and by whom: the record in words. */
export function OutcomeWords({ one }: { readonly one: ConfirmationView }) {
  return (
    <>
      <p className="text-lg font-bold">{findingHeading(one.finding, one.labels)} · {kindTitle(one.kind)}</p>
      <p>{one.asVerdict ? "As the verdict said." : "Not what the verdict put first."}</p>
      <p className="break-words">Proved: {one.proof}</p>
      <p className="text-quiet">Recorded by {one.by}, {momentWords(one.at)}{one.withdrawn ? `; withdrawn by ${one.withdrawn.by}, ${momentWords(one.withdrawn.at)}` : ""}</p>
    </>
  );
}
