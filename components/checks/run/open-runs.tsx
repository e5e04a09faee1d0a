"use client";

import Link from "next/link";
import { useEffect, useState } from "react";
import type { Route } from "next";
import { Notice } from "@/components/ui";
import type { RunRecord } from "@/lib/offline/records";
import { openRuns } from "@/lib/offline/run-store";
import { runName } from "./run-name";

const MOST = 3;

/** This person's checks on this phone that are not finished: the way back to a check that was left. */
export function OpenRuns({ personId }: { readonly personId: string }) {
  const [runs, setRuns] = useState<readonly RunRecord[]>([]);
  useEffect(() => {
    let gone = false;
    void openRuns(personId).then((found) => { if (!gone) setRuns(found); }, () => undefined);
    return () => { gone = true; };
  }, [personId]);
  if (runs.length === 0) return null;
  return (
    <div className="mb-6">
      <Notice tone="ask" title="Not finished on this phone">
        <ul>
          {runs.slice(0, MOST).map((run) => (
            <li key={run.id}><Link href={`/checks/${run.id}` as Route} className="inline-flex min-h-touch items-center underline underline-offset-4">Carry on: {runName(run.setup)}, {new Date(run.startedAt).toLocaleString("en-GB", { dateStyle: "medium", timeStyle: "short" })}</Link></li>
          ))}
        </ul>
      </Notice>
    </div>
  );
}
