/** Two bars on one scale: outlined as published, filled as it is now. The numbers beside them say the same. */
export function ShiftBars({ published, now, scale }: { readonly published: number; readonly now: number; readonly scale: number }) {
  const width = (share: number) => `${Math.min(100, (share / scale) * 100)}%`;
  return (
    <div aria-hidden="true" className="grid content-center gap-0.5 border-l-2 border-rule py-1">
      <div className="h-2.5 border-y-2 border-r-2 border-quiet" style={{ width: width(published) }} />
      <div className="h-2.5 bg-bench [print-color-adjust:exact]" style={{ width: width(now) }} />
    </div>
  );
}

/** What outline and filling mean, and where the scale ends. */
export function ShiftKey({ scale }: { readonly scale: number }) {
  return (
    <p className="mb-3 flex flex-wrap items-center gap-x-6 gap-y-1 text-quiet">
      <span className="inline-flex items-center gap-2"><span aria-hidden="true" className="h-2.5 w-8 border-2 border-quiet" />outlined: as published</span>
      <span className="inline-flex items-center gap-2"><span aria-hidden="true" className="h-2.5 w-8 bg-bench [print-color-adjust:exact]" />filled: now</span>
      <span>bars end at {Math.round(scale * 100)}&nbsp;%</span>
    </p>
  );
}
