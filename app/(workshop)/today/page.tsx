import type { Metadata } from "next";
import Link from "next/link";
import { LogList } from "@/components/checks/log/log-list";
import { ButtonLink, EmptyState, PageHeading, Sheet } from "@/components/ui";
import { hasPermission, type Person } from "@/lib/auth/permissions";
import { requirePermission } from "@/lib/auth/require-permission";
import { listChecks } from "@/lib/checks/list-checks";

export const metadata: Metadata = { title: "Today" };

export default async function TodayPage() {
  const person = await requirePermission("check:read");
  const mayRun = hasPermission(person, "check:run");
  return (
    <>
      <PageHeading title="Today" lead={`What waits for you, ${person.name}.`} />
      <div className="grid gap-3 sm:grid-cols-2">
        {mayRun ? <ButtonLink href="/checks/new" tone="main" size="glove">Start a check</ButtonLink> : null}
        <ButtonLink href="/catalogue" size="glove">Search the catalogue</ButtonLink>
      </div>
      <p className="mt-3"><Link href="/checks/chances" className="link inline-flex min-h-touch items-center">Chances before the first reading</Link></p>
      <div className="mt-8 grid grid-cols-1 gap-8 lg:grid-cols-2 lg:items-start">
        {mayRun ? <Running person={person} /> : null}
        <Recent person={person} />
      </div>
    </>
  );
}

async function Running({ person }: { readonly person: Person }) {
  const { rows } = await listChecks(person, { state: "running", person: person.id, limit: 5 });
  return (
    <Sheet title="Checks to carry on">
      {rows.length > 0
        ? <LogList rows={rows} />
        : <EmptyState title="No check is running">What you start and leave waits here.</EmptyState>}
    </Sheet>
  );
}

async function Recent({ person }: { readonly person: Person }) {
  const { rows } = await listChecks(person, { state: "finished", limit: 5 });
  return (
    <Sheet title="Recent verdicts" actions={<ButtonLink href="/checks">All checks</ButtonLink>}>
      {rows.length > 0
        ? <LogList rows={rows} />
        : <EmptyState title="No check is finished yet">Verdicts of everybody in the workshop show here.</EmptyState>}
    </Sheet>
  );
}
