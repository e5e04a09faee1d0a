"use client";

import { startTransition, useActionState, type FormEvent } from "react";
import { Button, Field, Notice, Select, TextArea } from "@/components/ui";
import type { ActionResult } from "@/lib/action";
import { KIND_TITLES } from "@/lib/checks/finding-words";
import { KINDS } from "@/lib/diagnosis";
import type { OutcomeGroup } from "./outcome-options";

export interface GivenOutcome { readonly finding: string; readonly kind: string; readonly proof: string }
/** The server's answer, with what was given: without script the form comes back filled. */
export interface ConfirmState { readonly result: ActionResult<unknown>; readonly given: GivenOutcome }
export type ConfirmAction = (last: ConfirmState | null, form: FormData) => Promise<ConfirmState>;

interface ConfirmFormProps {
  readonly checkId: string;
  readonly groups: readonly OutcomeGroup[];
  /** The kind, where verdict or entry leave no doubt of it; else "". */
  readonly kind: string;
  readonly confirm: ConfirmAction;
}

/** Fields at fault have their own sentences; a fault that belongs to none of them stands above. */
function useConfirm(confirm: ConfirmAction) {
  const [state, send, busy] = useActionState(confirm, null);
  const error = state && !state.result.ok ? state.result.error : null;
  const fields = error?.fields ?? {};
  const own = ["finding", "kind", "proof"].some((name) => name in fields);
  // Sent by hand: the form's own action would empty the fields, also when the server refuses them.
  const submit = (event: FormEvent<HTMLFormElement>) => {
    event.preventDefault();
    const form = new FormData(event.currentTarget);
    if (!busy) startTransition(() => send(form));
  };
  return { given: state?.given, send, busy, fields, refusal: error && !own ? error.message : null, submit };
}

/** Records what a check turned out to be. Nothing is filled in that was not found out: the finding must be chosen. */
export function ConfirmForm({ checkId, groups, kind, confirm }: ConfirmFormProps) {
  const { given, send, busy, fields, refusal, submit } = useConfirm(confirm);
  return (
    <form action={send} onSubmit={submit} noValidate className="grid max-w-2xl gap-4 print:hidden">
      <input type="hidden" name="check" value={checkId} />
      {refusal ? <Notice tone="stop" title="It was not recorded" live="assertive"><p>{refusal}</p></Notice> : null}
      <Field label="What it was" hint="It need not be what the verdict says." error={fields.finding}>
        <Select name="finding" defaultValue={given?.finding ?? ""} required>
          <option value="">Choose what it was</option>
          {groups.map((group) => (
            <optgroup key={group.title} label={group.title}>{group.options.map((option) => <option key={option.id} value={option.id}>{option.name}</option>)}</optgroup>
          ))}
        </Select>
      </Field>
      <Field label="Kind of device" error={fields.kind}>
        <Select name="kind" defaultValue={given?.kind ?? kind} required>
          <option value="">Choose the kind</option>
          {KINDS.map((one) => <option key={one} value={one}>{KIND_TITLES[one]}</option>)}
        </Select>
      </Field>
      <Field label="How it was proved" hint="For example: wire renewed, 0.2 Ω end to end, fault stays away" error={fields.proof}>
        <TextArea name="proof" defaultValue={given?.proof} maxLength={500} required />
      </Field>
      <Button type="submit" tone="main" busy={busy} busyLabel="Recording …" className="justify-self-start">Record it</Button>
    </form>
  );
}
