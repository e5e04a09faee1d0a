"use client";

import type { Route } from "next";
import { useActionState } from "react";
import { Button, ButtonLink, Field, Notice, Select } from "@/components/ui";
import type { FormAction } from "@/lib/action";
import type { MachineChoice } from "@/lib/checks/check-view";

/** A server action of a form: it answers with a result, or goes to another page. */
interface VerdictButtonsProps {
  readonly checkId: string;
  /** May this person start checks? */
  readonly mayRun: boolean;
  /** Is there a run to stand beside? */
  readonly comparable: boolean;
  readonly recheck: FormAction;
}

/** What can be done with a finished check. Works without script. */
export function VerdictButtons({ checkId, mayRun, comparable, recheck }: VerdictButtonsProps) {
  const [result, start, busy] = useActionState(recheck, null);
  return (
    <div className="grid gap-3 print:hidden">
      <div className="flex flex-wrap gap-3">
        <ButtonLink href={`/checks/${checkId}/report` as Route} tone="main">Report</ButtonLink>
        {comparable ? <ButtonLink href={`/checks/${checkId}/compare` as Route}>Compare the runs</ButtonLink> : null}
        {mayRun ? (
          <form action={start}>
            <input type="hidden" name="check" value={checkId} />
            <Button type="submit" busy={busy} busyLabel="Starting …">Re-check after repair</Button>
          </form>
        ) : null}
        <ButtonLink href="/checks">Back to the log</ButtonLink>
      </div>
      {result && !result.ok ? <Notice tone="stop" title="The re-check was not started" live="assertive"><p>{result.error.message}</p></Notice> : null}
    </div>
  );
}

interface AttachMachineProps {
  readonly checkId: string;
  readonly machines: readonly MachineChoice[];
  readonly current: string | null;
  readonly attach: FormAction;
}

/** Says on which machine the check was made. */
export function AttachMachine({ checkId, machines, current, attach }: AttachMachineProps) {
  const [result, submit, busy] = useActionState(attach, null);
  return (
    <form action={submit} className="grid max-w-xl gap-3 sm:grid-cols-[1fr_auto] sm:items-end print:hidden">
      <input type="hidden" name="check" value={checkId} />
      <Field label="Machine" error={result && !result.ok ? result.error.message : undefined}>
        <Select name="machineId" defaultValue={current ?? ""} required>
          <option value="" disabled>Choose a machine</option>
          {machines.map((machine) => <option key={machine.id} value={machine.id}>{machine.fleetNumber} {machine.name}</option>)}
        </Select>
      </Field>
      <Button type="submit" busy={busy} busyLabel="Attaching …">{current ? "Change" : "Attach"}</Button>
      {result?.ok ? <p role="status" className="font-bold text-sound sm:col-span-2">Attached.</p> : null}
    </form>
  );
}
