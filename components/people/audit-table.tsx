import { DataTable } from "@/components/ui";
import type { AuditLine } from "@/lib/people/list-audit";
import { When } from "./when";

const COLUMNS = [
  { key: "at", header: "When" }, { key: "who", header: "Who" }, { key: "verb", header: "Did" }, { key: "subject", header: "To" }, { key: "detail", header: "With" },
];

const detailText = (detail: AuditLine["detail"]) => Object.entries(detail).map(([key, value]) => `${key} ${typeof value === "string" ? value : JSON.stringify(value)}`).join(", ");

/** What was done, newest first. */
export function AuditTable({ lines }: { readonly lines: readonly AuditLine[] }) {
  const rows = lines.map((line) => ({
    key: line.id,
    cells: {
      at: <When at={line.at} />,
      who: line.who ?? "the system",
      verb: <span className="font-mono whitespace-nowrap">{line.verb}</span>,
      subject: <>{line.subjectType} <span className="font-mono">{line.subjectId}</span></>,
      detail: <span className="break-words">{detailText(line.detail)}</span>,
    },
  }));
  return <DataTable caption="What was done, newest first" columns={COLUMNS} rows={rows} captionHidden />;
}
