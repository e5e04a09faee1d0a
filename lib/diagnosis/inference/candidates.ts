import { DAMP_PLACES, FAMILIES, FAULT_PLACES, GROUND, makeCandidate, PERMUTATIONS, SIGNAL, SUPPLY, type Candidate, type FaultPlace, type Running } from "../circuit/candidate";
import type { Family, Pull, Tap } from "../circuit/parameters";
import { chancesBefore, ENTRY_IS_RIGHT, FAMILY_SHARE, PULL_SHARE, TAPPED_SHARE } from "../priors";
import { KINDS, type Expect, type Experience, type Kind, type PinAssignment } from "../types";
import { ln } from "../numerics";

const PULLS: readonly Pull[] = ["down", "up", "up-to-supply"];

type Chances = ReturnType<typeof chancesBefore>;

/** Log-weights of findings against all usual ones of the family; the places of one finding share its weight. */
function faultLogWeights(family: Family, { findings }: Chances, places: readonly FaultPlace[]): readonly { place: FaultPlace; log: number }[] {
  const count = (code: string) => places.filter((p) => p.code === code).length;
  const total = [...new Set(FAULT_PLACES[family].map((p) => p.code))].reduce((sum, code) => sum + findings[code], 0);
  return places.map((place) => ({ place, log: ln(findings[place.code] / count(place.code) / total) }));
}

/** What the builds of one device have in common; `base` is the log-chance of the device before its findings. */
interface Builds { readonly kind: Kind; readonly family: Family; readonly pins: PinAssignment; readonly base: number; readonly chances: Chances; readonly expect?: Expect; readonly tap?: Tap; readonly places?: readonly FaultPlace[] }

function buildsOf({ kind, family, pins, base, chances, expect, tap, places }: Builds): Candidate[] {
  return faultLogWeights(family, chances, places ?? FAULT_PLACES[family]).flatMap(({ place, log }) => {
    const ends = place.code === "track-open" ? ([0, 1] as const) : ([0] as const);
    const states = runningStates(family, place);
    return pullsFor(family, place).flatMap((pull) => ends.flatMap((breakEnd) => states.map((running) => makeCandidate({
      family, kind, pins, place, pull, breakEnd, running, expect, tap,
      logPrior: base + log + ln(pullShare(family, pull, place)) - ln(ends.length * states.length),
    }))));
  });
}

/**
 * Without a supply of its own a device stands still. With a supply or ground that is weak, or a ground that it finds
 * only by way of the signal's wire, its electronics may or may not have enough to run on.
 */
function runningStates(family: Family, { code, at, at2 }: FaultPlace): readonly Running[] {
  if (family === "potentiometer") return ["by-volts"];
  switch (code) {
    case "supply-missing": return ["no"];
    case "wires-shorted": return at === SUPPLY ? ["yes", "no"] : ["by-volts"];
    case "wires-swapped": return at === SUPPLY || at2 === SUPPLY ? ["no"] : ["yes", "no"];
    case "wire-open": case "contact-open": return at === SUPPLY ? ["no"] : at === GROUND ? ["yes", "no"] : ["by-volts"];
    case "wire-resistive": return at === SIGNAL ? ["by-volts"] : ["yes", "no"];
    case "short-to-ground": return at === SUPPLY ? ["yes", "no"] : ["by-volts"];
    case "short-to-battery": return at === GROUND ? ["yes", "no"] : ["by-volts"];
    default: return ["by-volts"];
  }
}

/** With its pull gone an input is the same whichever way it was held. */
function pullsFor(family: Family, place: FaultPlace): readonly Pull[] {
  if (place.code === "pull-missing") return ["down"];
  return PULLS.filter((pull) => PULL_SHARE[family][pull] > 0);
}

const pullShare = (family: Family, pull: Pull, place: FaultPlace) => (place.code === "pull-missing" ? 1 : PULL_SHARE[family][pull]);

/** The list made last, with what it was made for: making it takes longer than using it, and a check asks for the same one again and again. */
function remembered<Key>(make: (key: Key) => readonly Candidate[]): (key: Key) => readonly Candidate[] {
  let last: { name: string; list: readonly Candidate[] } | null = null;
  return (key) => {
    const name = JSON.stringify(key) ?? "";
    if (last?.name !== name) last = { name, list: make(key) };
    return last.list;
  };
}

