import { KIND_NAMES } from "@/lib/catalogue/kind-names";
import type { Kind } from "@/lib/diagnosis";

const PATHS: Readonly<Record<Kind, string>> = {
  // A resistor with its wiper; a pulse train; a slope over its axis.
  potentiometer: "M1 17h5l2-4 3 8 3-8 3 8 3-8 2 4h5M14 2v6M11 6l3 4 3-4",
  pwm: "M1 19h4V5h5v14h5V5h5v14h7",
  voltage: "M2 3v18h24M4 18 23 5",
};

/** The kind of device as a drawn sign and its word. */
export function KindMark({ kind }: { readonly kind: Kind }) {
  return (
    <span className="inline-flex items-center gap-2 whitespace-nowrap">
      <svg viewBox="0 0 28 24" aria-hidden="true" className="h-6 w-7 shrink-0"><path d={PATHS[kind]} fill="none" stroke="currentColor" strokeWidth="2.25" strokeLinejoin="round" /></svg>
      {KIND_NAMES[kind]}
    </span>
  );
}
