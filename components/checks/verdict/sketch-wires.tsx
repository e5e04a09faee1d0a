import type { Fault, PinNumber } from "@/lib/diagnosis";
import { SKETCH, wireY } from "./sketch-geometry";

const { controller, connector, device, rail, top } = SKETCH;
const FROM = controller.right;
const TO = connector.left;
const MID = (FROM + TO) / 2;
const PINS: readonly PinNumber[] = [1, 2, 3];

/** One wire between controller and connector as it would be with the finding: whole, parted, or with a bad joint. */
function wirePath(pin: PinNumber, fault: Fault): string {
  const y = wireY(pin);
  const here = fault.pins?.includes(pin) ?? false;
  if (here && fault.code === "wire-open") return `M${FROM} ${y}H${MID - 24}m0 -5v10M${MID + 24} ${y}m0 -5v10M${MID + 24} ${y}H${TO}`;
  if (here && fault.code === "wire-resistive") {
    return `M${FROM} ${y}H${MID - 40}l5 -8l10 16l10 -16l5 8M${MID + 10} ${y}l5 -8l10 16l10 -16l5 8H${TO}M${MID - 10} ${y}H${MID + 10}`;
  }
  const other = fault.code === "wires-swapped" && here ? fault.pins?.find((p) => p !== pin) : undefined;
  return other === undefined ? `M${FROM} ${y}H${TO}` : `M${FROM} ${wireY(other)}H${FROM + 14}L${TO - 14} ${y}H${TO}`;
}

/** The contact of one cavity: two halves that meet, or do not. */
function contactPath(pin: PinNumber, fault: Fault): string {
  const y = wireY(pin);
  const parted = fault.code === "contact-open" && (fault.pins?.includes(pin) ?? false);
  return parted ? `M${TO} ${y}H${SKETCH.gap - 22}m0 -5v10M${SKETCH.gap + 22} ${y}m0 -5v10M${SKETCH.gap + 22} ${y}H${device.left}` : `M${TO} ${y}H${device.left}`;
}

function Ground({ x, y }: { x: number; y: number }) {
  return <path d={`M${x - 12} ${y}H${x + 12}M${x - 8} ${y + 5}H${x + 8}M${x - 4} ${y + 10}H${x + 4}`} />;
}

/** The path that ought not to be there: from a wire to ground, to battery, or to another wire. */
function Short({ fault }: { fault: Fault }) {
  const [first, second] = fault.pins ?? [];
  if (first === undefined) return null;
  const x = MID + 30;
  if (fault.code === "short-to-ground") return <><path d={`M${x} ${wireY(first)}V${rail}`} strokeDasharray="7 5" /><Ground x={x} y={rail} /></>;
  if (fault.code === "short-to-battery") return <path d={`M${x} ${wireY(first)}V${top - 10}M${x - 6} ${top - 4}L${x} ${top - 14}L${x + 6} ${top - 4}`} strokeDasharray="7 5" />;
  if (fault.code === "wires-shorted" && second !== undefined) return <path d={`M${MID} ${wireY(first)}V${wireY(second)}`} strokeDasharray="7 5" />;
  if (fault.code === "connector-damp" && second !== undefined) return <path d={`M${SKETCH.gap} ${wireY(first)}V${wireY(second)}`} strokeDasharray="2 6" />;
  return null;
}

/** Wires, contacts and what the finding does to them. */
export function SketchWires({ fault }: { fault: Fault }) {
  return (
    <g className="fill-none stroke-ink [stroke-width:3]" strokeLinejoin="round">
      {PINS.map((pin) => <path key={pin} d={`${wirePath(pin, fault)}${contactPath(pin, fault)}`} />)}
      <g className="stroke-stop"><Short fault={fault} /></g>
    </g>
  );
}

/** What the short leads to, in words beside its end. */
export function ShortEnd({ fault }: { fault: Fault }) {
  const words = { "short-to-ground": ["battery negative", rail + 12], "short-to-battery": ["battery positive", top - 14] } as const;
  const [text, y] = fault.code === "short-to-ground" || fault.code === "short-to-battery" ? words[fault.code] : ["", 0];
  return text === "" ? null : <text x={MID + 46} y={y} fontSize={16} className="fill-ink font-read">{text}</text>;
}
