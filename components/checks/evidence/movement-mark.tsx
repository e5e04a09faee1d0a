import type { Movement } from "@/lib/checks/evidence-words";

/** Up, down, level and struck out, so that a row is told apart without its colour. */
const SHAPES: Readonly<Record<Movement, string>> = { for: "M12 4 21 20H3Z", against: "M12 20 3 4H21Z", rules: "M5 5 19 19M19 5 5 19", neither: "M4 12H20" };
const FILLED: ReadonlySet<Movement> = new Set<Movement>(["for"]);

/** Which way a reading moved the chance of a finding, as a shape beside the words that say it. */
export function MovementMark({ kind }: { readonly kind: Movement }) {
  return <svg viewBox="0 0 24 24" aria-hidden="true" className={`mt-1 size-5 shrink-0 stroke-ink [stroke-width:3] ${FILLED.has(kind) ? "fill-ink" : "fill-none"}`}><path d={SHAPES[kind]} /></svg>;
}
