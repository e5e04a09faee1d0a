import { parseCheck } from "./checks";
import { faultId } from "./circuit/candidate";
import type { Believed } from "./inference/posterior";
import { exp, ln } from "./numerics";
import type { Fault, FaultCode, PinAssignment, Reading, Role, WireColour } from "./types";

/**
 * Weak evidence that no circuit explains: colours of wires and the controller's own fault message. Each multiplies a chance by a
 * bounded factor; all of them together by at most MOST, up or down. They never end a check by themselves.
 */
const MOST = 3, FITS_COLOUR = 1.6, FITS_MESSAGE = 2;

/** Which role a colour mostly goes with; the colours of signals differ too much to tell (common practice; letters of IEC 60757). */
const COLOUR_OF: Readonly<Partial<Record<WireColour, Role>>> = { BK: "ground", BN: "ground", RD: "supply", OG: "supply", WH: "signal", GN: "signal", YE: "signal" };

const OPENS: readonly FaultCode[] = ["wire-open", "contact-open", "wiper-open", "track-open", "supply-missing", "output-dead"];
const SHORTS: readonly FaultCode[] = ["short-to-ground", "short-to-battery", "wires-shorted", "output-stuck-high", "output-stuck-low"];
/** Out of range, high or low: an open input stands at its pull, so that open and short get the same (check of the trade: 3 and 4 never tell one from the other). */
const OUT_OF_RANGE: readonly FaultCode[] = [...OPENS, ...SHORTS, "pull-missing", "wires-swapped"];
const ERRATIC: readonly FaultCode[] = ["track-worn", "wire-resistive", "contact-open", "connector-damp"];

/** Findings that a failure mode indicator goes with. Source: SAE J1939-73 for its meaning, common practice for the findings. */
const MESSAGE_OF: Readonly<Record<number, readonly FaultCode[]>> = {
  2: ERRATIC, 3: OUT_OF_RANGE, 4: OUT_OF_RANGE, 5: OPENS, 6: SHORTS, 8: [...OUT_OF_RANGE, "wire-resistive"], 10: ERRATIC,
  12: ["wiper-open", "track-open", "track-worn", "output-dead", "output-stuck-high", "output-stuck-low"],
};

function colourFactor(word: WireColour, pin: number, pins: PinAssignment): number {
  const role = COLOUR_OF[word];
  return role === undefined ? 1 : pins[role] === pin ? FITS_COLOUR : 1 / FITS_COLOUR;
}

const messageFactor = (message: number, { code }: Fault) => (MESSAGE_OF[message]?.includes(code) ? FITS_MESSAGE : 1);

/** Factor, from 1 / MOST to MOST, of all such readings on the chance of pins and a finding. */
export function hintFactor(readings: readonly Reading[], pins: PinAssignment, fault: Fault): number {
  let factor = 1;
  for (const [check, value] of readings) {
    const spec = parseCheck(check);
    if (spec?.place === "colour") factor *= colourFactor(value as WireColour, spec.red as number, pins);
    else if (spec?.place === "controller") factor *= messageFactor(Number(String(value).slice(4)), fault);
  }
  return Math.min(MOST, Math.max(1 / MOST, factor));
}

/** The belief with such readings counted in; the same list where there are none. */
export function hinted(believed: readonly Believed[], readings: readonly Reading[]): Believed[] {
  if (!readings.some(([check]) => isHint(check))) return [...believed];
  const known = new Map<string, number>();
  const list = believed.map((b) => {
    const { pins, fault } = b.candidate.hypothesis, id = `${b.candidate.pinOf}/${faultId(fault)}`, log = known.get(id) ?? ln(hintFactor(readings, pins, fault));
    known.set(id, log);
    return { ...b, logWeight: b.logWeight + log, p: b.p * exp(log) };
  });
  const total = list.reduce((sum, b) => sum + b.p, 0);
  return list.map((b) => ({ ...b, p: b.p / total })).sort((a, b) => b.logWeight - a.logWeight || (a.candidate.hypothesis.id < b.candidate.hypothesis.id ? -1 : 1));
}

/** Whether a check is looked at rather than measured. */
export const isHint = (check: string): boolean => parseCheck(check)?.meter === "look";
