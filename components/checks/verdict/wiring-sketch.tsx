import { useId } from "react";
import { findingHeading, roleOf } from "@/lib/checks/finding-words";
import type { Labels } from "@/lib/checks/check-name";
import type { Fault, PinAssignment, PinNumber } from "@/lib/diagnosis";
import { findingPoint, SKETCH, spread, wireY, type Point } from "./sketch-geometry";
import { ShortEnd, SketchWires } from "./sketch-wires";

const PINS: readonly PinNumber[] = [1, 2, 3];
const TAG = { supply: "+V", ground: "0V", signal: "SIG" } as const;
const SOUND: Fault = { code: "none" };

/** Letters that tie a mark on the drawing to its finding in the list beside it. */
export const markLetter = (index: number): string => String.fromCharCode(97 + index);

function Box({ left, right, title }: { left: number; right: number; title: string }) {
  return (
    <>
      <rect x={left} y={SKETCH.top} width={right - left} height={SKETCH.bottom - SKETCH.top} className="fill-sheet stroke-ink [stroke-width:2]" />
      <text x={(left + right) / 2} y={SKETCH.top - 10} fontSize={16} textAnchor="middle" className="fill-ink font-read font-bold">{title}</text>
    </>
  );
}

/** The two halves of the mated connector; the line between them is where contacts meet. */
function Connector({ labels }: { labels: Labels }) {
  const { left, right } = SKETCH.connector;
  return (
    <>
      <Box left={left} right={right} title="Connector" />
      <path d={`M${SKETCH.gap} ${SKETCH.top}V${SKETCH.bottom}`} className="stroke-ink [stroke-width:2]" strokeDasharray="3 4" />
      {PINS.map((pin) => (
        <text key={pin} x={left + 5} y={wireY(pin) - 11} fontSize={16} className="fill-ink font-mono font-bold">{labels[pin - 1]}</text>
      ))}
    </>
  );
}

function Roles({ pins }: { pins: PinAssignment }) {
  return PINS.map((pin) => (
    <text key={pin} x={SKETCH.device.right - 8} y={wireY(pin) + 6} fontSize={16} textAnchor="end" className="fill-ink font-mono font-bold">{TAG[roleOf(pins, pin)]}</text>
  ));
}

function Mark({ point, letter }: { point: Point; letter: string }) {
  return (
    <g>
      <rect x={-11} y={-11} width={22} height={22} transform={`translate(${point.x} ${point.y}) rotate(45)`} className="fill-straw stroke-ink [stroke-width:2.5]" />
      <text x={point.x} y={point.y + 6} fontSize={17} textAnchor="middle" className="fill-on-straw font-mono font-bold">{letter}</text>
    </g>
  );
}

interface WiringSketchProps {
  readonly labels: Labels;
  /** Only where the pins are settled; without it no roles are drawn. */
  readonly pins: PinAssignment | null;
  /** Findings still possible, best first; at most the first six are marked. */
  readonly findings: readonly Fault[];
  readonly wireColours?: readonly [string | null, string | null, string | null];
}

/**
 * Controller, wires, connector and device in a row, with each open finding marked at its place. With a single
 * finding the drawing also shows what it does to the wire. Server-rendered SVG; the list beside it says the same in words.
 */
export function WiringSketch({ labels, pins, findings, wireColours }: WiringSketchProps) {
  const id = useId();
  const shown = findings.slice(0, 6);
  const only = shown.length === 1 ? shown[0] ?? SOUND : SOUND;
  const points = spread(shown.map((fault) => findingPoint(fault, pins)));
  const words = shown.map((fault, index) => `${markLetter(index)}: ${findingHeading(fault, labels)}`).join("; ");
  return (
    <svg
      role="img" aria-labelledby={`${id}-title`} aria-describedby={`${id}-desc`} viewBox={`0 0 ${SKETCH.width} ${only.code === "short-to-ground" ? SKETCH.height : SKETCH.bottom + 4}`}
      className="block h-auto w-full max-w-xl print:max-w-[11cm]"
    >
      <title id={`${id}-title`}>Wiring from controller to device</title>
      <desc id={`${id}-desc`}>{`Three wires run from the controller through the connector to the device, cavities ${labels.join(", ")}. ${words}.`}</desc>
      <Box left={SKETCH.controller.left} right={SKETCH.controller.right} title="Controller" />
      <Connector labels={labels} />
      <Box left={SKETCH.device.left} right={SKETCH.device.right} title="Device" />
      {pins ? <Roles pins={pins} /> : null}
      <SketchWires fault={only} />
      <ShortEnd fault={only} />
      {PINS.map((pin) => {
        const colour = wireColours?.[pin - 1];
        return colour ? <text key={pin} x={SKETCH.controller.right + 8} y={wireY(pin) + 21} fontSize={16} className="fill-ink font-mono">{colour}</text> : null;
      })}
      {points.map((point, index) => (point ? <Mark key={markLetter(index)} point={point} letter={markLetter(index)} /> : null))}
    </svg>
  );
}
