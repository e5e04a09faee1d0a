import { ALL_CHECKS } from "../checks";
import type { Candidate } from "../circuit/candidate";
import { CHECK_INDEX } from "../circuit/predict";
import { SLIP } from "../priors";
import type { CheckSpec } from "../types";
import { scale, type Observation } from "./observe";
import { outlookOf, type Outlook } from "./outlook";
import type { PartFits } from "./part-fits";
import { believeWith, type Believed } from "./posterior";
import { exp, ln, square } from "../numerics";

/**
 * One reading of a check may be wrong: mistyped by a power of ten, a sign lost, taken on another pin, or wrong in some other
 * way. Each such case is weighed beside "all are right": the belief without that reading, times the chance of what was
 * entered in its place (Bayes' rule over who erred; one slip a check, since two are rare and cannot be told from anything).
 */
export interface Weighed {
  readonly believed: Believed[];
  /** The same where slips were WARINESS times likelier: a verdict has to hold against that too. */
  readonly wary: readonly Believed[];
  /** Chance that an observation is a slip, in the order of the observations, 0..1. */
  readonly slips: readonly number[];
}

/** Candidates looked into when a slip is weighed are at most so far behind the best without the reading, natural-log units: 2 in 100 of it. */
const LOOKED_INTO = 4;
/** A slip less likely than this against all else is left out. */
const NEGLIGIBLE = 1e-5;
/** A verdict has to hold even if slips are so many times likelier than they usually are: somebody in a hurry, in gloves, in the rain. */
const WARINESS = 10;
/** Width of what may be shown at all on the comparison scale: natural logarithm of ohms and hertz, volts, duty. */
const WIDTH: Readonly<Record<CheckSpec["unit"], number>> = { ohm: 20, volt: 60, hertz: 12, ratio: 1, word: 1 };
/** Chance of a word when any may have been entered. */
const ANY_WORD = 0.3;
const LOG_ROOT_TWO_PI = 0.5 * ln(2 * Math.PI);

/** Weighs the base belief against one reading being wrong; `candidates` are looked through without that one. */
export function weighSlips(candidates: readonly Candidate[], fits: PartFits, base: readonly Believed[]): Weighed {
  const { observations: obs, meter } = fits;
  const entries: Entry[] = base.map((b) => ({ believed: b, logWeight: b.logWeight, from: -1 }));
  const best = base[0]!.logWeight;
  obs.forEach((o, i) => {
    for (const b of believeWith(fits.without(i), candidates, { cut: LOOKED_INTO })) {
      const logWeight = b.logWeight + ln(slipChance(o, outlookOf(b, meter, o.spec.optional)));
      if (logWeight >= best + ln(NEGLIGIBLE)) entries.push({ believed: b, logWeight, from: i });
    }
  });
  return { ...weighedAs(entries, obs.length, 1), wary: weighedAs(entries, obs.length, WARINESS).believed };
}

/** A candidate, all readings taken as right (from -1) or the one at that place taken as a slip. */
interface Entry { readonly believed: Believed; readonly logWeight: number; readonly from: number }

/** Shares of belief where slips are so many times likelier than they are held to be. */
function weighedAs(entries: readonly Entry[], count: number, times: number): { believed: Believed[]; slips: readonly number[] } {
  const weights = entries.map(({ logWeight, from }) => logWeight + (from < 0 ? 0 : ln(times))), most = weights.reduce((a, b) => Math.max(a, b), -Infinity);
  const slips = new Array<number>(count).fill(0), total = weights.reduce((sum, w) => sum + exp(w - most), 0);
  const believed = entries.map(({ believed: b, from }, k): Believed => {
    const p = exp(weights[k]! - most) / total;
    if (from >= 0) slips[from]! += p;
    return { ...b, logWeight: weights[k]!, p };
  });
  return { slips, believed: believed.sort((a, b) => b.logWeight - a.logWeight || (a.candidate.hypothesis.id < b.candidate.hypothesis.id ? -1 : 1)) };
}

/** Chance (density on the comparison scale for numbers) that a slip enters what was entered, where `outlook` is the truth. */
function slipChance(o: Observation, outlook: Outlook): number {
  const others = besides(o.spec), near = others.reduce((sum, index) => sum + shownAt(o, index, outlook), 0) / Math.max(1, others.length);
  if (o.word !== null) return SLIP.other * ANY_WORD + SLIP.pin * near;
  return SLIP.other / WIDTH[o.spec.unit] + SLIP.pin * near + SLIP.decimal * decimals(o, outlook) + SLIP.sign * signLost(o, outlook);
}

/** Chance or density of what was entered if it was read at another check. */
function shownAt(o: Observation, index: number, outlook: Outlook): number {
  const word = outlook.word[index]!;
  if (o.word === null) return (1 - word) * density(o.scaled, outlook.mean[index]!, outlook.sd[index]!);
  return o.word === "jumps" ? outlook.jumps[index]! : o.word === "smooth" || o.word === "grips" ? 1 - word - outlook.jumps[index]! : word;
}

const POWERS = [10, 0.1, 1000, 0.001] as const;

function decimals(o: Observation, outlook: Outlook): number {
  const { mean, sd, word } = outlook, shown = 1 - word[o.index]!, value = o.value;
  if (o.spec.unit === "ratio" || shown < 0.01) return 0;
  const steep = (power: number) => (o.spec.unit === "volt" ? power : 1);
  return POWERS.reduce((sum, power) => sum + shown * steep(power) * density(scale(o.spec, value * power), mean[o.index]!, sd[o.index]!), 0) / POWERS.length;
}

const signLost = (o: Observation, outlook: Outlook) => (o.spec.unit === "volt" ? density(-o.scaled, outlook.mean[o.index]!, outlook.sd[o.index]!) : 0);

function density(at: number, mean: number, sd: number): number {
  return sd > 0 ? exp(-0.5 * square((at - mean) / sd) - LOG_ROOT_TWO_PI) / sd : 0;
}

const cache = new Map<string, readonly number[]>();

/** Checks a lead may have been put to by mistake: the same quantity and place, at other pins. */
function besides(spec: CheckSpec): readonly number[] {
  let list = cache.get(spec.code);
  if (!list) cache.set(spec.code, list = ALL_CHECKS.filter((c) => c !== spec && c.place === spec.place && c.meter === spec.meter && c.position === spec.position && (c.black === "gnd") === (spec.black === "gnd")).map((c) => CHECK_INDEX.get(c.code)!));
  return list;
}
