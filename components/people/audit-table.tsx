import type { AuditLine } from "@/lib/people/list-audit";
import { When } from "./when";

/** What was done, in words; a verb that a later version wrote is shown as it is. */
const VERBS: Readonly<Record<string, string>> = {
  "session:open": "Signed in", "session:close": "Signed out", "session:revoke": "Signed another browser out", "session:revoke-others": "Signed every other browser out",
  "check:start": "Started a check", "check:append": "Added to a check", "check:finish": "Finished a check", "check:abandon": "Gave a check up",
  "check:attach": "Changed the machine of a check", "check:standing-differs": "Phone and server judged a check differently",
  "entry:publish": "Published an entry", "person:add-first": "Added the first administrator", "person:set-roles": "Changed the roles of a person",
  "person:disable": "Disabled an account", "person:enable": "Opened an account again",
};

const detailText = (detail: AuditLine["detail"]) => Object.entries(detail).map(([key, value]) => `${key}: ${typeof value === "string" ? value : JSON.stringify(value)}`).join(", ");

/** What was done, newest first: when, who did what, and to which record. */
export function AuditTable({ lines }: { readonly lines: readonly AuditLine[] }) {
  return (
    <ol aria-label="What was done, newest first" className="grid">
      {lines.map((line) => {
        const detail = detailText(line.detail);
        return (
          <li key={line.id} className="grid gap-x-6 border-b border-quiet py-2.5 first:border-t md:grid-cols-[13rem_1fr]">
            <span className="text-quiet"><When at={line.at} /></span>
            <div className="min-w-0">
              <p><strong>{line.who ?? "The system"}</strong>: {VERBS[line.verb] ?? line.verb}</p>
              <p className="text-quiet">{line.subjectType} <span className="font-mono break-all">{line.subjectId}</span></p>
              {detail ? <p className="break-words text-quiet">{detail}</p> : null}
            </div>
          </li>
        );
      })}
    </ol>
  );
}
