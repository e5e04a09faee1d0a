import { matingHalf } from "@/lib/catalogue/connector-shapes";
import type { ConnectorShape } from "@/lib/catalogue/entry-data";
import type { CheckSpec, Terminal } from "@/lib/diagnosis";
import { usesLeads, type Labels } from "./check-words";

/** Which face the technician looks at while placing the leads; null for the battery, and where nothing is touched. */
export interface FaceView {
  /** Laid out as it is seen; null when the connector's shape is not known. */
  readonly shape: ConnectorShape | null;
  readonly caption: string;
}

/** The harness half of a shape: sockets, a plug; the device carries its mating half. */
function half(shape: ConnectorShape, gender: ConnectorShape["gender"]): ConnectorShape {
  return shape.gender === gender ? shape : matingHalf(shape);
}

/**
 * The face for a check. A back-probed plug is seen from the wire side, where left and right change places:
 * that is how its mating half lies, so the mating half's layout is drawn with the plug's own sockets.
 */
export function faceView(spec: CheckSpec, shape: ConnectorShape | undefined): FaceView | null {
  if (spec.place === "battery" || spec.place === "colour" || spec.place === "controller") return null;
  const words = {
    device: "device, mating side", harness: "harness, mating side", loose: "harness, mating side", wire: "harness, mating side",
    contact: "harness, mating side", mated: "harness, wire side",
  } as const;
  const caption = words[spec.place];
  if (!shape) return { shape: null, caption: "not drawn to shape" };
  if (spec.place === "device") return { shape: half(shape, "receptacle"), caption };
  const plug = half(shape, "plug");
  return spec.place === "mated" ? { shape: { ...matingHalf(plug), gender: "plug" }, caption } : { shape: plug, caption };
}

/** A lead on the face's cavity, or at a place that is not on the face. */
export interface LeadPlace { readonly cavity: string | null; readonly away: string | null }

/** Where a lead goes with respect to the face; null where no lead is used (a grip test, a look). */
export function leadPlaces(spec: CheckSpec, labels: Labels): { readonly red: LeadPlace; readonly black: LeadPlace } | null {
  if (!usesLeads(spec)) return null;
  const place = (end: Terminal): LeadPlace => {
    if (end === "gnd") return { cavity: null, away: "battery negative" };
    if (end === "battery") return { cavity: null, away: "battery positive" };
    return { cavity: labels[end - 1] ?? null, away: null };
  };
  const red = spec.place === "wire" ? { cavity: null, away: "controller end" } : place(spec.red);
  return { red, black: place(spec.black) };
}
