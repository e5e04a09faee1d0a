import type { EntryData } from "@/lib/catalogue/entry-data";
import { healthyRows } from "@/lib/catalogue/healthy-rows";

/** What a meter shows on the healthy device, each with the leads' places. */
export function HealthyReadings({ data }: { readonly data: EntryData }) {
  return (
    <dl>
      {healthyRows(data).map((row) => (
        <div key={row.name} className="grid gap-x-4 border-b border-quiet py-2.5 last:border-b-0 sm:grid-cols-[12rem_1fr]">
          <dt className="font-bold">{row.name}</dt>
          <dd><strong className="text-lg">{row.value}</strong><span className="block text-quiet">{row.how}</span></dd>
        </div>
      ))}
    </dl>
  );
}
