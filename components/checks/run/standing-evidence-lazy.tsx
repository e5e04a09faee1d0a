"use client";

import dynamic from "next/dynamic";
import { Component, useEffect, type ComponentProps, type ReactNode } from "react";

const load = () => import("./standing-evidence");
const Evidence = dynamic(() => load().then((all) => all.StandingEvidence), { ssr: false, loading: () => <p role="status">Working it out …</p> });

/** Fetches the script of the reasons at the first touch or key, so that it is there should the server go. */
export function useWarmEvidence(): void {
  useEffect(() => {
    const once = new AbortController();
    const warm = () => {
      once.abort();
      // Out of reach now: it is asked for again when it is needed.
      void load().catch(() => undefined);
    };
    for (const event of ["pointerdown", "keydown"]) window.addEventListener(event, warm, { signal: once.signal, passive: true });
    return () => once.abort();
  }, []);
}

/** Out of reach with the server down: the standing stays, its reasons wait. */
class Waits extends Component<{ readonly children: ReactNode }, { readonly failed: boolean }> {
  override state = { failed: false };
  static getDerivedStateFromError() { return { failed: true }; }
  override render() { return this.state.failed ? <p role="status">The reasons cannot be fetched while the server is away.</p> : this.props.children; }
}

/** The reasons behind the standing, their script apart from the running check. */
export function LazyStandingEvidence(props: ComponentProps<typeof Evidence>) {
  return <Waits><Evidence {...props} /></Waits>;
}
