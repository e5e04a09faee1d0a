import type { Metadata } from "next";
import { MachineRegister } from "@/components/machines/machine-register";
import { PageHeading } from "@/components/ui";
import { requirePermission } from "@/lib/auth/require-permission";
import { listMachines } from "@/lib/machines/list-machines";

export const metadata: Metadata = { title: "Machines" };

export default async function MachinesPage({ searchParams }: { readonly searchParams: Promise<{ readonly q?: string | string[] }> }) {
  const person = await requirePermission("machine:read");
  const { q } = await searchParams;
  const text = (Array.isArray(q) ? q[0] ?? "" : q ?? "").slice(0, 200);
  return (
    <>
      <PageHeading title="Machines" lead="The register, with each machine's checks." />
      <MachineRegister q={text} machines={await listMachines(person, { q: text })} />
    </>
  );
}
