import type { Metadata, Route } from "next";
import { CompareView } from "@/components/checks/report/compare-view";
import { ButtonLink, EmptyState, PageHeading } from "@/components/ui";
import { requirePermission } from "@/lib/auth/require-permission";
import { compareChecks } from "@/lib/checks/compare-checks";
import { checkForPage } from "../check-for-page";

export const metadata: Metadata = { title: "First run and re-check" };

/** The first run and its re-check side by side. */
export default async function ComparePage({ params }: { readonly params: Promise<{ id: string }> }) {
  const person = await requirePermission("check:read");
  const { id } = await params;
  await checkForPage(person, id);
  const comparison = await compareChecks(person, id);
  const back = `/checks/${id}` as Route;
  return (
    <>
      <PageHeading title="Before and after" lead="The first run and its re-check, reading by reading." actions={<ButtonLink href={back}>Back to the verdict</ButtonLink>} />
      {comparison.second
        ? <CompareView first={comparison.first} second={comparison.second} rows={comparison.rows} />
        : <EmptyState title="No re-check yet" action={<ButtonLink href={back} tone="main">Back to the verdict</ButtonLink>}>Start one from the verdict, after the repair.</EmptyState>}
    </>
  );
}
