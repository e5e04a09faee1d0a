import type { ReactNode } from "react";

export type NoticeTone = "ask" | "stop" | "sound" | "plain";

const WORDS: Record<NoticeTone, string> = { ask: "Attention", stop: "Stop", sound: "Sound", plain: "Note" };
const GROUNDS: Record<NoticeTone, string> = {
  ask: "bg-straw text-on-straw",
  stop: "border-2 border-stop bg-sheet",
  sound: "border-2 border-sound bg-sheet",
  plain: "bg-sheet",
};
const INKS: Record<NoticeTone, string> = { ask: "text-on-straw", stop: "text-stop", sound: "text-sound", plain: "text-ink" };

/** Triangle, octagon, ticked square, square: the shape says the tone without its colour. */
function Mark({ tone }: { readonly tone: NoticeTone }) {
  const common = { fill: "none", stroke: "currentColor", strokeWidth: 2.5 } as const;
  return (
    <svg viewBox="0 0 24 24" role="img" aria-label={WORDS[tone]} className={`mt-0.5 size-7 shrink-0 ${INKS[tone]}`}>
      {tone === "ask" ? <path d="M12 3 22 21H2ZM12 10v5M12 17v1.5" {...common} /> : null}
      {tone === "stop" ? <path d="M8 2h8l6 6v8l-6 6H8l-6-6V8ZM7 12h10" {...common} /> : null}
      {tone === "sound" ? <path d="M3 3h18v18H3ZM7 12l4 4 6-8" {...common} /> : null}
      {tone === "plain" ? <path d="M3 3h18v18H3ZM12 11v6M12 7v1.5" {...common} /> : null}
    </svg>
  );
}

interface NoticeProps {
  readonly tone: NoticeTone;
  readonly title: ReactNode;
  readonly children?: ReactNode;
  /** Announce it when it appears: "assertive" for errors, "polite" for news. */
  readonly live?: "polite" | "assertive";
}

/** A band that asks for attention, stops, confirms or tells. */
export function Notice({ tone, title, children, live }: NoticeProps) {
  const role = live === "assertive" ? "alert" : live === "polite" ? "status" : undefined;
  return (
    <div role={role} className={`flex gap-3 px-4 py-3 ${GROUNDS[tone]}`}>
      <Mark tone={tone} />
      <div className="min-w-0">
        <p className="text-lg leading-snug font-bold">{title}</p>
        {children ? <div className="mt-1">{children}</div> : null}
      </div>
    </div>
  );
}
