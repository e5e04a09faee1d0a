import type { Metadata } from "next";
import { AuditTable } from "@/components/people/audit-table";
import { PersonEditor } from "@/components/people/person-editor";
import { RoleWords } from "@/components/people/role-words";
import { ButtonLink, EmptyState, PageHeading, Sheet } from "@/components/ui";
import { hasPermission, ROLES, type Person } from "@/lib/auth/permissions";
import { requirePermission } from "@/lib/auth/require-permission";
import { listAudit } from "@/lib/people/list-audit";
import { listPeople } from "@/lib/people/list-people";
import { setDisabledAction, setRolesAction } from "./actions";

export const metadata: Metadata = { title: "Workshop" };

export default async function WorkshopPage({ searchParams }: PageProps<"/workshop">) {
  const person = await requirePermission("people:read");
  const { before } = await searchParams;
  return (
    <>
      <PageHeading title="Workshop" lead="Who works here, and what was done." />
      <div className="grid grid-cols-1 gap-8">
        <People person={person} />
        {hasPermission(person, "audit:read") ? <Audit person={person} before={typeof before === "string" ? before : undefined} /> : null}
      </div>
    </>
  );
}

async function People({ person }: { readonly person: Person }) {
  const everybody = await listPeople(person);
  const mayManage = hasPermission(person, "people:manage");
  return (
    <Sheet title="People">
      <ul>
        {everybody.map((listed) => mayManage
          ? <PersonEditor key={listed.id} person={listed} roles={ROLES} setRoles={setRolesAction} setDisabled={setDisabledAction} />
          : <li key={listed.id} className="border-b border-quiet py-3 first:border-t"><RoleWords person={listed} /></li>)}
      </ul>
    </Sheet>
  );
}

async function Audit({ person, before }: { readonly person: Person; readonly before: string | undefined }) {
  const { lines, next } = await listAudit(person, before);
  return (
    <Sheet title="Audit" id="audit">
      {lines.length > 0 ? <AuditTable lines={lines} /> : <EmptyState title="Nothing yet">Whatever is changed here will be listed.</EmptyState>}
      <p className="mt-4 flex flex-wrap gap-3">
        {before ? <ButtonLink href="/workshop#audit">Newest</ButtonLink> : null}
        {next ? <ButtonLink href={`/workshop?before=${next}#audit`}>Older</ButtonLink> : null}
      </p>
    </Sheet>
  );
}
