interface CavityProps { readonly x: number; readonly label: string; readonly tag: string; readonly touched: boolean }

function Cavity({ x, label, tag, touched }: CavityProps) {
  return (
    <g>
      {touched ? <rect x={x - 34} y={76} width={68} height={68} className="fill-straw stroke-copper" strokeWidth={5} /> : null}
      <rect x={x - 25} y={85} width={50} height={50} className="fill-sheet stroke-ink" strokeWidth={3} />
      <text x={x} y={119} textAnchor="middle" fontSize={26} fontWeight={700} className="fill-ink font-mono">{label}</text>
      <text x={x} y={66} textAnchor="middle" fontSize={22} fontWeight={700} className="fill-ink font-mono">{tag}</text>
    </g>
  );
}

/** The meter, square with one corner cut, its reading and its two jacks. */
function Meter() {
  return (
    <g>
      <path d="M24 236H238L262 260V420H24Z" className="fill-sheet stroke-ink" strokeWidth={4} />
      <rect x={46} y={260} width={186} height={66} className="fill-paper stroke-ink" strokeWidth={2} />
      <text x={220} y={306} textAnchor="end" fontSize={36} fontWeight={700} className="fill-ink font-mono">4.72 kΩ</text>
      <circle cx={84} cy={374} r={26} className="fill-sheet stroke-ink" strokeWidth={3} />
      <path d="M84 374 100 354" className="stroke-ink" strokeWidth={5} />
      <text x={124} y={356} fontSize={20} fontWeight={700} className="fill-ink font-mono">Ω</text>
    </g>
  );
}

/** Leads from the meter's jacks to two cavities: red pointed at both ends, black with a cut corner. */
function Leads() {
  return (
    <g fill="none" strokeWidth={7}>
      <path d="M178 386C178 476 344 470 344 330S262 230 262 144" className="stroke-ink" strokeDasharray="16 5" />
      <path d="M224 386C224 446 474 440 474 320S442 230 442 144" className="stroke-stop" />
      <circle cx={178} cy={386} r={13} className="fill-ink stroke-none" />
      <circle cx={224} cy={386} r={13} className="fill-stop stroke-none" />
      <path d="M327 294H349L360 305V334H327Z" className="fill-ink stroke-none" />
      <path d="M453 312 463 292H485L495 312 485 332H463Z" className="fill-stop stroke-none" />
      <text x={343} y={322} textAnchor="middle" fontSize={22} fontWeight={700} className="fill-paper stroke-none font-read">B</text>
      <text x={474} y={320} textAnchor="middle" fontSize={22} fontWeight={700} className="fill-on-stop stroke-none font-read">R</text>
    </g>
  );
}

/** What a check looks like on the bench: a connector's face, a meter, two leads. */
export function BenchDrawing({ className = "" }: { readonly className?: string }) {
  return (
    <svg role="img" aria-label="A meter reads 4.72 kilohms between two cavities of a connector whose pins are named supply, ground and signal" viewBox="0 0 560 460" className={`block h-auto w-full ${className}`}>
      <rect x={306} y={16} width={92} height={22} className="fill-ink" />
      <path d="M186 38H494L518 62V164H186Z" className="fill-sheet stroke-ink" strokeWidth={4} />
      <Cavity x={262} label="A" tag="+V" touched />
      <Cavity x={352} label="B" tag="0V" touched={false} />
      <Cavity x={442} label="C" tag="SIG" touched />
      <Meter />
      <Leads />
    </svg>
  );
}
