import { scaleOf, shareOf } from "@/lib/catalogue/chart-scale";
import type { TransferTable } from "@/lib/catalogue/entry-data";
import { tableSpan } from "@/lib/catalogue/transfer";
import { formatQuantity } from "@/lib/units";

const VIEW = { width: 358, height: 300 } as const;
const PLOT = { left: 66, right: 336, top: 34, bottom: 244 } as const;

/** Tick numbers stand without their unit; the axis' title names it once. */
function tickText(value: number, unit: string): string {
  const shown = unit === "ratio" ? value * 100 : value;
  return String(Number(shown.toPrecision(6))).replace("-", "\u2212");
}

const axisUnit = (unit: string) => (unit === "ratio" ? "%" : unit === "volt" ? "V" : unit === "deg" ? "°" : unit);

interface TransferCurveProps {
  readonly table: TransferTable;
  /** A pair to mark on the curve, in the table's units. */
  readonly at?: { readonly signal: number; readonly value: number } | null;
}

function Grid({ table }: { readonly table: TransferTable }) {
  const { x, y, placeX, placeY } = placing(table);
  return (
    <g>
      {x.ticks.map((tick) => (
        <g key={tick}>
          <line x1={placeX(tick)} x2={placeX(tick)} y1={PLOT.top} y2={PLOT.bottom} className="stroke-quiet" strokeWidth={0.75} strokeDasharray="2 4" />
          <text x={placeX(tick)} y={PLOT.bottom + 21} textAnchor="middle" fontSize={16} className="fill-ink font-mono">{tickText(tick, table.signal.unit)}</text>
        </g>
      ))}
      {y.ticks.map((tick) => (
        <g key={tick}>
          <line x1={PLOT.left} x2={PLOT.right} y1={placeY(tick)} y2={placeY(tick)} className="stroke-quiet" strokeWidth={0.75} strokeDasharray="2 4" />
          <text x={PLOT.left - 7} y={placeY(tick) + 5.5} textAnchor="end" fontSize={16} className="fill-ink font-mono">{tickText(tick, table.value.unit)}</text>
        </g>
      ))}
      <path d={`M${PLOT.left} ${PLOT.top}V${PLOT.bottom}H${PLOT.right}`} fill="none" className="stroke-ink" strokeWidth={2} />
      <text x={4} y={18} fontSize={16} fontWeight={700} className="fill-ink font-read">{`${table.value.name}, ${axisUnit(table.value.unit)}`}</text>
      <text x={PLOT.right} y={VIEW.height - 8} textAnchor="end" fontSize={16} fontWeight={700} className="fill-ink font-read">{`${table.signal.name}, ${axisUnit(table.signal.unit)}`}</text>
    </g>
  );
}

function placing(table: TransferTable) {
  const span = tableSpan(table);
  const x = scaleOf(...span.signal, 4);
  const y = scaleOf(...span.value, 4);
  return {
    x, y,
    placeX: (signal: number) => PLOT.left + shareOf(x, signal) * (PLOT.right - PLOT.left),
    placeY: (value: number) => PLOT.bottom - shareOf(y, value) * (PLOT.bottom - PLOT.top),
  };
}

/** The transfer table as a curve: its points, straight lines between them, axes with units, and a marked pair. */
export function TransferCurve({ table, at }: TransferCurveProps) {
  const { placeX, placeY } = placing(table);
  const { signal, value } = tableSpan(table);
  const points = table.points.map((point) => ({ x: placeX(point.signal), y: placeY(point.value) }));
  const words = `${table.value.name} from ${formatQuantity(value[0], table.value.unit)} to ${formatQuantity(value[1], table.value.unit)} over ${table.signal.name.toLowerCase()} from ${formatQuantity(signal[0], table.signal.unit)} to ${formatQuantity(signal[1], table.signal.unit)}, ${points.length} points`;
  return (
    <svg role="img" aria-label={words} viewBox={`0 0 ${VIEW.width} ${VIEW.height}`} className="block h-auto w-full max-w-[28rem] print:max-w-[10cm]">
      <Grid table={table} />
      {at ? (
        <path d={`M${PLOT.left} ${placeY(at.value)}H${placeX(at.signal)}V${PLOT.bottom}`} fill="none" className="stroke-copper" strokeWidth={2.5} strokeDasharray="7 4" />
      ) : null}
      <polyline points={points.map((p) => `${p.x},${p.y}`).join(" ")} fill="none" className="stroke-bench" strokeWidth={3} />
      {points.map((p) => <rect key={p.x} x={p.x - 4.5} y={p.y - 4.5} width={9} height={9} className="fill-sheet stroke-bench" strokeWidth={2.5} />)}
      {at ? <circle cx={placeX(at.signal)} cy={placeY(at.value)} r={8} className="fill-copper stroke-sheet" strokeWidth={2.5} /> : null}
    </svg>
  );
}
