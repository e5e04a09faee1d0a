import type { Cavity, ConnectorShape, Keying } from "./entry-data";

type Family = Omit<ConnectorShape, "gender">;

const cavity = (label: string, row: number, column: number): Cavity => ({ label, row, column });

/** Each family as the plug's mating side shows it; the receptacle is its mirror image. */
const FAMILIES: readonly Family[] = [
  {
    id: "inline-3", name: "Three in line", outline: "rectangle", latch: "top",
    cavities: [cavity("1", 0, 0), cavity("2", 0, 1), cavity("3", 0, 2)],
    keying: [{ side: "bottom", at: 0.25, width: 0.3, type: "rib" }, { side: "bottom", at: 0.7, width: 0.5, type: "rib" }],
  },
  {
    id: "inline-3-letters", name: "Three in line, lettered", outline: "rounded", latch: "bottom",
    cavities: [cavity("A", 0, 0), cavity("B", 0, 1), cavity("C", 0, 2)],
    keying: [{ side: "top", at: 0.3, width: 0.25, type: "slot" }, { side: "right", at: 0.5, width: 0.3, type: "slot" }],
  },
  {
    id: "triangle-3", name: "Triangle of three", outline: "triangle", latch: "bottom",
    cavities: [cavity("1", 0, 0.5), cavity("2", 1, 0), cavity("3", 1, 1)],
    keying: [{ side: "top", at: 0.5, width: 0.35, type: "rib" }],
  },
  {
    id: "stagger-2-1", name: "Two and one, staggered", outline: "rectangle", latch: "top",
    cavities: [cavity("1", 0, 0), cavity("2", 0, 1), cavity("3", 1, 0.5)],
    keying: [{ side: "left", at: 0.35, width: 0.3, type: "slot" }, { side: "bottom", at: 0.5, width: 0.4, type: "rib" }],
  },
  {
    id: "round-3", name: "Round, three", outline: "round", latch: "none",
    cavities: [cavity("A", 0, 0.58), cavity("B", 1, 1.16), cavity("C", 1, 0)],
    keying: [{ side: "top", at: 0.5, width: 0.4, type: "slot" }, { side: "bottom", at: 0.85, width: 0.25, type: "slot" }],
  },
  {
    id: "round-3-of-4", name: "Round, three of four", outline: "round", latch: "none",
    cavities: [cavity("1", 0, 0), cavity("2", 0, 1), cavity("3", 1, 1), cavity("4", 1, 0)],
    keying: [{ side: "top", at: 0.5, width: 0.45, type: "rib" }],
  },
  {
    id: "dropped-3", name: "Three, middle one lower", outline: "rounded", latch: "top",
    cavities: [cavity("A", 0, 0), cavity("B", 0.5, 1), cavity("C", 0, 2)],
    keying: [{ side: "bottom", at: 0.2, width: 0.3, type: "rib" }, { side: "bottom", at: 0.8, width: 0.3, type: "rib" }],
  },
  {
    id: "column-3", name: "Three in a column", outline: "rectangle", latch: "right",
    cavities: [cavity("1", 0, 0), cavity("2", 1, 0), cavity("3", 2, 0)],
    keying: [{ side: "left", at: 0.2, width: 0.3, type: "rib" }],
  },
  {
    id: "inline-4", name: "Four in line, three used", outline: "rectangle", latch: "bottom",
    cavities: [cavity("1", 0, 0), cavity("2", 0, 1), cavity("3", 0, 2), cavity("4", 0, 3)],
    keying: [{ side: "top", at: 0.15, width: 0.3, type: "slot" }, { side: "top", at: 0.85, width: 0.3, type: "slot" }],
  },
];

const MIRRORED = { top: "top", bottom: "bottom", left: "right", right: "left", none: "none" } as const;

function mirrorKeying(key: Keying): Keying {
  const across = key.side === "top" || key.side === "bottom";
  return { ...key, side: MIRRORED[key.side], at: across ? 1 - key.at : key.at, type: key.type === "rib" ? "slot" : "rib" };
}

/** The mating half of a face: left and right change places, a rib meets a slot. */
export function matingHalf(shape: ConnectorShape): ConnectorShape {
  const columns = shape.cavities.map((c) => c.column);
  const turn = Math.min(...columns) + Math.max(...columns);
  const gender = shape.gender === "plug" ? "receptacle" : "plug";
  return {
    ...shape,
    id: shape.id.replace(/-(plug|receptacle)$/, `-${gender}`),
    gender,
    cavities: shape.cavities.map((c) => ({ ...c, column: turn - c.column })),
    keying: shape.keying.map(mirrorKeying),
    latch: MIRRORED[shape.latch],
  };
}

const plugs: readonly ConnectorShape[] = FAMILIES.map((family) => ({ ...family, id: `${family.id}-plug`, gender: "plug" }));

/** Generic faces to pick from: every family as plug and as receptacle, ids such as "inline-3-plug". */
export const CONNECTOR_SHAPES: readonly ConnectorShape[] = plugs.flatMap((plug) => [plug, matingHalf(plug)]);

/** The shape of that id ("triangle-3-receptacle"), or null. */
export function connectorShape(id: string): ConnectorShape | null {
  return CONNECTOR_SHAPES.find((shape) => shape.id === id) ?? null;
}
