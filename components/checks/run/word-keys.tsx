import type { CheckSpec, SymbolValue } from "@/lib/diagnosis";
import { Button } from "@/components/ui";

const WORDS: Readonly<Partial<Record<SymbolValue, { readonly face: string; readonly means: string }>>> = {
  smooth: { face: "Smooth", means: "rises or falls without a gap" },
  jumps: { face: "Jumps", means: "drops out or leaps on the way" },
  still: { face: "Still", means: "does not move at all" },
  grips: { face: "Grips", means: "holds the test terminal" },
  loose: { face: "Loose", means: "lets it slide" },
};

/** Names of the colours; the letters are those of IEC 60757. */
const COLOURS: Readonly<Partial<Record<SymbolValue, string>>> = {
  BK: "black", BN: "brown", RD: "red", OG: "orange", YE: "yellow", GN: "green", BU: "blue", VT: "violet", GY: "grey", WH: "white", PK: "pink", TQ: "turquoise", GNYE: "green-and-yellow",
};

/** More answers than this stand in columns. */
const IN_ONE_COLUMN = 4;

interface WordKeysProps { readonly spec: CheckSpec; readonly busy: boolean; readonly onWord: (word: SymbolValue) => void }

/** Answers that are words: one press records it, and undo takes it back. */
export function WordKeys({ spec, busy, onWord }: WordKeysProps) {
  return (
    <div role="group" aria-label={spec.meter === "look" ? "What does it show?" : "What did it do?"} className={`grid gap-2 ${spec.words.length > IN_ONE_COLUMN ? "grid-cols-3" : ""}`}>
      {spec.words.map((word) => {
        const said = WORDS[word] ?? { face: word.replace("FMI ", ""), means: COLOURS[word] ?? "" };
        return (
          <Button key={word} size="glove" aria-disabled={busy || undefined} onClick={() => { if (!busy) onWord(word); }} className="w-full flex-col gap-0 px-1 py-3 last:nth-[3n+1]:col-span-3 last:nth-[3n+2]:col-span-2">
            <span className="font-mono text-4xl leading-tight">{said.face}</span>
            {said.means ? <span className="text-base leading-tight font-normal">{said.means}</span> : null}
          </Button>
        );
      })}
    </div>
  );
}
