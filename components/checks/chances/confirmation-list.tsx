"use client";

import type { Route } from "next";
import Link from "next/link";
import { useActionState, useEffect, useRef } from "react";
import { againstVerdict, WithdrawForm } from "@/components/checks/outcome";
import { Refusal } from "@/components/ui";
import type { FormAction } from "@/lib/action";
import type { ConfirmationView } from "@/lib/checks/confirmation-view";
import { momentWords } from "@/lib/checks/date-words";
import { findingHeading, kindTitle } from "@/lib/checks/finding-words";

interface ConfirmationListProps {
  readonly rows: readonly ConfirmationView[];
  readonly withdraw: FormAction;
}

function Item({ row, send, busy }: { readonly row: ConfirmationView; readonly send: (form: FormData) => void; readonly busy: boolean }) {
  const what = findingHeading(row.finding, row.labels);
  return (
    <li className="border-t border-quiet py-3 first:border-t-2 first:border-rule">
      <Link href={`/checks/${row.checkId}#outcome` as Route} className="link inline-flex min-h-touch items-center text-lg leading-snug font-bold">{what}</Link>
      <p>{againstVerdict(row)}</p>
      <p className="max-w-prose break-words">Proved: {row.proof}</p>
      <p className="text-quiet">{kindTitle(row.kind)} · {row.machine ?? "no machine"} · {row.by} · {momentWords(row.at)}</p>
      {row.mayWithdraw ? <WithdrawForm confirmationId={row.id} what={what} send={send} busy={busy} /> : null}
    </li>
  );
}

/** The confirmations that shifted the chances, each with its check and, for those who may, the way back. */
export function ConfirmationList({ rows, withdraw }: ConfirmationListProps) {
  const [result, send, busy] = useActionState(withdraw, null);
  const done = useRef<HTMLParagraphElement>(null);
  // The button that was pressed is gone with its row.
  useEffect(() => { if (result?.ok) done.current?.focus(); }, [result]);
  return (
    <>
      <Refusal result={result} />
      {result?.ok ? <p ref={done} tabIndex={-1} role="status" className="mb-2 font-bold text-sound outline-none"><span aria-hidden="true">■ </span>Withdrawn. It no longer shifts the chances.</p> : null}
      <ol>{rows.map((row) => <Item key={row.id} row={row} send={send} busy={busy} />)}</ol>
    </>
  );
}
