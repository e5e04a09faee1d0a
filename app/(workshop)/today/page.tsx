import type { Metadata } from "next";
import { ButtonLink, PageHeading } from "@/components/ui";
import { requirePermission } from "@/lib/auth/require-permission";

export const metadata: Metadata = { title: "Today" };

export default async function TodayPage() {
  const person = await requirePermission("account:own");
  return (
    <>
      <PageHeading title="Today" lead={`What waits for you, ${person.name}.`} />
      <div className="grid gap-3 sm:grid-cols-2">
        <ButtonLink href="/checks/new" tone="main" size="glove">Start a check</ButtonLink>
        <ButtonLink href="/catalogue" size="glove">Search the catalogue</ButtonLink>
      </div>
    </>
  );
}
