import { useId } from "react";
import type { CheckSpec } from "@/lib/diagnosis";
import type { ConnectorShape } from "@/lib/catalogue/entry-data";
import type { Labels } from "@/lib/checks/check-words";
import { faceView, leadPlaces, type LeadPlace } from "@/lib/checks/lead-places";
import { LeadMark, type LeadColour } from "./lead-tag";

/** Drawing units are CSS pixels at natural size: labels stay 16 px and more. */
const PITCH = 42;
const HALF = 16;
const PAD = 25;

interface Spot { readonly label: string; readonly x: number; readonly y: number }

function spotsOf(shape: ConnectorShape | null, labels: Labels): readonly Spot[] {
  const cavities = shape?.cavities ?? labels.map((label, column) => ({ label, row: 0, column }));
  const row0 = Math.min(...cavities.map((c) => c.row));
  const column0 = Math.min(...cavities.map((c) => c.column));
  return cavities.map((c) => ({ label: c.label, x: (c.column - column0) * PITCH, y: (c.row - row0) * PITCH }));
}

function Socket({ spot, used, touched, solid }: { readonly spot: Spot; readonly used: boolean; readonly touched: boolean; readonly solid: boolean }) {
  const stroke = touched ? "stroke-copper" : "stroke-ink";
  const common = { className: `fill-sheet ${stroke}`, strokeWidth: touched ? 5 : 2, strokeDasharray: used ? undefined : "4 4" };
  return (
    <g>
      {solid ? <circle cx={spot.x} cy={spot.y} r={HALF} {...common} /> : <rect x={spot.x - HALF} y={spot.y - HALF} width={2 * HALF} height={2 * HALF} {...common} />}
      <text x={spot.x} y={spot.y + 6} textAnchor="middle" fontSize={spot.label.length > 2 ? 16 : 18} fontWeight={700} className="fill-ink font-mono">{spot.label}</text>
    </g>
  );
}

function outline(shape: ConnectorShape | null, right: number, bottom: number) {
  const common = { className: "fill-sheet stroke-ink", strokeWidth: 2, strokeDasharray: shape ? undefined : "6 5" };
  if (shape?.outline === "round") {
    const radius = Math.hypot(right, bottom) / 2 + PAD - 2;
    return <circle cx={right / 2} cy={bottom / 2} r={radius} {...common} />;
  }
  return <rect x={-PAD} y={-PAD} width={right + 2 * PAD} height={bottom + 2 * PAD} rx={shape?.outline === "rounded" ? 14 : 0} {...common} />;
}

/** A latch shows which way up the face is held. */
function LatchMark({ shape, right, bottom }: { readonly shape: ConnectorShape | null; readonly right: number; readonly bottom: number }) {
  if (!shape || shape.latch === "none") return null;
  const across = shape.latch === "top" || shape.latch === "bottom";
  const size = across ? { width: 44, height: 9 } : { width: 9, height: 36 };
  const x = across ? right / 2 - 22 : shape.latch === "left" ? -PAD - 9 : right + PAD;
  const y = across ? (shape.latch === "top" ? -PAD - 9 : bottom + PAD) : bottom / 2 - 18;
  return <rect x={x} y={y} {...size} className="fill-ink stroke-ink" />;
}

function touching(places: { readonly red: LeadPlace; readonly black: LeadPlace } | null, label: string): readonly LeadColour[] {
  if (!places) return [];
  return (["red", "black"] as const).filter((colour) => places[colour].cavity === label);
}

/** Radius or half height that the drawing needs around its cavities. */
function frame(shape: ConnectorShape | null, right: number, bottom: number) {
  const round = shape?.outline === "round" ? Math.hypot(right, bottom) / 2 + PAD : 0;
  return { x: Math.max(PAD, round - right / 2) + 10, y: Math.max(PAD, round - bottom / 2) + 10 };
}

interface FaceSvgProps {
  readonly shape: ConnectorShape | null;
  readonly labels: Labels;
  readonly title: string;
  readonly places?: ReturnType<typeof leadPlaces>;
  readonly gripped?: string | null;
  /** Every cavity is drawn as used, for picking a face. */
  readonly plain?: boolean;
}

/** The face alone: cavities, latch and, where leads are placed, their marks. */
export function FaceSvg({ shape, labels, title, places = null, gripped = null, plain = false }: FaceSvgProps) {
  const id = useId();
  const spots = spotsOf(shape, labels);
  const right = Math.max(...spots.map((s) => s.x));
  const bottom = Math.max(...spots.map((s) => s.y));
  const margin = frame(shape, right, bottom);
  const width = right + 2 * margin.x;
  const height = bottom + 2 * margin.y;
  return (
    <svg role="img" aria-labelledby={id} width={width} viewBox={`${-margin.x} ${-margin.y} ${width} ${height}`} className="mx-auto block h-auto max-w-full">
      <title id={id}>{title}</title>
      <LatchMark shape={shape} right={right} bottom={bottom} />
      {outline(shape, right, bottom)}
      {spots.map((spot) => {
        const leads = touching(places, spot.label);
        return (
          <g key={spot.label}>
            <Socket spot={spot} used={plain || labels.includes(spot.label)} touched={leads.length > 0 || gripped === spot.label} solid={shape?.gender === "receptacle"} />
            {leads.map((colour) => <LeadMark key={colour} colour={colour} x={spot.x - 14} y={spot.y - HALF - 21} />)}
          </g>
        );
      })}
    </svg>
  );
}

interface MiniFaceProps { readonly spec: CheckSpec; readonly shape: ConnectorShape | undefined; readonly labels: Labels }

/** The face as it is seen while the leads are placed, small enough to stand beside the words that say the same. */
export function MiniFace({ spec, shape, labels }: MiniFaceProps) {
  const view = faceView(spec, shape);
  if (!view) return null;
  const gripped = spec.meter === "grip" && typeof spec.red === "number" ? labels[spec.red - 1] : null;
  return (
    <figure className="m-0 min-w-37 shrink-0">
      <FaceSvg shape={view.shape} labels={labels} title={`Connector face: ${view.caption}`} places={leadPlaces(spec, labels)} gripped={gripped} />
      <figcaption className="mt-0.5 w-0 min-w-full text-center text-base leading-tight text-balance text-quiet">{view.caption}</figcaption>
    </figure>
  );
}
