"use client";

import dynamic from "next/dynamic";
import { Component, useSyncExternalStore, type ReactNode } from "react";
import type { WiringFacts } from "./wiring-graph";
import { wiringWords } from "./wiring-facts";

const WiringDrawing = dynamic(() => import("./wiring-drawing"), { ssr: false, loading: () => <p className="min-h-90 text-quiet">Drawing …</p> });

/** The drawing's script may be out of reach with the server down: then the words alone stand. */
class WordsInstead extends Component<{ readonly children: ReactNode }, { readonly failed: boolean }> {
  override state = { failed: false };
  static getDerivedStateFromError() { return { failed: true }; }
  override render() { return this.state.failed ? null : this.props.children; }
}

/** The wiring as a drawing and in words. */
export function Drawing({ facts }: { readonly facts: WiringFacts }) {
  const words = wiringWords(facts);
  return (
    <figure className="m-0 grid gap-2">
      <WordsInstead><WiringDrawing facts={facts} description={words} /></WordsInstead>
      <figcaption className="text-quiet">{words}</figcaption>
    </figure>
  );
}

const WIDE = "(width >= 64rem)";

function subscribe(changed: () => void): () => void {
  const query = window.matchMedia(WIDE);
  query.addEventListener("change", changed);
  return () => query.removeEventListener("change", changed);
}

/** The drawing where there is room for it beside the keypad; elsewhere its script is not even loaded. */
export function WideDrawing({ facts }: { readonly facts: WiringFacts }) {
  const wide = useSyncExternalStore(subscribe, () => window.matchMedia(WIDE).matches, () => false);
  return wide ? <div className="border-t-2 border-rule pt-3"><Drawing facts={facts} /></div> : null;
}
