import Link from "next/link";
import { ConfirmedMark } from "@/components/checks/outcome/confirmed-mark";
import { ButtonLink, EmptyState, Notice, PageHeading, Quantity, Sheet } from "@/components/ui";
import { dayWords } from "@/lib/checks/date-words";
import type { Machine } from "@/lib/machines/get-machine";
import type { MachineCheck } from "@/lib/machines/list-machine-checks";

interface MachineViewProps {
  readonly machine: Machine;
  readonly history: { readonly total: number; readonly newest: readonly MachineCheck[] };
  readonly mayCheck: boolean;
}

function Facts({ machine }: { readonly machine: Machine }) {
  const facts = [
    ["Fleet number", <span key="f" className="font-mono font-bold">{machine.fleetNumber}</span>], ["Type", machine.type], ["Site", machine.site],
    ["Battery", <Quantity key="b" value={machine.batteryVolts} unit="V" />],
  ] as const;
  return (
    <dl>
      {facts.map(([name, value]) => (
        <div key={name} className="grid grid-cols-[8rem_1fr] gap-x-4 border-b border-quiet py-2.5 last:border-b-0"><dt className="font-bold">{name}</dt><dd>{value}</dd></div>
      ))}
      {machine.note ? <div className="border-t-2 border-rule pt-3"><dt className="font-bold">Good to know</dt><dd className="mt-1 max-w-prose">{machine.note}</dd></div> : null}
    </dl>
  );
}

function CheckRow({ check }: { readonly check: MachineCheck }) {
  return (
    <li className="relative border-b border-quiet py-3 last:border-b-0 hover:bg-[var(--hover)]">
      <p className="text-quiet">{dayWords(check.startedAt.toISOString())} · {check.person}</p>
      <p className="mt-1 text-lg leading-snug font-bold">
        <Link href={`/checks/${check.id}`} className="underline decoration-2 underline-offset-4 after:absolute after:inset-0 focus-visible:outline-none focus-visible:after:outline-3 focus-visible:after:outline-bench">{check.entry ?? "Unknown device"}</Link>
      </p>
      <p className="mt-1">{check.finished ? check.sentence ?? "Finished without a verdict." : "Still running."}</p>
      {check.confirmed ? <div className="mt-1"><ConfirmedMark finding={check.confirmed} /></div> : null}
    </li>
  );
}

function History({ machine, history }: Omit<MachineViewProps, "mayCheck">) {
  if (history.newest.length === 0) {
    return (
      <EmptyState title="No check on this machine yet.">
        Checks that name this machine are listed here, newest first.
      </EmptyState>
    );
  }
  return (
    <>
      <ol>{history.newest.map((check) => <CheckRow key={check.id} check={check} />)}</ol>
      <p className="mt-4"><ButtonLink href={`/checks?machine=${machine.id}`}>{history.total === 1 ? "Open in the log" : `All ${history.total} checks in the log`}</ButtonLink></p>
    </>
  );
}

/** One machine: its facts and the newest checks made on it. */
export function MachineView({ machine, history, mayCheck }: MachineViewProps) {
  return (
    <>
      <p className="mb-2 print:hidden"><Link href="/machines" className="link inline-flex min-h-touch items-center">Back to the machines</Link></p>
      <PageHeading
        title={`${machine.fleetNumber} ${machine.name}`} lead={`${machine.type}, ${machine.site}`}
        actions={mayCheck && machine.retiredAt === null ? <ButtonLink href={`/checks/new?machine=${machine.id}`} tone="main" className="min-h-14! text-lg">Start a check here</ButtonLink> : undefined}
      />
      {machine.retiredAt ? <div className="mb-6"><Notice tone="plain" title="Retired">This machine is out of service. Its history is kept.</Notice></div> : null}
      <div className="grid items-start gap-6 lg:grid-cols-[1fr_1.4fr]">
        <Sheet title="Facts"><Facts machine={machine} /></Sheet>
        <Sheet title="Checks"><History machine={machine} history={history} /></Sheet>
      </div>
    </>
  );
}
