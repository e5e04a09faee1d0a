"use client";

import { Handle, Position, ReactFlow, type NodeProps } from "@xyflow/react";
import "@xyflow/react/dist/base.css";
import { COLUMNS, drawingHeight, PART_WIDTH, wiringEdges, wiringNodes, type MeterNode, type PartNode, type PostNode, type WiringFacts } from "./wiring-graph";

/** Handles only anchor the lines: nothing here is dragged or connected. */
const HIDDEN = { opacity: 0, pointerEvents: "none", minWidth: 1, minHeight: 1, width: 1, height: 1 } as const;

function PinBox({ pin, i }: { readonly pin: PartNode["data"]["pins"][number]; readonly i: number }) {
  return (
    <span className={`absolute grid h-10 min-w-10 -translate-x-1/2 place-items-center border-2 px-1 font-mono text-lg font-bold ${pin.marked ? "border-4 border-copper bg-straw text-on-straw" : "border-ink bg-sheet"}`} style={{ left: COLUMNS[i] }}>
      {pin.marked ? `\u25b2${pin.label}` : pin.label}
      <Handle id={`top-${i + 1}`} type="target" position={Position.Top} style={HIDDEN} />
      <Handle id={`bottom-${i + 1}`} type={"source"} position={Position.Bottom} style={HIDDEN} />
      <Handle id={`bottom-${i + 1}`} type={"target"} position={Position.Bottom} style={HIDDEN} />
    </span>
  );
}

function Part({ data }: NodeProps<PartNode>) {
  const body = data.title !== "";
  return (
    <div style={{ width: PART_WIDTH }} className="relative font-read text-base text-ink">
      {data.pins.length > 0 ? <div className="relative h-10">{data.pins.map((pin, i) => <PinBox key={pin.label} pin={pin} i={i} />)}</div> : null}
      {body ? (
        <div className={`border-2 px-3 py-2 ${data.marked ? "border-4 border-copper bg-straw text-on-straw" : "border-ink bg-sheet"}`}>
          {data.pins.length > 0 ? (
            <div className="relative h-7 font-mono font-bold">{data.pins.map((pin, i) => <span key={pin.label} className="absolute -translate-x-1/2" style={{ left: (COLUMNS[i] ?? 0) - 14 }}>{pin.tag ?? "?"}</span>)}</div>
          ) : null}
          <strong>{data.marked ? "\u25b2 " : ""}{data.title}</strong>
        </div>
      ) : null}
    </div>
  );
}

function Post({ data }: NodeProps<PostNode>) {
  return (
    <div className="border-2 border-ink bg-sheet px-2 py-1 font-read text-base whitespace-nowrap text-ink">
      {data.label}
      <Handle id="top" type="target" position={Position.Top} style={HIDDEN} />
      <Handle id="bottom" type="target" position={Position.Bottom} style={HIDDEN} />
    </div>
  );
}

function Meter({ data }: NodeProps<MeterNode>) {
  return (
    <div className="flex h-18 w-24 items-stretch border-4 border-ink bg-sheet text-ink">
      <span className="grid w-7 grid-rows-2 text-center font-read text-base leading-8 font-bold">
        <span className="bg-stop text-on-stop">R</span>
        <span className="bg-black text-white">B</span>
      </span>
      <span className="m-auto font-mono text-lg leading-tight font-bold">{data.dial}</span>
      <Handle id="red" type="source" position={Position.Left} style={{ ...HIDDEN, top: "25%" }} />
      <Handle id="black" type="source" position={Position.Left} style={{ ...HIDDEN, top: "75%" }} />
      <Handle id="red-bottom" type="source" position={Position.Top} style={HIDDEN} />
      <Handle id="black-top" type="source" position={Position.Bottom} style={HIDDEN} />
    </div>
  );
}

const NODE_TYPES = { part: Part, post: Post, meter: Meter };

/** The wiring as it is now: a picture only, so that neither the keyboard nor a thumb is caught in it. */
export default function WiringDrawing({ facts, description }: { readonly facts: WiringFacts; readonly description: string }) {
  const height = drawingHeight(facts.state);
  return (
    <div role="img" aria-label={description} style={{ height }} className="w-full">
      <div aria-hidden="true" className="h-full">
        <ReactFlow
          key={`${facts.spec?.code ?? ""} ${height}`} nodes={wiringNodes(facts)} edges={wiringEdges(facts)} nodeTypes={NODE_TYPES} fitView fitViewOptions={{ padding: 0.02, maxZoom: 1.15 }}
          minZoom={0.5} nodesDraggable={false} nodesConnectable={false} nodesFocusable={false} edgesFocusable={false} elementsSelectable={false} disableKeyboardA11y
          panOnDrag={false} panOnScroll={false} zoomOnScroll={false} zoomOnPinch={false} zoomOnDoubleClick={false} preventScrolling={false} proOptions={{ hideAttribution: true }}
        />
      </div>
    </div>
  );
}
