import Link from "next/link";
import { Button, ButtonLink, EmptyState, Quantity } from "@/components/ui";
import type { MachineRow } from "@/lib/machines/list-machines";

interface MachineRegisterProps { readonly q: string; readonly machines: readonly MachineRow[] }

function Row({ machine }: { readonly machine: MachineRow }) {
  return (
    <li className="relative grid grid-cols-[5.5rem_1fr] gap-x-4 gap-y-1 border-b-2 border-rule px-2 py-3 hover:bg-[var(--hover)] has-[a:focus-visible]:bg-[var(--hover)] md:grid-cols-[5.5rem_1.4fr_1.2fr_1.2fr_5rem] md:items-baseline">
      <span className="font-mono text-xl font-bold">{machine.fleetNumber}</span>
      <h2 className="text-xl leading-snug font-bold">
        <Link href={`/machines/${machine.id}`} className="underline decoration-2 underline-offset-4 after:absolute after:inset-0 focus-visible:outline-none focus-visible:after:outline-3 focus-visible:after:outline-bench">{machine.name}</Link>
      </h2>
      <span className="col-start-2 md:col-start-auto">{machine.type}</span>
      <span className="col-start-2 md:col-start-auto">{machine.site}</span>
      <span className="col-start-2 md:col-start-auto md:text-right"><Quantity value={machine.batteryVolts} unit="V" /><span className="sr-only"> battery</span></span>
    </li>
  );
}

function Head() {
  return (
    <div aria-hidden="true" className="hidden grid-cols-[5.5rem_1.4fr_1.2fr_1.2fr_5rem] gap-x-4 border-b-2 border-rule px-2 pb-2 font-bold md:grid">
      <span>Fleet no.</span><span>Name</span><span>Type</span><span>Site</span><span className="text-right">Battery</span>
    </div>
  );
}

/** All machines in service, or those that fit the search; a plain form, so that it works without a script. */
export function MachineRegister({ q, machines }: MachineRegisterProps) {
  return (
    <>
      <form action="/machines" role="search" className="mb-6">
        <label htmlFor="machines-q" className="text-lg font-bold">Fleet number, name, type or site</label>
        <div className="mt-1 flex max-w-2xl gap-2">
          <input id="machines-q" name="q" type="search" defaultValue={q} maxLength={200} autoComplete="off" enterKeyHint="search" className="control min-h-14 text-xl" />
          <Button type="submit" tone="main" className="min-h-14!">Search</Button>
        </div>
      </form>
      <p role="status" className="mb-3 text-lg font-bold">{machines.length === 1 ? "1 machine" : `${machines.length} machines`}{q.trim() ? ` for “${q.trim()}”` : ""}</p>
      {machines.length === 0 ? (
        <EmptyState title="No machine fits." action={<ButtonLink href="/machines" tone="main">Show all machines</ButtonLink>}>
          {q.trim() ? "Try the fleet number alone, such as D-01, or the site." : "An administrator or an editor enters machines."}
        </EmptyState>
      ) : (
        <>
          <Head />
          <ol aria-label="Machines by fleet number" className="border-t-2 border-rule md:border-t-0">{machines.map((machine) => <Row key={machine.id} machine={machine} />)}</ol>
        </>
      )}
    </>
  );
}
