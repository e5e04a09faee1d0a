import type { Metadata } from "next";
import { notFound } from "next/navigation";
import { cache } from "react";
import { MachineView } from "@/components/machines/machine-view";
import { hasPermission, type Person } from "@/lib/auth/permissions";
import { requirePermission } from "@/lib/auth/require-permission";
import { AppError } from "@/lib/errors";
import { getMachine } from "@/lib/machines/get-machine";
import { listMachineChecks } from "@/lib/machines/list-machine-checks";

interface MachinePageProps { readonly params: Promise<{ readonly id: string }> }

/** Title and page ask for the same machine; it is read once a request. */
const load = cache(async (person: Person, id: string) => {
  try {
    return await getMachine(person, { id });
  } catch (error) {
    if (error instanceof AppError && error.status !== 403) notFound();
    throw error;
  }
});

export async function generateMetadata({ params }: MachinePageProps): Promise<Metadata> {
  const person = await requirePermission("machine:read");
  const machine = await load(person, (await params).id);
  return { title: `${machine.fleetNumber} ${machine.name}` };
}

export default async function MachinePage({ params }: MachinePageProps) {
  const person = await requirePermission("machine:read");
  const machine = await load(person, (await params).id);
  const history = await listMachineChecks(person, { id: machine.id });
  return <MachineView machine={machine} history={history} mayCheck={hasPermission(person, "check:run")} />;
}
