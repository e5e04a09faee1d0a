interface ConfirmedMarkProps {
  /** What the check turned out to be, in a few words; the word alone where it stands beside the record. */
  readonly finding?: string;
}

/** "Confirmed", with a mark of its own: a tick in a ring, where a tick in a square means sound. */
export function ConfirmedMark({ finding }: ConfirmedMarkProps) {
  return (
    <p className="flex items-start gap-2 font-bold text-sound">
      <svg viewBox="0 0 24 24" aria-hidden="true" className="size-6 shrink-0 fill-none stroke-current [stroke-width:2.5]"><path d="M12 2.5a9.5 9.5 0 1 0 .01 0M7.5 12l3.5 3.5 5.5-7" /></svg>
      <span>Confirmed{finding ? `: ${finding}` : ""}</span>
    </p>
  );
}
