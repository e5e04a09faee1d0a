import type { ConnectorShape, Keying } from "@/lib/catalogue/entry-data";

/** Drawing units; one unit is one CSS pixel at natural size, so text of 16 units is 16 px. */
export const PITCH = 84;
/** From the outer cavities' middles to the shell: room for a tag below, and beside it just enough that four fit a phone. */
const PAD = { x: 50, y: 64, round: 60, apex: 58 } as const;
export const HOLE = 21;
export const LATCH = { length: 84, depth: 26 } as const;
export const FLAG = { width: 92, height: 34, gap: 34 } as const;

export type Side = Keying["side"];
export interface Point { readonly x: number; readonly y: number }
export interface Box { readonly left: number; readonly top: number; readonly right: number; readonly bottom: number }
export interface PlacedCavity extends Point { readonly label: string }

const SIDES: readonly Side[] = ["top", "bottom", "left", "right"];

/** Cavities in drawing units, the first row and column at 0. */
export function placeCavities(shape: ConnectorShape): readonly PlacedCavity[] {
  const row0 = Math.min(...shape.cavities.map((c) => c.row));
  const column0 = Math.min(...shape.cavities.map((c) => c.column));
  return shape.cavities.map((c) => ({ label: c.label, x: (c.column - column0) * PITCH, y: (c.row - row0) * PITCH }));
}

/** The face's outer box: the cavities with a margin; a round face is the circle around that. */
export function faceBox(shape: ConnectorShape, placed: readonly PlacedCavity[]): Box {
  const right = Math.max(...placed.map((c) => c.x));
  const bottom = Math.max(...placed.map((c) => c.y));
  if (shape.outline !== "round") return { left: -PAD.x, top: -PAD.y, right: right + PAD.x, bottom: bottom + PAD.y };
  const centre = { x: right / 2, y: bottom / 2 };
  const radius = Math.max(...placed.map((c) => Math.hypot(c.x - centre.x, c.y - centre.y))) + PAD.round;
  return { left: centre.x - radius, top: centre.y - radius, right: centre.x + radius, bottom: centre.y + radius };
}

/** Corner points of the "triangle" outline: blunt at the apex, upright at the foot. */
export function trianglePoints(box: Box): readonly Point[] {
  const middle = (box.left + box.right) / 2;
  const shoulder = box.top + (box.bottom - box.top) * 0.52;
  return [
    { x: middle - PAD.apex, y: box.top }, { x: middle + PAD.apex, y: box.top }, { x: box.right, y: shoulder },
    { x: box.right, y: box.bottom }, { x: box.left, y: box.bottom }, { x: box.left, y: shoulder },
  ];
}

/** Where a keying moulding sits on the outline and how far it is turned (degrees; 0 = pointing up). */
export function keyingPlace(shape: ConnectorShape, box: Box, key: Keying): Point & { readonly turn: number } {
  const centre = { x: (box.left + box.right) / 2, y: (box.top + box.bottom) / 2 };
  const base = { top: 0, right: 90, bottom: 180, left: 270 }[key.side];
  if (shape.outline === "round") {
    const forward = key.side === "top" || key.side === "right";
    const turn = base + (key.at - 0.5) * 90 * (forward ? 1 : -1);
    const radius = (box.right - box.left) / 2;
    const angle = ((turn - 90) * Math.PI) / 180;
    return { x: centre.x + radius * Math.cos(angle), y: centre.y + radius * Math.sin(angle), turn };
  }
  if (key.side === "top" || key.side === "bottom") {
    const span = shape.outline === "triangle" && key.side === "top" ? { from: centre.x - PAD.apex, to: centre.x + PAD.apex } : { from: box.left, to: box.right };
    return { x: span.from + (span.to - span.from) * key.at, y: box[key.side], turn: base };
  }
  return { x: box[key.side], y: box.top + (box.bottom - box.top) * key.at, turn: base };
}

export interface LeadLane { readonly side: Side; readonly from: Point; readonly to: Point }
export interface LeadLanes { readonly red?: LeadLane; readonly black?: LeadLane }

function lane(target: Point, box: Box, side: Side): LeadLane {
  const reach = FLAG.gap;
  if (side === "top" || side === "bottom") {
    const sign = side === "top" ? -1 : 1;
    return { side, from: { x: target.x, y: box[side] + sign * reach }, to: { x: target.x, y: target.y + sign * HOLE } };
  }
  const sign = side === "left" ? -1 : 1;
  return { side, from: { x: box[side] + sign * reach, y: target.y }, to: { x: target.x + sign * HOLE, y: target.y } };
}

/** A lead that comes in over the latch hides its name. */
function overLatch(shape: ConnectorShape, box: Box, target: PlacedCavity, side: Side): boolean {
  if (side !== shape.latch) return false;
  const across = side === "top" || side === "bottom" ? target.x - (box.left + box.right) / 2 : target.y - (box.top + box.bottom) / 2;
  return Math.abs(across) < LATCH.length / 2 + 6;
}

/** How many other cavities the straight lane from `target` to the side would run over. */
function blocked(placed: readonly PlacedCavity[], target: PlacedCavity, side: Side): number {
  return placed.filter((other) => {
    if (other.label === target.label) return false;
    const across = side === "top" || side === "bottom" ? Math.abs(other.x - target.x) : Math.abs(other.y - target.y);
    const ahead = { top: target.y - other.y, bottom: other.y - target.y, left: target.x - other.x, right: other.x - target.x }[side];
    return ahead > 0 && across < HOLE + 14;
  }).length;
}

function crowded(a: LeadLane, b: LeadLane): boolean {
  if (a.side !== b.side) return false;
  const upright = a.side === "top" || a.side === "bottom";
  return upright ? Math.abs(a.from.x - b.from.x) < FLAG.width + 8 : Math.abs(a.from.y - b.from.y) < FLAG.height + 8;
}

/**
 * Picks the side each lead comes in from: no lead over another cavity, no two flags on top of each other, the latch kept
 * free where that costs nothing; else red from above and black from below, so that the picture stays still from reading to reading.
 */
export function leadLanes(shape: ConnectorShape, placed: readonly PlacedCavity[], box: Box, leads: { readonly red?: string; readonly black?: string }): LeadLanes {
  const find = (label: string | undefined) => placed.find((c) => c.label === label);
  const red = find(leads.red);
  const black = find(leads.black);
  const single = (target: PlacedCavity, side: Side, home: Side) =>
    blocked(placed, target, side) * 10 + (side === home ? 0 : 1) + (side === "left" || side === "right" ? 2 : 0) + (overLatch(shape, box, target, side) ? 1.5 : 0);
  let best: { cost: number; lanes: LeadLanes } | null = null;
  for (const redSide of red ? SIDES : SIDES.slice(0, 1)) {
    for (const blackSide of black ? SIDES : SIDES.slice(0, 1)) {
      const lanes: LeadLanes = { ...(red && { red: lane(red, box, redSide) }), ...(black && { black: lane(black, box, blackSide) }) };
      const cost = (red ? single(red, redSide, "top") : 0) + (black ? single(black, blackSide, "bottom") : 0)
        + (lanes.red && lanes.black && crowded(lanes.red, lanes.black) ? 8 : 0);
      if (!best || cost < best.cost) best = { cost, lanes };
    }
  }
  return best?.lanes ?? {};
}
