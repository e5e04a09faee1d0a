import { THERMAL_VOLTS } from "../network/solve";
import { GROUND, SIGNAL, SUPPLY, type Candidate } from "./candidate";
import { P } from "./parameters";
import { ln } from "../numerics";

/** An ohms function: a source behind a resistor as large as the range; the lowest range that holds the reading is shown. */
const SOURCE_VOLTS = 2.5;
const LOWEST_RANGE = 600, RANGES = 6;
/** Emission coefficient of small-signal silicon junctions (common practice: 1.7 to 2). */
export const EMISSION = 1.75;
/** Forward drops are stated at this current, amperes. */
export const DROP_AMPERES = 2e-6;

/**
 * What an autoranging ohms function shows across a resistance in series with diode drops, ohms.
 * `drop` is their sum at 2 microamperes, `junctions` how many there are (each rises 60 mV times its emission coefficient a decade of current).
 */
export function ohmsThroughDiodes(ohms: number, drop: number, junctions: number): number {
  let full = LOWEST_RANGE, k = 0;
  // A drop only adds to what is shown, so a range below the resistance itself never holds it.
  for (; k < RANGES - 1 && full <= ohms; k++) full *= 10;
  for (; k < RANGES; k++, full *= 10) {
    const amperes = currentThrough(full + ohms, drop, junctions);
    const shown = SOURCE_VOLTS / amperes - full;
    if (shown < full || k === RANGES - 1) return shown;
  }
  return Infinity;
}

/** Fixed-point solution of the series loop; the drop moves only with the logarithm of the current. */
function currentThrough(series: number, drop: number, junctions: number): number {
  let amperes = (SOURCE_VOLTS - drop) / series;
  for (let k = 0; k < 4; k++) {
    const volts = drop + junctions * EMISSION * THERMAL_VOLTS * ln(amperes / DROP_AMPERES);
    amperes = Math.max(SOURCE_VOLTS - volts, 0.05) / series;
  }
  return amperes;
}

/** Ohms between two roles of the parted device; `position` is 0 at rest, 0.5 half way, 1 at full travel. Infinity where nothing conducts. */
export function deviceOhms(c: Candidate, x: Float64Array, red: number, black: number, position: number): number {
  return c.family === "potentiometer" ? trackOhms(c, x, red, black, position) : electronicOhms(c, x, red, black);
}

function trackOhms(c: Candidate, x: Float64Array, a: number, b: number, position: number): number {
  const stands = position === 0.5 ? 0.5 * (x[P.rest]! + x[P.full]!) : x[position === 0 ? P.rest : P.full]!, share = wiperShare(c, stands);
  const touches = (role: number) => a === role || b === role;
  if (c.code === "wiper-open" && touches(SIGNAL)) return Infinity;
  if (c.code === "track-open" && touches(c.breakEnd)) return Infinity;
  const track = x[P.track]!;
  if (!touches(SIGNAL)) return track;
  return wiperOhms(c, x, stands) + track * (touches(GROUND) ? share : 1 - share);
}

/** Where a wiper that stands at `stands` touches the part of the track between supply and ground: a share of it. */
export function wiperShare(c: Candidate, stands: number): number {
  return c.tap ? Math.min(1 - 1e-6, Math.max(1e-6, stands)) : stands;
}

/** Ohms between that place and the signal's pin: the wiper's own and, past a tap, the track up to there. */
export function wiperOhms(c: Candidate, x: Float64Array, stands: number): number {
  return x[P.wiper]! + (c.tap ? x[P.track]! * Math.max(0, -stands, stands - 1) : 0);
}

function electronicOhms(c: Candidate, x: Float64Array, red: number, black: number): number {
  const internal = x[P.internal]!, dropIn = x[P.dropSupply]!, dropSig = x[P.dropSignal]!, clamp = x[P.clamp]!;
  if (red === SUPPLY) return black === GROUND ? ohmsThroughDiodes(internal, dropIn, 1) : ohmsThroughDiodes(internal + clamp, dropIn + dropSig, 2);
  if (black === SUPPLY) return Infinity;
  if (red === GROUND) return ohmsThroughDiodes(clamp, dropSig, 1);
  const leak = x[P.leak]!;
  if (c.family === "open-collector") return leak;
  // A driven output also conducts back through its upper switch into the device's internal supply.
  const back = ohmsThroughDiodes(internal, dropSig, 1);
  return leak * back / (leak + back);
}
