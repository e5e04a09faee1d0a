"use client";

import { EmptyState, ButtonLink, Notice } from "@/components/ui";
import type { Run } from "@/lib/checks/run";
import { RunBoard } from "./run-board";
import { useOutbox } from "./use-outbox";
import { useRun } from "./use-run";
import "./check-run.css";

interface CheckRunProps {
  readonly id: string;
  readonly personId: string;
  /** What the server has of this run, or null when it has not heard of it. */
  readonly known: Run | null;
}

/** A running check by its id: from this phone, the server, or both. */
export function CheckRun({ id, personId, known }: CheckRunProps) {
  const { state, add, end } = useRun(id, personId, known);
  const outbox = useOutbox(personId);
  if (state.state === "loading") return <p className="py-10 text-lg">Opening the check &hellip;</p>;
  if (state.state === "missing") {
    return (
      <EmptyState title="There is no such check here" action={<ButtonLink href="/checks/new" tone="main">Start a check</ButtonLink>}>
        Neither the server nor this phone has it. If it was started on another phone, open it there so that it is sent.
      </EmptyState>
    );
  }
  const refusal = outbox.refused.get(id);
  return (
    <div data-check-run>
      {refusal && state.record?.finish === "no" ? <Notice tone="stop" title="The server did not take this check">{refusal} It is kept on this phone and you can carry on reading.</Notice> : null}
      <RunBoard personId={personId} run={state.run} record={state.record} kept={state.kept} outbox={outbox} add={add} end={end} />
    </div>
  );
}
