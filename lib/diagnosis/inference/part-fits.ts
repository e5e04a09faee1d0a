import type { Candidate } from "../circuit/candidate";
import { harnessParts, inScope, SCOPES } from "../circuit/harness-parts";
import { P, PARAMETER_COUNT } from "../circuit/parameters";
import { GROUP } from "../circuit/predict";
import type { MeterSpec } from "../types";
import { fitCandidate, NO_FIT, together, type Fit } from "./fit";
import { evidenceOf, lossesAt, type Evidence } from "./misfit";
import type { Observation } from "./observe";

const UNPOWERED = GROUP.cold | GROUP.wires, HARNESS = UNPOWERED | GROUP.live;
const MIDDLE = new Float64Array(PARAMETER_COUNT);
/** Track, wiper and positions share the ohms out among them in bent valleys: looked for with little, middling and much in the wiper. */
const TRACK_STARTS = [0, -1.5, 1.5].map((wiper) => { const z = new Float64Array(PARAMETER_COUNT); z[P.wiper] = wiper; return z; });
const ONE_START = [MIDDLE];

/**
 * Readings fitted together, and the fits to them so far, by what of the machine they were made for. Where one reading was left
 * out, `before` is the part with it: fits start where those ended.
 */
interface Part { readonly name: string; readonly evidence: Evidence; readonly fits: Map<string, Fit>; readonly before: Part | null }

/** Fits of parts are kept for so many sets of readings, the ones used last: from one reading of a check to the next most parts stay the same. */
const MOST_KEPT = 192;
const kept = new Map<string, Map<string, Fit>>();

/** The fits made so far to these readings by this meter. They hang on nothing else, so that it does not matter who made them. */
function fitsTo(name: string): Map<string, Fit> {
  const fits = kept.get(name) ?? new Map<string, Fit>();
  kept.delete(name);
  kept.set(name, fits);
  if (kept.size > MOST_KEPT) kept.delete(kept.keys().next().value!);
  return fits;
}

const nameOf = (obs: readonly Observation[], pins: number | undefined, meter: string) => `${obs.map((o) => `${o.index} ${o.word ?? o.value}`).join()}|${pins ?? ""}|${meter}`;

/** What a fit may gain beside, natural-log units, when a reading lets go of the unknowns it held. */
const LET_GO = 6;

const peakOf = (obs: readonly Observation[]) => obs.reduce((sum, o) => sum + (o.word === null ? o.logPeak : 0), 0);

/**
 * Fits of the parts of a machine to the readings that speak of them, each made once and kept. `without` gives the same
 * with one reading left out; joint fits then start where those to all readings ended.
 */
export class PartFits {
  /** No reading on live wires: the parts have no unknown in common, and their sum is the whole. */
  private readonly separate: boolean;
  private readonly device: Part;
  private readonly scopes: readonly (Part | null)[];
  private readonly harness: Part;
  private readonly all: Evidence;
  private readonly live: boolean;
  private readonly mated: boolean;
  private readonly livePeak: number;
  private readonly matedPeak: number;

  private readonly joints = new Map<Candidate, { readonly fit: Fit; losses: Float64Array | null }>();
  /** Log-evidence of the harness's parts, by what they hang on. */
  private readonly unpowered = new Map<string, number>();
  private readonly meterName: string;

  constructor(readonly observations: readonly Observation[], readonly meter: MeterSpec, private readonly whole: { readonly fits: PartFits; readonly left: number } | null = null) {
    const obs = observations;
    this.meterName = JSON.stringify(meter);
    const live = obs.filter((o) => (o.group & GROUP.live) !== 0), mated = obs.filter((o) => o.group === GROUP.mated);
    const before = whole?.fits;
    this.device = this.part((o) => o.group === GROUP.device, before?.device);
    this.scopes = SCOPES.map((scope, i) => {
      const part = this.part((o) => (o.group & UNPOWERED) !== 0 && inScope(o.spec, i), before?.scopes[i], scope.pins);
      return part.evidence.observations.length === 0 ? null : part;
    });
    this.harness = this.part((o) => (o.group & HARNESS) !== 0, before?.harness);
    this.all = evidenceOf(obs, meter);
    this.live = live.length > 0; this.mated = mated.length > 0;
    this.livePeak = peakOf(live); this.matedPeak = peakOf(mated);
    this.separate = !this.live && !this.mated;
  }

