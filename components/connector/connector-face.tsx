import { useId } from "react";
import type { ConnectorShape } from "@/lib/catalogue/entry-data";
import type { Role } from "@/lib/diagnosis";
import { type Box, FLAG, faceBox, LATCH, type LeadLanes, leadLanes, type PlacedCavity, placeCavities, type Side } from "./face-geometry";
import { CavityMark, KeyingMark, Latch, Lead, LeadFlag, Outline } from "./face-parts";
import { ROLE_TAG } from "./role-tag";

export interface FacePin { readonly cavity: string; readonly role?: Role; readonly tag?: string }

/** Cavity labels the leads touch, or in words a place that is not on the face ("battery negative"). */
export interface FaceLeads { readonly red?: string; readonly black?: string; readonly redAway?: string; readonly blackAway?: string }

export interface ConnectorFaceProps {
  shape: ConnectorShape;
  /** The three pins in use; when given, every other cavity is drawn as unused. */
  pins?: readonly FacePin[];
  leads?: FaceLeads;
  /** Cavity labels to mark, beside those a lead touches. */
  highlight?: readonly string[];
  /** Greatest width in CSS pixels; natural size when absent. Never wider than its container. */
  size?: number;
  /** Id of an element that names the drawing better than its own title. */
  labelledBy?: string;
}

function leadWords(leads: FaceLeads): string[] {
  const one = (name: string, cavity?: string, away?: string) => (cavity ? [`${name} lead on cavity ${cavity}`] : away ? [`${name} lead on ${away}`] : []);
  return [...one("Red", leads.red, leads.redAway), ...one("Black", leads.black, leads.blackAway)];
}

/** The drawing in words, for those who do not see it. */
export function describeFace({ shape, pins = [], leads = {}, highlight = [] }: ConnectorFaceProps): string {
  const cavities = shape.cavities.map((c) => {
    const pin = pins.find((p) => p.cavity === c.label);
    const tag = pin?.tag ?? (pin?.role && ROLE_TAG[pin.role]);
    return `${c.label}${tag ? ` ${tag}` : pins.length > 0 && !pin ? " unused" : ""}`;
  });
  const latch = shape.latch === "none" ? "No latch" : `Latch at the ${shape.latch}`;
  const marked = highlight.length > 0 ? [`Marked: ${highlight.join(", ")}`] : [];
  return [`Cavities ${cavities.join(", ")}`, latch, ...leadWords(leads), ...marked].join(". ") + ".";
}

function viewBox(shape: ConnectorShape, box: Box, lanes: LeadLanes, away: readonly string[]): Box {
  const used = new Set([lanes.red?.side, lanes.black?.side]);
  const free = (side: Side) => (shape.latch === side ? LATCH.depth + 4 : 14);
  const upright = (side: Side) => (used.has(side) ? FLAG.gap + FLAG.height + 4 : free(side));
  const sideways = (side: Side) => (used.has(side) ? FLAG.gap + FLAG.width + 4 : free(side));
  const flagOver = (side: Side) => (lanes.red?.side === side ? lanes.red : lanes.black?.side === side ? lanes.black : undefined);
  const overhang = [flagOver("top"), flagOver("bottom")].flatMap((lane) => (lane ? [lane.from.x] : []));
  const left = Math.min(box.left - sideways("left"), ...overhang.map((x) => x - FLAG.width / 2 - 2));
  const right = Math.max(box.right + sideways("right"), ...overhang.map((x) => x + FLAG.width / 2 + 2));
  const wanted = Math.max(0, ...away.map((text) => FLAG.width + 24 + text.length * 9));
  const grow = Math.max(0, wanted - (right - left)) / 2;
  return {
    left: left - grow, right: right + grow, top: box.top - upright("top"),
    bottom: box.bottom + upright("bottom") + away.length * (FLAG.height + 10),
  };
}

function AwayLeads({ leads, view }: { leads: FaceLeads; view: Box }) {
  const rows = ([["red", leads.red ? undefined : leads.redAway], ["black", leads.black ? undefined : leads.blackAway]] as const).filter(([, text]) => text);
  return rows.map(([colour, text], i) => {
    const y = view.bottom - (rows.length - i) * (FLAG.height + 10) + 8;
    return (
      <g key={colour}>
        <LeadFlag colour={colour} x={view.left + 4} y={y} />
        <text x={view.left + FLAG.width + 14} y={y + 23} fontSize={17} className="fill-ink font-read">{text}</text>
      </g>
    );
  });
}

type CavitiesProps = ConnectorFaceProps & { placed: readonly PlacedCavity[]; lanes: LeadLanes };

function Cavities({ shape, pins, leads = {}, highlight = [], placed, lanes }: CavitiesProps) {
  const touched = new Set([leads.red, leads.black, ...highlight]);
  const fromBelow = (label: string) => (["red", "black"] as const).some((c) => leads[c] === label && lanes[c]?.side === "bottom");
  return placed.map((cavity) => {
    const pin = pins?.find((p) => p.cavity === cavity.label);
    return (
      <CavityMark
        key={cavity.label} cavity={cavity} gender={shape.gender} used={!pins || Boolean(pin)} marked={touched.has(cavity.label)}
        tag={pin?.tag ?? (pin?.role && ROLE_TAG[pin.role])} tagAside={fromBelow(cavity.label)}
      />
    );
  });
}

/**
 * A connector's face, drawn from its data as seen from the mating side: cavities with labels and pin tags, keying, latch,
 * and where the red and the black lead go. Pure SVG, no script; text is 16 px or more at natural size.
 */
export function ConnectorFace(props: ConnectorFaceProps) {
  const { shape, leads = {}, size, labelledBy } = props;
  const id = useId();
  const placed = placeCavities(shape);
  const box = faceBox(shape, placed);
  const lanes = leadLanes(shape, placed, box, leads);
  const away = [leads.red ? undefined : leads.redAway, leads.black ? undefined : leads.blackAway].filter((text) => text !== undefined);
  const view = viewBox(shape, box, lanes, away);
  const width = view.right - view.left;
  return (
    <figure className="m-0">
      <svg
        role="img" aria-labelledby={labelledBy ?? `${id}-title`} aria-describedby={`${id}-desc`} width={size ?? width}
        viewBox={`${view.left} ${view.top} ${width} ${view.bottom - view.top}`} className="mx-auto block h-auto max-w-full print:max-w-[9cm]"
      >
        <title id={`${id}-title`}>{`${shape.name}, ${shape.gender}, seen from the mating side`}</title>
        <desc id={`${id}-desc`}>{describeFace(props)}</desc>
        <Latch shape={shape} box={box} />
        <Outline shape={shape} box={box} className="fill-sheet stroke-ink [stroke-width:4]" />
        {shape.gender === "receptacle" && <Outline shape={shape} box={box} inset={9} className="fill-none stroke-ink [stroke-width:2]" />}
        {shape.keying.map((mark) => <KeyingMark key={`${mark.side}${mark.at}`} shape={shape} box={box} mark={mark} />)}
        <Cavities {...props} placed={placed} lanes={lanes} />
        {lanes.black && <Lead colour="black" lane={lanes.black} />}
        {lanes.red && <Lead colour="red" lane={lanes.red} />}
        <AwayLeads leads={leads} view={view} />
      </svg>
      <figcaption className="mt-2 text-center text-base">
        {shape.name}, {shape.gender}. <strong>Seen from the mating side;</strong> from the wire side, left and right change places.
      </figcaption>
    </figure>
  );
}
