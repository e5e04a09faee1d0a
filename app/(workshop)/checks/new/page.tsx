import type { Metadata } from "next";
import { NewCheck } from "@/components/checks/run/new-check";
import { Notice } from "@/components/ui";
import type { Person } from "@/lib/auth/permissions";
import { requirePermission } from "@/lib/auth/require-permission";
import { CONNECTOR_SHAPES } from "@/lib/catalogue/connector-shapes";
import { cavityLabels, expectOfEntry, pinsInOrder } from "@/lib/catalogue/expect-of-entry";
import { getEntry } from "@/lib/catalogue/get-entry";
import type { SetupEntry } from "@/lib/checks/setup-form";
import { experienceForPhone } from "@/lib/checks/show-chances";
import { AppError } from "@/lib/errors";
import { listMachines } from "@/lib/machines/list-machines";
import { listMeters } from "@/lib/machines/list-meters";

export const metadata: Metadata = { title: "Start a check" };

type Params = Readonly<Record<string, string | string[] | undefined>>;

/** The entry as the form needs it; null when the address names none that is there. */
async function entryOf(person: Person, slug: string): Promise<SetupEntry | null> {
  try {
    const { id, versionId, slug: shown, data } = await getEntry(person, { slug });
    const [a, b, c] = pinsInOrder(data).map((pin) => pin.colour);
    return {
      id, versionId, slug: shown, name: data.name, expect: expectOfEntry(data), labels: cavityLabels(data),
      colours: [a ?? "", b ?? "", c ?? ""], connector: data.connector, cautions: data.cautions,
    };
  } catch (error) {
    if (error instanceof AppError && (error.status === 404 || error.status === 400)) return null;
    throw error;
  }
}

/** "What do you have?" */
export default async function NewCheckPage({ searchParams }: { readonly searchParams: Promise<Params> }) {
  const person = await requirePermission("check:run");
  const params = await searchParams;
  const slug = [params.entry].flat()[0] ?? "";
  const machineId = [params.machine].flat()[0] ?? "";
  const [entry, machines, meters, experience] = await Promise.all([slug ? entryOf(person, slug) : null, listMachines(person, {}), listMeters(person), experienceForPhone(person)]);
  const choices = { machines, meters, shapes: CONNECTOR_SHAPES.filter((shape) => shape.gender === "plug") };
  return (
    <>
      {slug && !entry ? <Notice tone="ask" title="There is no such entry">Search for it, or carry on as unknown.</Notice> : null}
      <NewCheck key={slug} personId={person.id} entry={entry} choices={choices} machineId={machines.some((machine) => machine.id === machineId) ? machineId : ""} experience={experience} />
    </>
  );
}
