import Link from "next/link";
import { ConnectorFace } from "@/components/connector/connector-face";
import { ButtonLink, Notice, Sheet } from "@/components/ui";
import type { EntryView as Entry } from "@/lib/catalogue/get-entry";
import { KindMark } from "../kind-mark";
import { EntryProvenance } from "./entry-provenance";
import { HealthyReadings } from "./healthy-readings";
import { PinTable } from "./pin-table";
import { TransferPoints } from "./transfer-points";
import { ValueConverter } from "./value-converter";

interface EntryViewProps {
  readonly entry: Entry;
  readonly mayCheck: boolean;
}

function EntryHead({ entry, mayCheck }: EntryViewProps) {
  const { data, slug } = entry;
  return (
    <header className="mb-6">
      <p className="mb-2 print:hidden"><Link href="/catalogue" className="link inline-flex min-h-touch items-center">Back to the catalogue</Link></p>
      <div className="flex flex-wrap items-end justify-between gap-x-8 gap-y-4">
        <div className="max-w-prose min-w-0">
          <h1 className="text-3xl leading-tight font-bold sm:text-4xl">{data.name}</h1>
          <p className="mt-2 text-lg">{data.maker} <span className="font-mono">{data.partNumbers.map((part, i) => <span key={part}>{i > 0 ? ", " : ""}<span className="whitespace-nowrap">{part}</span></span>)}</span></p>
          <p className="mt-1 flex flex-wrap items-center gap-x-4 gap-y-1"><KindMark kind={data.kind} /><span>Senses: {data.senses.toLowerCase()}</span></p>
          <p className="mt-1 text-quiet">{data.movement}.</p>
        </div>
        <div className="flex flex-wrap gap-3 print:hidden">
          {mayCheck ? <ButtonLink href={`/checks/new?entry=${slug}`} tone="main" className="min-h-14! text-lg">Start a check</ButtonLink> : null}
          <ButtonLink href={`/checks?entry=${entry.id}`} className="min-h-14!">Checks on this entry</ButtonLink>
        </div>
      </div>
    </header>
  );
}

function VersionNotice({ entry }: { readonly entry: Entry }) {
  if (entry.retired) return <div className="mb-6"><Notice tone="ask" title="This entry is retired">It is kept for the checks that used it. Do not rely on it for new work.</Notice></div>;
  if (entry.shownVersion === null || entry.shownVersion === entry.version) return null;
  return (
    <div className="mb-6">
      <Notice tone="ask" title={`Version ${entry.version}, not the one in use`}>
        Version {entry.shownVersion} has taken its place. <Link href={`/catalogue/${entry.slug}`} className="link">Show version {entry.shownVersion}</Link>
      </Notice>
    </div>
  );
}

function Cautions({ cautions }: { readonly cautions: readonly string[] }) {
  return (
    <Notice tone="ask" title="Before you touch it">
      <ul className="grid list-disc gap-1 pl-5">{cautions.map((caution) => <li key={caution}>{caution}</li>)}</ul>
      <p className="mt-2 font-bold">Follow the site&rsquo;s rules, the maker&rsquo;s instructions and local law.</p>
    </Notice>
  );
}

/** Everything the catalogue knows of one device; prints on one or two sheets. */
export function EntryView({ entry, mayCheck }: EntryViewProps) {
  const { data } = entry;
  return (
    <article>
      <EntryHead entry={entry} mayCheck={mayCheck} />
      <VersionNotice entry={entry} />
      <div className="grid gap-6 lg:grid-cols-[1.1fr_1fr] print:block print:space-y-4">
        <Sheet title="Pins"><PinTable data={data} /></Sheet>
        <Sheet title="Connector face"><ConnectorFace shape={data.connector} pins={data.pins} /></Sheet>
        <div className="lg:col-span-2"><Cautions cautions={data.cautions} /></div>
        <Sheet title="Healthy readings" className="lg:col-span-2"><HealthyReadings data={data} /></Sheet>
        <Sheet title="Signal and value" className="lg:col-span-2">
          <ValueConverter table={data.transfer}><TransferPoints table={data.transfer} /></ValueConverter>
        </Sheet>
        <Sheet title="Where this comes from" className="lg:col-span-2"><EntryProvenance entry={entry} /></Sheet>
      </div>
    </article>
  );
}
