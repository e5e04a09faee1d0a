import type { ConnectorShape, Keying } from "@/lib/catalogue/entry-data";
import { type Box, FLAG, HOLE, keyingPlace, LATCH, type LeadLane, PITCH, type PlacedCavity, trianglePoints } from "./face-geometry";

/** The shell: one outline for a plug, a second one inside it (the shroud) for a receptacle. */
export function Outline({ shape, box, inset = 0, className }: { shape: ConnectorShape; box: Box; inset?: number; className: string }) {
  const inner = { left: box.left + inset, top: box.top + inset, right: box.right - inset, bottom: box.bottom - inset };
  const width = inner.right - inner.left;
  if (shape.outline === "round") return <circle cx={inner.left + width / 2} cy={inner.top + width / 2} r={width / 2} className={className} />;
  if (shape.outline === "triangle") {
    return <polygon points={trianglePoints(inner).map((p) => `${p.x},${p.y}`).join(" ")} strokeLinejoin="round" className={className} />;
  }
  const corner = shape.outline === "rounded" ? 26 - inset : 3;
  return <rect x={inner.left} y={inner.top} width={width} height={inner.bottom - inner.top} rx={corner} className={className} />;
}

/** A rib stands out from the shell and is solid; a slot is cut into it and is open. */
export function KeyingMark({ shape, box, mark }: { shape: ConnectorShape; box: Box; mark: Keying }) {
  const place = keyingPlace(shape, box, mark);
  const width = mark.width * PITCH;
  const rib = mark.type === "rib";
  return (
    <g transform={`translate(${place.x} ${place.y}) rotate(${place.turn})`}>
      <rect x={-width / 2} y={rib ? -11 : -2} width={width} height={rib ? 12 : 14} className={rib ? "fill-ink stroke-ink" : "fill-sheet stroke-ink"} strokeWidth={3} />
      {!rib && <line x1={-width / 2 + 2} x2={width / 2 - 2} y1={-2} y2={-2} className="stroke-sheet" strokeWidth={4} />}
    </g>
  );
}

/** The latch with its name on it, outside the shell. */
export function Latch({ shape, box }: { shape: ConnectorShape; box: Box }) {
  if (shape.latch === "none") return null;
  const across = shape.latch === "top" || shape.latch === "bottom";
  const middle = { x: (box.left + box.right) / 2, y: (box.top + box.bottom) / 2 };
  const outward = shape.latch === "top" || shape.latch === "left" ? -1 : 1;
  const { length, depth } = LATCH;
  const size = across ? { width: length, height: depth } : { width: depth, height: length };
  const near = (at: number) => at + (outward < 0 ? -depth : 0);
  const x = across ? middle.x - length / 2 : near(box[shape.latch]);
  const y = across ? near(box[shape.latch]) : middle.y - length / 2;
  const centre = { x: x + size.width / 2, y: y + size.height / 2 };
  return (
    <g>
      <rect x={x} y={y} {...size} className="fill-sheet stroke-ink" strokeWidth={3} />
      <text
        x={centre.x} y={centre.y + 6} textAnchor="middle" fontSize={17} className="fill-ink font-read"
        transform={across ? undefined : `rotate(${outward * 90} ${centre.x} ${centre.y})`}
      >
        latch
      </text>
    </g>
  );
}

interface CavityMarkProps { cavity: PlacedCavity; gender: ConnectorShape["gender"]; used: boolean; marked: boolean; tag?: string; tagAside: boolean }

/** A socket of a plug is an open square, a pin of a receptacle a solid disc; an unused cavity is dashed. A tag stands aside for a lead from below. */
export function CavityMark({ cavity, gender, used, marked, tag, tagAside }: CavityMarkProps) {
  const solid = gender === "receptacle" && used;
  const body = solid ? "fill-ink stroke-ink" : "fill-sheet stroke-ink";
  const dash = used ? undefined : "5 5";
  return (
    <g>
      {marked && <rect x={cavity.x - HOLE - 7} y={cavity.y - HOLE - 7} width={2 * HOLE + 14} height={2 * HOLE + 14} className="fill-straw stroke-copper" strokeWidth={5} />}
      {gender === "receptacle"
        ? <circle cx={cavity.x} cy={cavity.y} r={HOLE} className={body} strokeWidth={3} strokeDasharray={dash} />
        : <rect x={cavity.x - HOLE} y={cavity.y - HOLE} width={2 * HOLE} height={2 * HOLE} className={body} strokeWidth={3} strokeDasharray={dash} />}
      <text x={cavity.x} y={cavity.y + 7} textAnchor="middle" fontSize={21} fontWeight={700} className={`font-mono ${solid ? "fill-paper" : "fill-ink"}`}>{cavity.label}</text>
      {tag && (
        <text x={cavity.x + (tagAside ? 10 : 0)} y={cavity.y + HOLE + 26} textAnchor={tagAside ? "start" : "middle"} fontSize={18} fontWeight={700} className="fill-ink font-mono">{tag}</text>
      )}
    </g>
  );
}

const LEAD = {
  red: { letter: "R", word: "red", flag: "fill-stop stroke-stop", text: "fill-on-stop", wire: "stroke-stop" },
  black: { letter: "B", word: "black", flag: "fill-black stroke-white", text: "fill-white", wire: "stroke-black" },
} as const;

export type LeadColour = keyof typeof LEAD;

function flagPoints(colour: LeadColour, x: number, y: number): string {
  const { width, height } = FLAG;
  const cut = 12;
  // The red flag is pointed at both ends, the black one a cut tag: told apart without their colours.
  return colour === "red"
    ? `${x},${y + height / 2} ${x + cut},${y} ${x + width - cut},${y} ${x + width},${y + height / 2} ${x + width - cut},${y + height} ${x + cut},${y + height}`
    : `${x},${y} ${x + width - cut},${y} ${x + width},${y + cut} ${x + width},${y + height} ${x},${y + height}`;
}

/** The lead's flag: letter and word, top left corner at x, y. */
export function LeadFlag({ colour, x, y }: { colour: LeadColour; x: number; y: number }) {
  const look = LEAD[colour];
  return (
    <g>
      <polygon points={flagPoints(colour, x, y)} className={look.flag} strokeWidth={2} />
      <text x={x + FLAG.width / 2} y={y + 23} textAnchor="middle" fontSize={17} className={`font-read ${look.text}`}>
        <tspan fontWeight={700}>{look.letter}</tspan>{` ${look.word}`}
      </text>
    </g>
  );
}

/** A probe from its flag to the cavity it touches. */
export function Lead({ colour, lane }: { colour: LeadColour; lane: LeadLane }) {
  const { from, to, side } = lane;
  const x = side === "left" ? from.x - FLAG.width : side === "right" ? from.x : from.x - FLAG.width / 2;
  const y = side === "top" ? from.y - FLAG.height : side === "bottom" ? from.y : from.y - FLAG.height / 2;
  return (
    <g>
      <line x1={from.x} y1={from.y} x2={to.x} y2={to.y} className="stroke-white" strokeWidth={11} />
      <line x1={from.x} y1={from.y} x2={to.x} y2={to.y} className={LEAD[colour].wire} strokeWidth={7} />
      <circle cx={to.x} cy={to.y} r={6} className="fill-copper stroke-white" strokeWidth={2} />
      <LeadFlag colour={colour} x={x} y={y} />
    </g>
  );
}
