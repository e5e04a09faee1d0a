import type { Edge, Node } from "@xyflow/react";
import type { CheckSpec, Fault, MachineState, PinNumber, Role, Terminal } from "@/lib/diagnosis";
import { usesLeads, type Labels } from "@/lib/checks/check-words";

/** Columns of the three wires and rows of the parts, in drawing units (CSS pixels at natural size). */
export const COLUMNS = [48, 120, 192] as const;
export const PART_WIDTH = 240;
const GAP = 46;
const ROW = { controller: 0, plug: 44, harness: 186, device: 226 } as const;
const METER_X = 262;

export interface WiringFacts {
  readonly spec: CheckSpec | null;
  readonly labels: Labels;
  readonly colours: readonly [string | null, string | null, string | null] | null;
  readonly state: MachineState;
  /** Roles believed likely enough to be shown, by pin; null where not. */
  readonly roles: readonly [Role | null, Role | null, Role | null];
  /** A finding believed likely enough to be shown. */
  readonly finding: Fault | null;
  readonly deviceName: string;
}

export interface PartData extends Record<string, unknown> {
  readonly title: string;
  /** Boxes with a handle each; empty for a part without cavities. */
  readonly pins: readonly { readonly label: string; readonly tag: string | null; readonly marked: boolean }[];
  readonly marked: boolean;
  readonly below: boolean;
}
export type PartNode = Node<PartData, "part">;
export type PostNode = Node<{ readonly label: string }, "post">;
export type MeterNode = Node<{ readonly dial: string }, "meter">;

const TAGS: Readonly<Record<Role, string>> = { supply: "+V", ground: "0V", signal: "SIG" };
const WIRE_FAULTS: readonly Fault["code"][] = ["wire-open", "wire-resistive", "short-to-ground", "short-to-battery", "wires-shorted", "wires-swapped"];
const DEVICE_FAULTS: readonly Fault["code"][] = ["wiper-open", "track-open", "track-worn", "output-dead", "output-stuck-high", "output-stuck-low"];

const at = (finding: Fault | null, codes: readonly Fault["code"][], pin: number): boolean =>
  finding !== null && codes.includes(finding.code) && (finding.pins ?? []).some((p) => p === pin);

function rows(state: MachineState) {
  const controllerGap = state.controllerParted ? GAP : 0;
  const deviceGap = state.deviceParted ? GAP : 0;
  return { controller: ROW.controller, plug: ROW.plug + controllerGap, harness: ROW.harness + controllerGap, device: ROW.device + controllerGap + deviceGap };
}

/** Height of the drawing at natural size, CSS pixels. */
export function drawingHeight(state: MachineState): number {
  return rows(state).device + 130;
}

function part(id: string, y: number, data: PartData): PartNode {
  return { id, type: "part", position: { x: 0, y }, data };
}

/** The parts of the drawing: controller, its plug, the harness connector, the device, the battery's posts and the meter. */
export function wiringNodes({ spec, labels, state, roles, finding, deviceName }: WiringFacts): (PartNode | PostNode | MeterNode)[] {
  const y = rows(state);
  const pins = (marks: readonly Fault["code"][], tags: boolean): PartData["pins"] =>
    labels.map((label, i) => ({ label, tag: tags && roles[i] ? TAGS[roles[i]] : null, marked: at(finding, marks, i + 1) }));
  const controllerMarked = finding?.code === "supply-missing" || finding?.code === "pull-missing";
  const middle = (y.plug + y.device) / 2;
  return [
    part("controller", y.controller, { title: "Controller", pins: [], marked: controllerMarked, below: true }),
    part("plug", y.plug, { title: "", pins: pins([], false), marked: false, below: true }),
    part("harness", y.harness, { title: "", pins: pins(["contact-open", "connector-damp"], false), marked: false, below: false }),
    part("device", y.device, { title: deviceName, pins: pins([], true), marked: finding !== null && DEVICE_FAULTS.includes(finding.code), below: false }),
    { id: "positive", type: "post", position: { x: METER_X, y: 0 }, data: { label: "battery +" } },
    { id: "negative", type: "post", position: { x: METER_X, y: y.device + 48 }, data: { label: "battery \u2212" } },
    ...(spec && usesLeads(spec) ? [{ id: "meter", type: "meter", position: { x: METER_X, y: middle - 36 }, data: { dial: DIALS[spec.meter] } } satisfies MeterNode] : []),
  ];
}

const DIALS: Readonly<Record<CheckSpec["meter"], string>> = { ohms: "\u03a9", "dc-volts": "V DC", hertz: "Hz", duty: "%", watch: "V DC", "ac-volts": "V AC", grip: "", look: "" };

/** Which box of which part a lead touches. */
function touched(spec: CheckSpec, end: Terminal, lead: "red" | "black"): { readonly node: string; readonly handle: string } {
  if (end === "gnd") return { node: "negative", handle: "top" };
  if (end === "battery") return { node: "positive", handle: "bottom" };
  if (spec.place === "device") return { node: "device", handle: `top-${end}` };
  if (spec.place === "wire" && lead === "red") return { node: "plug", handle: `top-${end}` };
  return { node: "harness", handle: spec.place === "mated" ? `top-${end}` : `bottom-${end}` };
}

function leadEdges(spec: CheckSpec | null): Edge[] {
  if (!spec || !usesLeads(spec)) return [];
  return (["red", "black"] as const).map((lead) => {
    const to = touched(spec, spec[lead], lead);
    return {
      id: `lead-${lead}`, source: "meter", sourceHandle: typeof spec[lead] === "number" ? lead : `${lead}-${to.handle}`, target: to.node, targetHandle: to.handle, type: typeof spec[lead] === "number" ? "default" : "straight", zIndex: 10,
      style: { stroke: lead === "red" ? "var(--stop)" : "var(--ink)", strokeWidth: 4, strokeDasharray: lead === "red" ? undefined : "10 3" },
    };
  });
}

/** Three wires and, while a reading is taken, the meter's two leads. A believed fault of a wire is drawn on it. */
export function wiringEdges({ spec, labels, colours, finding }: WiringFacts): Edge[] {
  const wires: Edge[] = ([1, 2, 3] as const satisfies readonly PinNumber[]).map((pin) => {
    const marked = at(finding, WIRE_FAULTS, pin);
    const open = marked && finding?.code === "wire-open";
    const name = colours?.[pin - 1] ?? `wire ${labels[pin - 1]}`;
    return {
      id: `wire-${pin}`, source: "plug", sourceHandle: `bottom-${pin}`, target: "harness", targetHandle: `top-${pin}`, type: "straight",
      label: marked ? `\u25b2 ${name}` : name,
      labelStyle: { fill: marked ? "var(--on-straw)" : "var(--ink)", fontSize: 16, fontWeight: marked ? 700 : 400, fontFamily: "inherit" },
      labelBgStyle: { fill: marked ? "var(--straw)" : "var(--paper)" }, labelBgPadding: [3, 2],
      style: { stroke: marked ? "var(--copper)" : "var(--ink)", strokeWidth: marked ? 6 : 3, strokeDasharray: open ? "8 8" : undefined },
    };
  });
  return [...wires, ...leadEdges(spec)];
}