function ofUnknown(experience: Experience | undefined, places?: readonly FaultPlace[]): Candidate[] {
  const chances = chancesBefore(experience);
  return KINDS.flatMap((kind) => PERMUTATIONS.flatMap((pins) => FAMILIES[kind].flatMap((family) =>
    buildsOf({ kind, family, pins, base: ln(chances.kinds[kind] * FAMILY_SHARE[family] / PERMUTATIONS.length), chances, places }))));
}

/** Every usual way an unknown three-wire device may be built. */
export const candidatesForUnknown = remembered((experience: Experience | undefined): readonly Candidate[] => ofUnknown(experience));

const TAPS: readonly Tap[] = ([0, 1] as const).flatMap((role) => ([0, 1] as const).map((position) => ({ role, position })));

const tapped = remembered((experience: Experience | undefined): readonly Candidate[] => {
  const chances = chancesBefore(experience), base = ln(chances.kinds.potentiometer * TAPPED_SHARE / PERMUTATIONS.length / TAPS.length);
  return PERMUTATIONS.flatMap((pins) => TAPS.flatMap((tap) => buildsOf({ kind: "potentiometer", family: "potentiometer", pins, base, chances, tap })));
});

interface Entry { readonly expect: Expect; readonly experience?: Experience; readonly places?: readonly FaultPlace[] }

function ofEntry({ expect, experience, places }: Entry): Candidate[] {
  const families = FAMILIES[expect.kind].filter((f) => !expect.output || f === expect.output);
  const total = families.reduce((sum, f) => sum + FAMILY_SHARE[f], 0);
  return families.flatMap((family) => buildsOf({ kind: expect.kind, family, pins: expect.pins, base: ln(FAMILY_SHARE[family] / total), chances: chancesBefore(experience), expect, places }));
}

const forEntry = remembered((entry: Entry): readonly Candidate[] => ofEntry(entry));

/** Every usual way the device of a catalogue entry may be built and wired, taking the entry at its word. */
export function candidatesForEntry(expect: Expect, experience?: Experience): readonly Candidate[] {
  return forEntry({ expect, experience });
}

/** What is known beforehand. */
type Known = { readonly expect?: Expect; readonly experience?: Experience };

const shifted = (list: readonly Candidate[], share: number) => list.map((c) => ({ ...c, logPrior: c.logPrior + ln(share) }));

const forDoubtedEntry = remembered(({ expect, experience }: Entry): readonly Candidate[] =>
  [...shifted(candidatesForEntry(expect, experience), ENTRY_IS_RIGHT), ...shifted(candidatesForUnknown(experience), 1 - ENTRY_IS_RIGHT)]);

/** Every way a machine may be built where the readings do not fit what the entry says: the entry's device, or any other in its place. */
export function candidatesForDoubtedEntry(expect: Expect, experience?: Experience): readonly Candidate[] {
  return forDoubtedEntry({ expect, experience });
}

/** The same devices on a damp connector: looked at before a verdict, and where the usual builds do not explain the readings. */
export const candidatesDamp = ({ expect, experience }: Known): readonly Candidate[] => damp({ expect, experience });

const damp = remembered(({ expect, experience }: Known): readonly Candidate[] => (expect ? ofEntry({ expect, experience, places: DAMP_PLACES }) : ofUnknown(experience, DAMP_PLACES)));

const tappedInstead = remembered((experience: Experience | undefined) => shifted(tapped(experience), 1 - ENTRY_IS_RIGHT));

/**
 * A rare build, looked at only where none of the usual ones explains the readings: a potentiometer with a tap. An entry speaks of no tap:
 * where there is one, another device is fitted.
 */
export const candidatesTapped = ({ expect, experience }: Known): readonly Candidate[] => (expect ? tappedInstead(experience) : tapped(experience));

/** Every way an unknown device may be built, the rare ones too. */
export const everyCandidateForUnknown = (experience?: Experience): readonly Candidate[] => [...candidatesForUnknown(experience), ...candidatesDamp({ experience })];

/** Every way an entry's device may be built and wired, a damp connector too. */
export const everyCandidateForEntry = (expect: Expect, experience?: Experience): readonly Candidate[] => [...candidatesForEntry(expect, experience), ...candidatesDamp({ expect, experience })];
