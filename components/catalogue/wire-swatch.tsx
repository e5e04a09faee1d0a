/** Screen colours for IEC 60757 letters; always shown beside the letters, never instead of them. */
const INKS: Readonly<Record<string, string>> = {
  BK: "#141414", BN: "#6b4226", RD: "#c02020", OG: "#e07b1a", YE: "#f2d21b", GN: "#2f8a3b", BU: "#2b62b5",
  VT: "#7a3f9a", GY: "#8b8f92", WH: "#ffffff", PK: "#f0a3b8", GD: "#c9a227", TQ: "#2ab3b0", SR: "#c3c7ca",
};

/** A short length of the wire's insulation, one band a colour. */
export function WireSwatch({ letters }: { readonly letters: string }) {
  const bands = (letters.match(/../g) ?? []).map((code) => INKS[code] ?? "#ffffff");
  return (
    <svg viewBox="0 0 24 14" aria-hidden="true" className="h-3.5 w-6 shrink-0 [print-color-adjust:exact]">
      {bands.map((ink, i) => <rect key={i} x={2 + (20 / bands.length) * i} y={2} width={20 / bands.length} height={10} fill={ink} />)}
      <rect x={1} y={1} width={22} height={12} fill="none" stroke="var(--ink)" strokeWidth={2} />
    </svg>
  );
}
