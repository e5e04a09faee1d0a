import { useId, type CSSProperties, type ReactNode } from "react";

const TONES = {
  plain: {},
  ask: { "--sheet-fill": "var(--straw)", "--quiet": "var(--on-straw)", color: "var(--on-straw)" },
  stop: { "--sheet-edge": "var(--stop)", "--edge": "6px" },
  sound: { "--sheet-edge": "var(--sound)", "--edge": "6px" },
} as const;

interface SheetProps {
  readonly title?: ReactNode;
  readonly children: ReactNode;
  /** Colour and weight of the rule or ground; never the only sign of a state: say it in words too. */
  readonly tone?: keyof typeof TONES;
  /** Shown at the end of the title's line. */
  readonly actions?: ReactNode;
  readonly className?: string;
  readonly id?: string;
}

/** A flat sheet with one ink rule and a cut corner. With a title it is a labelled section. */
export function Sheet({ title, children, tone = "plain", actions, className = "", id }: SheetProps) {
  const headingId = useId();
  return (
    <section id={id} aria-labelledby={title ? headingId : undefined} className={`sheet px-4 py-4 sm:px-6 ${className}`} style={TONES[tone] as CSSProperties}>
      {title ? (
        <div className="mb-3 flex flex-wrap items-baseline justify-between gap-3 pr-4">
          <h2 id={headingId} className="text-xl font-bold">{title}</h2>
          {actions}
        </div>
      ) : null}
      {children}
    </section>
  );
}
