import type { CheckSpec } from "@/lib/diagnosis";
import type { RunSetup } from "@/lib/checks/run";
import { checkPlace, leadWords, measuredWords, meterWords, stateWords, type Labels } from "@/lib/checks/check-words";
import { LeadTag, type LeadColour } from "./lead-tag";
import { MiniFace } from "./mini-face";
import { ScreenHeading } from "./screen-heading";

function LeadLine({ colour, to }: { readonly colour: LeadColour; readonly to: string }) {
  return (
    <p className="flex items-center gap-2 text-lg leading-tight">
      <LeadTag colour={colour} />
      <span><span className="sr-only">{colour} lead on </span><strong className="text-copper">{to}</strong></span>
    </p>
  );
}

const POSITIONS = { rest: "at rest", half: "half way", full: "at full travel" } as const;

function positionTitle(spec: CheckSpec): string {
  if (spec.place === "colour") return "Wire colour";
  if (spec.place === "controller") return "Fault message";
  if (spec.meter === "watch") return "Sweep, rest to full";
  if (spec.position === null) return measuredWords(spec);
  return `${measuredWords(spec)}, ${POSITIONS[spec.position]}`;
}

/** What the hands do, where it is more than touching two places. */
function handWords(spec: CheckSpec): string | null {
  if (spec.meter === "watch") return "Move the actuator slowly from rest to full and watch the reading. Nobody near what moves.";
  if (spec.meter === "grip") return "Push a matching test terminal in and pull it out: feel whether the contact grips. Never force a probe tip in.";
  if (spec.place === "colour") return "The main colour of the wire on the device's side. A weak hint.";
  if (spec.place === "controller") return "The number after FMI on the controller's display or tester. A weak hint.";
  if (spec.position === "half") return "Hold half way, as near as you can judge. Nobody near what moves.";
  if (spec.position === "full") return "Hold at full travel. Nobody near what moves.";
  if (spec.place === "mated") return "Probe in from behind, along the wire. Never pierce insulation.";
  return null;
}

/** The machine's state in a line or two beside the face; the screen before said it in full. */
function briefState(spec: CheckSpec): string {
  return stateWords(spec.state).map((words) => words.replace(" connector ", " ")).join(" \u00b7 ");
}

/** Leads, meter and state beside the connector's face. */
function Leads({ spec, setup }: { readonly spec: CheckSpec; readonly setup: RunSetup }) {
  const labels: Labels = setup.cavityLabels, leads = leadWords(spec, labels), meter = meterWords(spec);
  return (
    <div className="flex items-start justify-between gap-3">
      <div className="grid min-w-0 gap-1.5">
        {leads ? (
          <>
            <LeadLine colour="red" to={leads.red} />
            <LeadLine colour="black" to={leads.black} />
          </>
        ) : <p className="text-lg leading-tight">Test terminal into <strong className="text-copper">harness contact {typeof spec.red === "number" ? labels[spec.red - 1] : ""}</strong></p>}
        <p className="leading-tight">Meter: <strong className="font-mono">{meter.dial}</strong> <span className="text-quiet">{meter.range}</span></p>
        <p className="leading-tight text-quiet first-letter:uppercase">{briefState(spec)}</p>
      </div>
      <MiniFace spec={spec} shape={setup.connector} labels={labels} />
    </div>
  );
}

/** Where each lead goes, what the meter is set to and what state the machine is in, in words and on the connector's face. */
export function LeadCard({ spec, setup }: { readonly spec: CheckSpec; readonly setup: RunSetup }) {
  const labels: Labels = setup.cavityLabels;
  const hands = handWords(spec);
  return (
    <section data-check={spec.code} className="grid gap-1.5">
      <ScreenHeading screen={spec.code}>{positionTitle(spec)}</ScreenHeading>
      {spec.meter === "look" ? <p className="text-lg leading-tight text-copper first-letter:uppercase"><strong>{checkPlace(spec, labels)}</strong></p> : <Leads spec={spec} setup={setup} />}
      {hands ? <p className="bg-straw px-2 py-1 leading-tight text-on-straw"><span aria-hidden="true">▲ </span>{hands}</p> : null}
    </section>
  );
}
