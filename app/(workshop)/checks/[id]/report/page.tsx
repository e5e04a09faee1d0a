import type { Metadata, Route } from "next";
import { CheckReport } from "@/components/checks/report/check-report";
import { PrintButton } from "@/components/checks/report/print-button";
import { ButtonLink, EmptyState } from "@/components/ui";
import { requirePermission } from "@/lib/auth/require-permission";
import { checkForPage } from "../check-for-page";

export const metadata: Metadata = { title: "Report of a check" };

/** The report of a finished check as a print view: one column, A4, black on white. */
export default async function ReportPage({ params }: { readonly params: Promise<{ id: string }> }) {
  const person = await requirePermission("check:read");
  const { id } = await params;
  const check = await checkForPage(person, id);
  const back = `/checks/${id}` as Route;
  if (!check.verdict) {
    return <EmptyState title="No report" action={<ButtonLink href={back} tone="main">Back to the check</ButtonLink>}>A report is made from the verdict of a finished check.</EmptyState>;
  }
  const outcome = check.confirmations.find((one) => !one.withdrawn) ?? null;
  return (
    <>
      <div className="mb-6 flex flex-wrap gap-3 print:hidden">
        <PrintButton />
        <ButtonLink href={back}>Back to the verdict</ButtonLink>
      </div>
      <CheckReport check={check} verdict={check.verdict} outcome={outcome} />
    </>
  );
}
