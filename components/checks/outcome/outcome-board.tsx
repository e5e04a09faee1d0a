"use client";

import { useActionState, useEffect, useRef, type ReactNode } from "react";
import { Refusal, Sheet } from "@/components/ui";
import type { FormAction } from "@/lib/action";
import type { ConfirmationView } from "@/lib/checks/confirmation-view";
import { findingHeading } from "@/lib/checks/finding-words";
import { ConfirmedMark } from "./confirmed-mark";
import { ConfirmForm, type ConfirmAction } from "./confirm-form";
import type { OutcomeGroup } from "./outcome-options";
import { OutcomeWords } from "./outcome-words";
import { WithdrawForm } from "./withdraw-form";

interface OutcomeBoardProps {
  readonly checkId: string;
  /** Newest first; at most one in force. */
  readonly confirmations: readonly ConfirmationView[];
  readonly mayConfirm: boolean;
  readonly groups: readonly OutcomeGroup[];
  readonly kind: string;
  readonly confirm: ConfirmAction;
  readonly withdraw: FormAction;
  /** Shown where nothing is recorded and this person may not, or need not, record it here. */
  readonly instead: ReactNode;
}

/** The button that was pressed is gone with the change it made: the focus goes to what took its place. */
function useFocusOnChange(key: string) {
  const place = useRef<HTMLDivElement>(null);
  const shown = useRef(key);
  useEffect(() => {
    if (shown.current === key) return;
    shown.current = key;
    place.current?.focus();
  }, [key]);
  return place;
}

function Withdrawn({ rows }: { readonly rows: readonly ConfirmationView[] }) {
  if (rows.length === 0) return null;
  return (
    <details className="mt-4">
      <summary className="link flex min-h-touch w-fit cursor-pointer items-center font-bold">{rows.length === 1 ? "One record was withdrawn" : `${rows.length} records were withdrawn`}</summary>
      <ul>{rows.map((row) => <li key={row.id} className="border-t border-quiet py-3"><OutcomeWords one={row} /></li>)}</ul>
    </details>
  );
}

/** What a finished check turned out to be: recorded after the repair, shown to everybody, withdrawn by those who may. */
export function OutcomeBoard(props: OutcomeBoardProps) {
  const { checkId, confirmations, mayConfirm, groups, kind, confirm, withdraw, instead } = props;
  const [withdrawn, send, busy] = useActionState(withdraw, null);
  const inForce = confirmations.find((one) => !one.withdrawn) ?? null;
  const place = useFocusOnChange(inForce?.id ?? "");
  return (
    <Sheet id="outcome" title="What it turned out to be">
      <Refusal result={withdrawn} />
      <div ref={place} tabIndex={-1} className="grid gap-4 outline-none">
        {inForce ? (
          <div className="grid gap-1">
            <ConfirmedMark />
            <OutcomeWords one={inForce} />
            {inForce.mayWithdraw ? <WithdrawForm confirmationId={inForce.id} what={findingHeading(inForce.finding, inForce.labels)} send={send} busy={busy} /> : null}
          </div>
        ) : mayConfirm ? (
          <>
            <p className="max-w-prose">After the repair, record what was found. It shifts the chances that later checks start from.</p>
            <ConfirmForm checkId={checkId} groups={groups} kind={kind} confirm={confirm} />
          </>
        ) : instead}
      </div>
      <Withdrawn rows={confirmations.filter((one) => one.withdrawn)} />
    </Sheet>
  );
}
