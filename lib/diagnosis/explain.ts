import { beliefs } from "./assess";
import { ALL_CHECKS, parseCheck } from "./checks";
import { faultId, type Candidate } from "./circuit/candidate";
import { CHECK_INDEX } from "./circuit/predict";
import { PARAMETER_COUNT } from "./circuit/parameters";
import { candidatesForEntry, candidatesForUnknown } from "./inference/candidates";
import { rankChecks } from "./inference/choose";
import { evidenceOf, fitCandidate } from "./inference/fit";
import { observe, unscale } from "./inference/observe";
import { outlookOf, type Outlook } from "./inference/outlook";
import { believe, type Believed } from "./inference/posterior";
import { marginals } from "./inference/standing";
import { DEFAULT_METER, meterLimit } from "./meter";
import type { EvidenceRow, Fault, NextCheck, Prediction, Reading, ReadingEffect, Setup, SymbolValue } from "./types";
import { whyText } from "./words";

/** Chances are compared no closer to nothing than this: beyond it the model itself is not that good. */
const LEAST_CHANCE = 1e-6;
const NINETY_FIVE = 1.96;
const START = new Float64Array(PARAMETER_COUNT);

/**
 * How each reading moved the chances: belief with all readings over belief with this one left out. A factor above 1
 * speaks for, below 1 against; the order in which readings were taken does not matter.
 */
export function effects(setup: Setup, readings: readonly Reading[]): ReadingEffect[] {
  const all = marginals(beliefs(setup, readings));
  return readings.map(([check, value], i) => {
    const others = marginals(beliefs(setup, readings.filter((_, k) => k !== i)));
    const kindWithout = new Map(others.kinds.map((k) => [k.kind, k.p])), faultWithout = new Map(others.faults.map((f) => [faultId(f), f.p]));
    const seen = new Map([...others.faults, ...all.faults].map(({ code, pins }) => [faultId({ code, pins }), pins ? { code, pins } : { code }]));
    const faultWith = new Map(all.faults.map((f) => [faultId(f), f.p]));
    return {
      check, value,
      kinds: all.kinds.map(({ kind, p }) => ({ kind, factor: ratio(p, kindWithout.get(kind)) })),
      faults: [...seen].filter(([id]) => Math.max(faultWith.get(id) ?? 0, faultWithout.get(id) ?? 0) >= 0.01).map(([id, fault]) => ({ fault, factor: ratio(faultWith.get(id), faultWithout.get(id)) })),
    };
  });
}

const ratio = (a = 0, b = 0) => Math.max(a, LEAST_CHANCE) / Math.max(b, LEAST_CHANCE);

/** The candidate that stands for a finding: of the likeliest kind and pins that can have it, in its best-fitting build. */
function standIn(setup: Setup, readings: readonly Reading[], fault: Fault): Candidate | null {
  const meter = setup.meter ?? DEFAULT_METER, observations = observe(readings, meter), id = faultId(fault);
  const top = beliefs(setup, readings)[0]!.candidate;
  const alike = (c: Candidate) => c.hypothesis.kind === top.hypothesis.kind && `${c.pinOf}` === `${top.pinOf}`;
  const having = (pool: readonly Candidate[]) => pool.filter((c) => faultId(c.hypothesis.fault) === id);
  const byEntry = setup.expect ? having(candidatesForEntry(setup.expect, setup.experience)).filter(alike) : [];
  const any = having(candidatesForUnknown(setup.experience)), near = any.filter(alike);
  const list = byEntry.length > 0 ? byEntry : near.length > 0 ? near : any;
  return list.length === 0 ? null : believe(list, observations, meter)[0]!.candidate;
}

function outlookWithout(candidate: Candidate, setup: Setup, readings: readonly Reading[]): Outlook {
  const meter = setup.meter ?? DEFAULT_METER;
  const fit = fitCandidate(candidate, evidenceOf(observe(readings, meter), meter), START);
  const believed: Believed = { candidate, fit, logWeight: fit.logEvidence, p: 1 };
  return outlookOf(believed, meter);
}

function predictionOf(outlook: Outlook, check: string): Prediction {
  const index = CHECK_INDEX.get(check)!, spec = ALL_CHECKS[index]!, word = outlook.word[index]!, jumps = outlook.jumps[index]!;
  if (spec.meter === "watch") return { check, number: null, words: likely([["still", word], ["jumps", jumps], ["smooth", 1 - word - jumps]]) };
  if (spec.meter === "grip") return { check, number: null, words: likely([["loose", word], ["grips", 1 - word]]) };
  const words = spec.words.length > 0 ? likely([[spec.words[0]!, word]]) : [];
  if (word > 0.5) return { check, number: null, words };
  const mean = outlook.mean[index]!, reach = NINETY_FIVE * outlook.sd[index]!;
  return { check, words, number: { low: unscale(spec, mean - reach), middle: unscale(spec, mean), high: unscale(spec, mean + reach) } };
}

const likely = (list: readonly (readonly [SymbolValue, number])[]) => list.filter(([, p]) => p >= 0.02).map(([word, p]) => ({ word, p })).sort((a, b) => b.p - a.p);

/**
 * What a check should read if a finding were true, given the other readings (that check's own reading left out).
 * Returns null for an unknown check or a finding that this device cannot have.
 */
export function predict(setup: Setup, readings: readonly Reading[], fault: Fault, check: string): Prediction | null {
  const candidate = parseCheck(check) && standIn(setup, readings, fault);
  return candidate ? predictionOf(outlookWithout(candidate, setup, readings.filter(([c]) => c !== check)), check) : null;
}

/** The evidence table: each reading beside what it should have been if all were sound, and if the finding is true. */
export function evidence(setup: Setup, readings: readonly Reading[], fault: Fault): EvidenceRow[] {
  const sound = standIn(setup, readings, { code: "none" }), found = standIn(setup, readings, fault), meter = setup.meter ?? DEFAULT_METER;
  if (!sound || !found) return [];
  return readings.map(([check, value], i) => {
    const others = readings.filter((_, k) => k !== i), spec = parseCheck(check)!;
    return {
      check, value, ifSound: predictionOf(outlookWithout(sound, setup, others), check), ifFinding: predictionOf(outlookWithout(found, setup, others), check),
      limit: typeof value === "number" ? meterLimit(spec, value, meter) : null,
    };
  });
}

/** Least information, bits, for a check to be named as one that tells findings apart. */
const TELLS = 0.05;

/** Checks not yet taken that would tell the given findings apart, best first; empty when nothing a meter can do will. */
export function tellApart(setup: Setup, readings: readonly Reading[], faults: readonly Fault[]): NextCheck[] {
  const ids = new Set(faults.map(faultId)), kept = beliefs(setup, readings).filter((b) => ids.has(faultId(b.candidate.hypothesis.fault)));
  const sums = new Map<string, number>();
  for (const b of kept) { const id = faultId(b.candidate.hypothesis.fault); sums.set(id, (sums.get(id) ?? 0) + b.p); }
  const even = kept.map((b) => ({ ...b, p: b.p / sums.get(faultId(b.candidate.hypothesis.fault))! / sums.size })).sort((a, b) => b.p - a.p);
  return rankChecks(setup, readings, even, setup.meter ?? DEFAULT_METER).filter((r) => r.gainBits >= TELLS)
    .map((r) => ({ check: r.test, why: whyText(parseCheck(r.test)!, setup.pins), gainBits: r.gainBits, effort: r.effort }));
}