  /** The same readings but one, by its place. */
  without(left: number): PartFits {
    return new PartFits(this.observations.filter((_, i) => i !== left), this.meter, { fits: this, left });
  }

  /** The most that a candidate's log-weight can be. */
  bound(c: Candidate): number {
    let unpowered = this.unpowered.get(c.harnessKey);
    if (unpowered === undefined) this.unpowered.set(c.harnessKey, unpowered = this.harnessFits(c).reduce((total, fit) => total + fit.logEvidence, 0));
    const sum = c.logPrior + this.deviceFit(c).logEvidence + unpowered + this.livePeak + this.matedPeak;
    return this.mated && this.whole ? Math.min(sum, c.logPrior + this.whole.fits.ceilingWithout(c, this.whole.left)) : sum;
  }

  /** Fit of one candidate to all readings; given up where its log-weight cannot reach `least`. */
  fit(c: Candidate, least: number): Fit {
    const device = this.deviceFit(c), unpowered = this.harnessFits(c);
    if (this.separate) return together(device, ...unpowered);
    const harness = this.live ? this.harnessFit(c) : together(...unpowered);
    if (!this.mated) return together(device, harness);
    if (c.logPrior + device.logEvidence + harness.logEvidence + this.matedPeak < least) return NO_FIT_AT_ALL;
    return this.joint(c, startOf(device, harness), least - c.logPrior);
  }

  /** Fits of those parts of the harness that something was read of with the power off. */
  private harnessFits(c: Candidate): Fit[] {
    const fits: Fit[] = [];
    for (const { scope, key } of harnessParts(c)) {
      const part = this.scopes[scope];
      if (part) fits.push(fitOf(part, key, c, ONE_START));
    }
    return fits;
  }

  private harnessFit(c: Candidate): Fit {
    // A fit with a reading left out starts from that to all of them, which has to be made from its own start: else what is kept would hang on who asked first.
    if (this.whole) this.whole.fits.harnessFit(c);
    return fitOf(this.harness, c.harnessKey, c, [startOf(...this.harnessFits(c))]);
  }

  private joint(c: Candidate, start: Float64Array, least: number): Fit {
    const before = this.whole?.fits.joints.get(c)?.fit;
    const fit = fitCandidate(c, this.all, before && before.logEvidence > -Infinity ? before.z : start, least);
    if (!this.whole) this.joints.set(c, { fit, losses: null });
    return fit;
  }

  /** What the log-evidence of a candidate may be at most with one reading left out, as far as its fit to all of them tells. */
  private ceilingWithout(c: Candidate, left: number): number {
    const known = this.joints.get(c);
    if (!known) return Infinity;
    const { observations } = this.all, losses = known.losses ??= lossesAt(c, known.fit.z, this.all), peak = observations[left]!.word === null ? observations[left]!.logPeak : 0;
    return known.fit.ceiling - peak + losses[left]! + losses[observations.length]! + LET_GO;
  }

  private deviceFit(c: Candidate): Fit {
    return this.device.evidence.observations.length === 0 ? NO_FIT : fitOf(this.device, c.deviceKey, c, c.family === "potentiometer" ? TRACK_STARTS : ONE_START);
  }

  private part(wanted: (o: Observation) => boolean, before: Part | null | undefined, pins?: number): Part {
    const obs = this.observations.filter(wanted);
    if (before?.evidence.observations.length === obs.length) return before;
    const name = `${nameOf(obs, pins, this.meterName)}${before ? `|${before.name}` : ""}`;
    return { name, evidence: evidenceOf(obs, this.meter, pins), fits: fitsTo(name), before: before ?? null };
  }
}

/** The best fit from any of the starts, made once. */
function fitOf({ evidence, fits, before }: Part, key: string, c: Candidate, starts: readonly Float64Array[]): Fit {
  let fit = fits.get(key);
  if (fit) return fit;
  const from = before ? [fitOf(before, key, c, starts).z] : starts;
  fits.set(key, fit = from.map((start) => fitCandidate(c, evidence, start)).reduce((best, one) => (one.logEvidence > best.logEvidence ? one : best)));
  return fit;
}

const NO_FIT_AT_ALL: Fit = { ...NO_FIT, logEvidence: -Infinity, ceiling: -Infinity };

function startOf(...fits: readonly Fit[]): Float64Array {
  const z = new Float64Array(PARAMETER_COUNT);
  for (const fit of fits) for (const p of fit.active) z[p] = fit.z[p]!;
  return z;
}
