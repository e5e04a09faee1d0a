export type LeadColour = "red" | "black";

const LOOK = {
  red: { letter: "R", fill: "fill-stop stroke-stop", text: "fill-on-stop", points: "0,13 7,0 21,0 28,13 21,26 7,26" },
  black: { letter: "B", fill: "fill-black stroke-white", text: "fill-white", points: "0,0 21,0 28,7 28,26 0,26" },
} as const;

/** The mark of a meter lead inside a drawing: red pointed at both ends, black a cut tag, each with its letter. 28 by 26 units. */
export function LeadMark({ colour, x, y }: { readonly colour: LeadColour; readonly x: number; readonly y: number }) {
  const look = LOOK[colour];
  return (
    <g transform={`translate(${x} ${y})`}>
      <polygon points={look.points} className={look.fill} strokeWidth={1.5} />
      <text x={14} y={19} textAnchor="middle" fontSize={16} fontWeight={700} className={`font-read ${look.text}`}>{look.letter}</text>
    </g>
  );
}

/** The same mark in a line of text. */
export function LeadTag({ colour }: { readonly colour: LeadColour }) {
  return (
    <svg aria-hidden="true" viewBox="-1 -1 30 28" width={30} height={28} className="shrink-0">
      <LeadMark colour={colour} x={0} y={0} />
    </svg>
  );
}
