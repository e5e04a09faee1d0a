import { exp, norm } from "../numerics";
import type { CheckSpec } from "../types";
import { GROUND, SIGNAL, type Candidate } from "./candidate";
import { wiperOhms, wiperShare } from "./device-ohms";
import { pulses, type MatedVolts } from "./mated";
import { P } from "./parameters";

/** What optional readings should be: half way of the actuator, and the AC part of a pulsing signal. */
export const HALF = 0.5;
/**
 * Half way is judged by eye, tracks are not quite linear, and part of the travel may be dead: so much of the span from rest to full
 * may be missing, one standard deviation; with a worn track, which may be worn just there, far more (common practice).
 */
const HALF_SLACK = 0.08, WORN_SLACK = 0.5;
const halfSlack = (c: Candidate) => (c.code === "track-worn" ? WORN_SLACK : HALF_SLACK);

/** Chance that a worn track is open just half way (common practice). */
export const WORN_OPEN = 0.1;
export const wornThere = (c: Candidate, red: number, black: number): boolean => c.code === "track-worn" && (red === SIGNAL || black === SIGNAL);

/** Slack of a track's ohms half way, on their logarithm. */
export function halfOhmSlack(c: Candidate, x: Float64Array, red: number, black: number): number {
  if (red !== SIGNAL && black !== SIGNAL) return 0;
  const stands = HALF * (x[P.rest]! + x[P.full]!), share = wiperShare(c, stands), toGround = red === GROUND || black === GROUND;
  const ohms = wiperOhms(c, x, stands) + x[P.track]! * (toGround ? share : 1 - share);
  return halfSlack(c) * x[P.track]! * Math.abs(x[P.full]! - x[P.rest]!) / (ohms + 2);
}

/** Smallest swing at which duty is shown, volts; ripple that is always there on AC, volts. */
const TRIGGER_VOLTS = 0.8, RIPPLE_VOLTS = 0.02;
/** An AC function is good to some percent at the frequencies of pulses (common practice). */
const AC_SHARE = 0.05;
/** A meter that averages shows the mean of the rectified wave times this, the form factor of a sine: pi over twice the root of two. */
const FORM_FACTOR = 1.1107;

/**
 * Volts half way lie midway between those at rest and at full, and duty likewise. AC volts of a pulse train are its rms without the mean,
 * swing times root d(1 - d), on a meter for true rms; one that averages shows 2 d(1 - d) of the swing times the form factor of a
 * sine. The meter's method is not known: the difference of the two is slack.
 */
export function optionalCheck(c: Candidate, x: Float64Array, spec: CheckSpec, index: number, role: number, mated: MatedVolts, out: { readonly value: Float64Array; readonly word: Float64Array; readonly slack: Float64Array }): void {
  const rest = mated.volts[role]!, full = mated.volts[3 + role]!, swing = mated.swing[role]!;
  if (spec.meter === "dc-volts") {
    out.value[index] = HALF * (rest + full);
    out.slack[index] = norm(mated.drop[role]!, halfSlack(c) * Math.abs(full - rest), mated.running < 0.5 ? 0.01 : 0);
    return;
  }
  const low = x[P.rest]!, high = x[P.full]!;
  if (spec.meter === "duty") {
    if (!pulses(c)) { out.word[index] = 1; return; }
    const seen = mated.running / (1 + exp(-(Math.abs(swing) - TRIGGER_VOLTS) / 0.04)), duty = HALF * (low + high);
    out.word[index] = 1 - 0.999 * seen;
    out.value[index] = swing < 0 ? 1 - duty : duty;
    out.slack[index] = HALF_SLACK * Math.abs(high - low);
    return;
  }
  // Only what pulses has a duty; elsewhere the places of its shares hold something else.
  if (!pulses(c)) { out.value[index] = 0; out.slack[index] = RIPPLE_VOLTS; return; }
  const size = Math.abs(swing), root = Math.sqrt(low * (1 - low)), rms = size * root, averaged = 2 * FORM_FACTOR * size * low * (1 - low);
  out.value[index] = rms;
  out.slack[index] = norm(RIPPLE_VOLTS, AC_SHARE * rms, rms - averaged);
}
