"use client";

import { useActionState } from "react";
import { Button, Refusal } from "@/components/ui";
import type { FormAction } from "@/lib/action";
import { browserName } from "./browser-name";
import { When } from "./when";

export interface ShownSession { readonly id: string; readonly userAgent: string; readonly createdAt: Date; readonly lastSeenAt: Date; readonly own: boolean }

/** The browsers one is signed in with, each with its way out. */
export function SessionList({ sessions, revoke, revokeOthers }: { readonly sessions: readonly ShownSession[]; readonly revoke: FormAction; readonly revokeOthers: FormAction }) {
  const [result, send, busy] = useActionState(revoke, null);
  const [others, sendOthers, busyOthers] = useActionState(revokeOthers, null);
  const failed = [result, others].find((answer) => answer && !answer.ok);
  return (
    <div className="grid gap-4">
      <Refusal result={failed} />
      <ul className="grid">
        {sessions.map((session) => <SessionItem key={session.id} session={session} send={send} busy={busy} />)}
      </ul>
      {sessions.length > 1 ? <form action={sendOthers}><Button type="submit" tone="stop" busy={busyOthers}>Sign out everywhere else</Button></form> : null}
    </div>
  );
}

function SessionItem({ session, send, busy }: { readonly session: ShownSession; readonly send: (form: FormData) => void; readonly busy: boolean }) {
  const name = browserName(session.userAgent);
  return (
    <li className="flex flex-wrap items-center justify-between gap-3 border-b border-quiet py-3 first:border-t">
      <div>
        <p className="font-bold">{name}{session.own ? " · this browser" : ""}</p>
        <p className="text-quiet">Signed in <When at={session.createdAt} />, last used <When at={session.lastSeenAt} /></p>
      </div>
      {session.own ? null : (
        <form action={send}>
          <input type="hidden" name="sessionId" value={session.id} />
          <Button type="submit" busy={busy}>Sign out this browser<span className="sr-only">: {name}</span></Button>
        </form>
      )}
    </li>
  );
}
