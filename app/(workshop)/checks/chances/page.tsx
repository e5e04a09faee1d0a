import type { Metadata, Route } from "next";
import { ChanceList, ChanceSources, ConfirmationList, HowWorkedOut, OwnSwitch } from "@/components/checks/chances";
import { ButtonLink, EmptyState, PageHeading, Sheet } from "@/components/ui";
import { hasPermission, type Person } from "@/lib/auth/permissions";
import { requirePermission } from "@/lib/auth/require-permission";
import type { ConfirmationPage } from "@/lib/checks/confirmation-view";
import { listConfirmations } from "@/lib/checks/list-confirmations";
import { showChances } from "@/lib/checks/show-chances";
import { AppError } from "@/lib/errors";
import { withdrawAction } from "../withdraw-action";
import { switchAction } from "./actions";

export const metadata: Metadata = { title: "Chances before the first reading" };

/** A place in the list that is none shows the newest. */
async function load(person: Person, before: string | undefined): Promise<ConfirmationPage> {
  try {
    return await listConfirmations(person, { before });
  } catch (error) {
    if (error instanceof AppError && error.status === 400) return listConfirmations(person, {});
    throw error;
  }
}

function Shifted({ page, before }: { readonly page: ConfirmationPage; readonly before: string | undefined }) {
  if (page.rows.length === 0 && !before) {
    return (
      <EmptyState title="No check is confirmed yet" action={<ButtonLink href="/checks?state=finished">Finished checks</ButtonLink>}>
        Until then the published chances hold. After a repair, open the finished check and record what it turned out to be.
      </EmptyState>
    );
  }
  return (
    <>
      <ConfirmationList rows={page.rows} withdraw={withdrawAction} />
      {before || page.next ? (
        <nav aria-label="Pages of the confirmations" className="mt-4 flex flex-wrap gap-3">
          {before ? <ButtonLink href="/checks/chances#confirmed">Back to the newest</ButtonLink> : null}
          {page.next ? <ButtonLink href={`/checks/chances?before=${page.next}#confirmed` as Route}>Older ones</ButtonLink> : null}
        </nav>
      ) : null}
    </>
  );
}

/** What is usual: the chances that every check starts from, where they come from, and what the workshop's own checks did to them. */
export default async function ChancesPage({ searchParams }: { readonly searchParams: Promise<{ readonly before?: string | string[] }> }) {
  const person = await requirePermission("check:read");
  const before = [(await searchParams).before].flat()[0];
  const [chances, page] = await Promise.all([showChances(person), load(person, before)]);
  return (
    <>
      <PageHeading
        title="Chances before the first reading"
        lead="What every check starts from: how usual each finding and kind is, as published, and shifted by what this workshop has proved."
        actions={<ButtonLink href="/checks">Back to the log</ButtonLink>}
      />
      <div className="grid grid-cols-1 gap-8">
        <div className="grid grid-cols-1 items-start gap-8 lg:grid-cols-2">
          <Sheet title="How it is worked out"><HowWorkedOut findings={chances.findings} ownChecks={chances.ownChecks} inUse={chances.setAside === null} /></Sheet>
          <Sheet title={`Own checks: ${chances.ownChecks}`}><OwnSwitch setAside={chances.setAside} maySwitch={hasPermission(person, "experience:switch")} act={switchAction} /></Sheet>
        </div>
        <Sheet title="Findings"><ChanceList rows={chances.findings} first="Finding" /></Sheet>
        <Sheet title="Kinds of device"><ChanceList rows={chances.kinds} first="Kind" /></Sheet>
        <Sheet title="Sources"><ChanceSources sources={chances.sources} /></Sheet>
        <Sheet title="Confirmations that shifted them" id="confirmed"><Shifted page={page} before={before} /></Sheet>
      </div>
    </>
  );
}
