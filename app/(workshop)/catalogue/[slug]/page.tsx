import type { Metadata } from "next";
import { notFound } from "next/navigation";
import { cache } from "react";
import { EntryView } from "@/components/catalogue/entry/entry-view";
import { hasPermission, type Person } from "@/lib/auth/permissions";
import { requirePermission } from "@/lib/auth/require-permission";
import { getEntry } from "@/lib/catalogue/get-entry";
import { AppError } from "@/lib/errors";

interface EntryPageProps {
  readonly params: Promise<{ readonly slug: string }>;
  readonly searchParams: Promise<{ readonly version?: string | string[] }>;
}

/** Title and page ask for the same entry; it is read once a request. */
const load = cache(async (person: Person, slug: string, version: number | undefined) => {
  try {
    return await getEntry(person, { slug, version });
  } catch (error) {
    if (error instanceof AppError && error.status !== 403) notFound();
    throw error;
  }
});

async function entryOf({ params, searchParams }: EntryPageProps) {
  const person = await requirePermission("catalogue:read");
  const { slug } = await params;
  const { version } = await searchParams;
  return { person, entry: await load(person, slug, version === undefined ? undefined : Number(version)) };
}

export async function generateMetadata(props: EntryPageProps): Promise<Metadata> {
  const { entry } = await entryOf(props);
  return { title: entry.data.name };
}

export default async function EntryPage(props: EntryPageProps) {
  const { person, entry } = await entryOf(props);
  return <EntryView entry={entry} mayCheck={hasPermission(person, "check:run")} />;
}
