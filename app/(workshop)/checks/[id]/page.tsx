import type { Metadata } from "next";
import { LazyCheckRun } from "@/components/checks/run/check-run-lazy";
import { SettleRun } from "@/components/checks/run/settle-run";
import type { Person } from "@/lib/auth/permissions";
import { requirePermission } from "@/lib/auth/require-permission";
import type { CheckView } from "@/lib/checks/check-view";
import { getCheck } from "@/lib/checks/get-check";
import { AppError } from "@/lib/errors";
import { FinishedCheck, type Asked } from "./finished-check";

export const metadata: Metadata = { title: "Check" };

/** Null when the server has not heard of it: then it may still be on the phone that started it. */
async function checkOf(person: Person, id: string): Promise<CheckView | null> {
  try {
    return await getCheck(person, id);
  } catch (error) {
    if (error instanceof AppError && (error.status === 404 || error.status === 400)) return null;
    throw error;
  }
}

interface CheckPageProps {
  readonly params: Promise<{ id: string }>;
  readonly searchParams: Promise<Readonly<Record<string, string | string[] | undefined>>>;
}

/** What the address asks to be shown; a name given twice counts as not given. */
function askedOf(given: Awaited<CheckPageProps["searchParams"]>): Asked {
  const text = (name: string) => { const value = given[name]; return typeof value === "string" ? value : undefined; };
  return { finding: text("finding"), one: text("one"), other: text("other") };
}

/** A check: led reading by reading while it runs, its verdict once it is finished. */
export default async function CheckPage({ params, searchParams }: CheckPageProps) {
  const person = await requirePermission("check:read");
  const { id } = await params;
  const check = await checkOf(person, id);
  if (check && check.state !== "running") {
    return (
      <>
        <SettleRun id={id} />
        <FinishedCheck check={check} person={person} asked={askedOf(await searchParams)} />
      </>
    );
  }
  await requirePermission("check:run");
  const known = check ? { id, setup: check.setup, steps: check.steps } : null;
  return <LazyCheckRun id={id} personId={person.id} known={known} />;
}
