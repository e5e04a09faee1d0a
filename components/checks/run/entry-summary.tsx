import Link from "next/link";
import { PinTag, Sheet } from "@/components/ui";
import type { SetupEntry } from "@/lib/checks/setup-form";
import { roleOf } from "@/lib/checks/finding-words";
import { FaceSvg } from "./mini-face";

const NUMBERS = [1, 2, 3] as const;

/** The entry that the check starts from: its face and pins. */
export function EntrySummary({ entry }: { readonly entry: SetupEntry }) {
  return (
    <Sheet title={entry.name} actions={<Link href="/checks/new" className="link">Not this one</Link>}>
      <div className="flex flex-wrap items-center gap-6">
        <FaceSvg shape={entry.connector} labels={entry.labels} title={`${entry.connector.name}, ${entry.connector.gender}, seen from the mating side`} />
        <ul className="grid gap-2">
          {NUMBERS.map((pin) => (
            <li key={pin} className="flex items-center gap-3">
              <span className="min-w-8 font-mono text-xl font-bold">{entry.labels[pin - 1]}</span>
              <PinTag role={roleOf(entry.expect.pins, pin)} />
              <span className="font-mono">{entry.colours[pin - 1]}</span>
            </li>
          ))}
        </ul>
      </div>
      <p className="mt-3 text-quiet">What the entry says narrows the check; the readings still decide.</p>
    </Sheet>
  );
}
