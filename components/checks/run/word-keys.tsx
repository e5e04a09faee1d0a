import type { CheckSpec, SymbolValue } from "@/lib/diagnosis";
import { Button } from "@/components/ui";

const WORDS: Readonly<Record<SymbolValue, { readonly face: string; readonly means: string }>> = {
  smooth: { face: "Smooth", means: "rises or falls without a gap" },
  jumps: { face: "Jumps", means: "drops out or leaps on the way" },
  still: { face: "Still", means: "does not move at all" },
  grips: { face: "Grips", means: "holds the test terminal" },
  loose: { face: "Loose", means: "lets it slide" },
  OL: { face: "OL", means: "over range" },
  none: { face: "No reading", means: "the meter shows nothing" },
};

interface WordKeysProps { readonly spec: CheckSpec; readonly busy: boolean; readonly onWord: (word: SymbolValue) => void }

/** Answers that are words: one press records it, and undo takes it back. */
export function WordKeys({ spec, busy, onWord }: WordKeysProps) {
  return (
    <div role="group" aria-label="What did it do?" className="grid gap-2">
      {spec.words.map((word) => (
        <Button key={word} size="glove" aria-disabled={busy || undefined} onClick={() => { if (!busy) onWord(word); }} className="w-full flex-col gap-0 py-3">
          <span className="font-mono text-4xl leading-tight">{WORDS[word].face}</span>
          <span className="text-base font-normal">{WORDS[word].means}</span>
        </Button>
      ))}
    </div>
  );
}
