import type { EntryView } from "@/lib/catalogue/get-entry";
import { dayWords } from "@/lib/checks/date-words";

const times = (count: number) => (count === 1 ? "once" : count === 2 ? "twice" : `${count} times`);

function confirmed({ finished, confirmed: sound, lastConfirmedAt }: EntryView["confirmations"]): string {
  if (finished === 0) return "No finished check has used this entry yet.";
  if (sound === 0) return `Used in ${finished === 1 ? "1 finished check" : `${finished} finished checks`}; none of them found the device and its wiring sound.`;
  return `Confirmed ${times(sound)} in ${finished === 1 ? "1 finished check" : `${finished} finished checks`}, last on ${lastConfirmedAt ? dayWords(lastConfirmedAt.toISOString()) : "an unknown day"}: this kind of device, its wiring sound.`;
}

/** Who says so, since when, from what, and how often checks have borne it out. */
export function EntryProvenance({ entry }: { readonly entry: EntryView }) {
  return (
    <div className="grid gap-3">
      <p><strong>Version {entry.version}</strong>, published by {entry.publishedBy} on {dayWords(entry.publishedAt.toISOString())}.</p>
      <p>{confirmed(entry.confirmations)}</p>
      <ul className="grid gap-2">
        {entry.data.sources.map((source) => (
          <li key={source.title} className="border-l-4 border-rule pl-3"><strong>{source.title}</strong>, {dayWords(`${source.date}T12:00:00Z`)}<span className="block text-quiet">{source.reference}</span></li>
        ))}
      </ul>
    </div>
  );
}
