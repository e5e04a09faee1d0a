"use client";

import { useActionState } from "react";
import { Button, Notice, Refusal } from "@/components/ui";
import type { FormAction } from "@/lib/action";
import { momentWords } from "@/lib/checks/date-words";

interface OwnSwitchProps {
  readonly setAside: { readonly by: string; readonly at: string } | null;
  readonly maySwitch: boolean;
  readonly act: FormAction;
}

/** Says whether own checks count, and lets those who may set them aside or count them again. */
export function OwnSwitch({ setAside, maySwitch, act }: OwnSwitchProps) {
  const [result, send, busy] = useActionState(act, null);
  return (
    <div className="grid gap-4">
      <Refusal result={result} />
      <div role="status">
        {setAside
          ? <Notice tone="ask" title="Own checks are set aside"><p>New checks start from the published chances alone. Set aside by {setAside.by}, {momentWords(setAside.at)}.</p></Notice>
          : <p className="font-bold">Own checks count: new checks start from the chances below.</p>}
      </div>
      {maySwitch ? (
        <form action={send}>
          <input type="hidden" name="inUse" value={setAside ? "yes" : "no"} />
          <Button type="submit" busy={busy}>{setAside ? "Count own checks again" : "Set own checks aside"}</Button>
        </form>
      ) : null}
    </div>
  );
}
