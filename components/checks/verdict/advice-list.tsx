import { chanceText } from "@/components/ui";
import type { Labels } from "@/lib/checks/check-name";
import { findingHeading, ifFinding } from "@/lib/checks/finding-words";
import type { FindingAdvice } from "@/lib/checks/verdict";
import { MarkLetter } from "./chances";

function Steps({ lines }: { lines: readonly string[] }) {
  return <ol className="list-decimal space-y-1.5 pl-7 marker:font-mono">{lines.map((line) => <li key={line}>{line}</li>)}</ol>;
}

interface AdviceListProps { readonly advice: readonly FindingAdvice[]; readonly labels: Labels; readonly part: "next" | "prove" }

/** What to do, or how to prove the repair, finding by finding; a single finding needs no heading of its own. */
export function AdviceList({ advice, labels, part }: AdviceListProps) {
  const [only] = advice;
  if (!only) return null;
  if (advice.length === 1) return <Steps lines={only[part]} />;
  return (
    <div className="grid gap-5">
      {advice.map((item, index) => (
        <section key={findingHeading(item.finding, labels)}>
          <h3 className="mb-2 font-bold">
            {item.finding.code === "none" ? null : <><MarkLetter index={index} /> </>}
            If {ifFinding(item.finding, labels)} ({chanceText(item.finding.p)})
          </h3>
          <Steps lines={item[part]} />
        </section>
      ))}
    </div>
  );
}
