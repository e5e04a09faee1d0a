/** Our sign: a cable tag with three pins, the third shorter. */
export function BrandMark({ className = "" }: { readonly className?: string }) {
  return (
    <span className={`inline-flex items-center gap-2 text-xl font-extrabold ${className}`}>
      <svg viewBox="0 0 24 24" aria-hidden="true" className="size-7 shrink-0">
        <path d="M2 4h15l5 5v11H2Z" fill="none" stroke="currentColor" strokeWidth="2.5" />
        <path d="M7 9v6M12 9v6M17 11v4" stroke="currentColor" strokeWidth="2.5" />
      </svg>
      Pinwright
    </span>
  );
}
