"use client";

import dynamic from "next/dynamic";

const load = () => import("./check-run");

/** Fetches the running check's script ahead, while the server is there. */
export function warmCheckRun(): void {
  // Out of reach now: it is asked for again when it is needed.
  void load().catch(() => undefined);
}

/** The running check, its script apart from the pages that only lead to it or show its verdict. */
export const LazyCheckRun = dynamic(() => load().then((all) => all.CheckRun), { loading: () => <p className="py-10 text-lg">Opening the check &hellip;</p> });
