import type { Fault, PinAssignment, PinNumber } from "@/lib/diagnosis";

/** Drawing units are CSS pixels at a phone's width; the whole drawing scales up on a desk. */
export const SKETCH = {
  width: 358, height: 268,
  controller: { left: 4, right: 88 }, connector: { left: 196, right: 254 }, device: { left: 282, right: 354 },
  top: 34, bottom: 218,
  /** Heights of the wires of pins 1, 2 and 3. */
  wires: [72, 126, 180], rail: 250, gap: 225,
} as const;

export interface Point { readonly x: number; readonly y: number }

export const wireY = (pin: PinNumber): number => SKETCH.wires[pin - 1] ?? SKETCH.wires[0];

/** Middle of the free run of a wire between controller and connector. */
const MIDDLE = (SKETCH.controller.right + SKETCH.connector.left) / 2;
const DEVICE_X = SKETCH.device.left + 8;

function middleOf(pins: readonly PinNumber[]): number {
  const ys = pins.map(wireY);
  return ys.length === 0 ? wireY(2) : ys.reduce((sum, y) => sum + y, 0) / ys.length;
}

/**
 * Where a finding sits on the drawing. A finding without pins of its own is placed by the pins' roles where
 * these are known, else at the middle of the part it belongs to.
 */
export function findingPoint(fault: Fault, pins: PinAssignment | null): Point | null {
  const places = fault.pins ?? [];
  const signal = pins ? wireY(pins.signal) : wireY(2);
  const at = middleOf(places);
  switch (fault.code) {
    case "none": return null;
    case "wire-open": case "wire-resistive": case "short-to-ground": case "short-to-battery": return { x: MIDDLE, y: at };
    case "wires-shorted": case "wires-swapped": return { x: MIDDLE, y: at };
    case "contact-open": case "connector-damp": return { x: SKETCH.gap, y: at };
    case "supply-missing": return { x: SKETCH.controller.right, y: places.length > 0 ? at : pins ? wireY(pins.supply) : wireY(2) };
    case "pull-missing": return { x: SKETCH.controller.right, y: places.length > 0 ? at : signal };
    case "wiper-open": case "track-open": case "track-worn": case "output-dead": case "output-stuck-high": case "output-stuck-low":
      return { x: DEVICE_X, y: places.length > 0 ? at : signal };
  }
}

/** Least distance of two marks, along the wires and across them. */
const MARK_PITCH = 36;

/** Along the wire in the harness, up and down in the device: a mark stays within the part that it belongs to. */
function places(point: Point): readonly Point[] {
  const steps = [0, 1, -1, 2, -2, 3, -3].map((step) => step * MARK_PITCH);
  return point.x >= SKETCH.device.left ? steps.map((dy) => ({ x: point.x, y: point.y - dy })) : steps.map((dx) => ({ x: point.x + dx, y: point.y }));
}

const apart = (a: Point, b: Point): boolean => Math.abs(a.x - b.x) >= MARK_PITCH || Math.abs(a.y - b.y) >= MARK_PITCH;

/** Marks that would cover each other are moved apart, the first one staying where it is. */
export function spread(points: readonly (Point | null)[]): readonly (Point | null)[] {
  const placed: Point[] = [];
  return points.map((point) => {
    if (!point) return null;
    const free = places(point).find((place) => placed.every((other) => apart(place, other))) ?? point;
    placed.push(free);
    return free;
  });
}
