"use client";

import dynamic from "next/dynamic";
import { Component, type ReactNode } from "react";
import type { WiringFacts } from "./wiring-graph";
import { wiringWords } from "./wiring-facts";

const WiringDrawing = dynamic(() => import("./wiring-drawing"), { ssr: false, loading: () => <p className="text-quiet">Drawing …</p> });

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
