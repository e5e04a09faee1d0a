export type PinTagRole = "supply" | "ground" | "signal";

const TAGS = {
  supply: { text: "+V", word: "supply", look: "bg-ink text-paper border-ink" },
  ground: { text: "0V", word: "ground", look: "bg-sheet text-ink border-ink border-b-[6px]" },
  signal: { text: "SIG", word: "signal", look: "bg-straw text-on-straw border-ink" },
} as const;

/** The tag a pin carries: +V, 0V or SIG; read aloud with its word. */
export function PinTag({ role }: { readonly role: PinTagRole }) {
  const tag = TAGS[role];
  return (
    <span className={`inline-flex h-8 min-w-12 items-center justify-center border-2 px-1.5 font-mono font-bold whitespace-nowrap [print-color-adjust:exact] ${tag.look}`}>
      {tag.text}
      <span className="sr-only"> ({tag.word})</span>
    </span>
  );
}
