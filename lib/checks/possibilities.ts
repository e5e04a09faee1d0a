import { faultId, type Fault, type FaultChance, type KindChance, type Possibility, type TellingCheck } from "@/lib/diagnosis";
import { SETTLES } from "./carrying-words";
import type { Labels } from "./check-name";
import { findingClause, findingHeading, KIND_WORDS, kindTitle } from "./finding-words";

/** Below this chance a possibility is not offered for comparison, unless it is "sound". */
const OFFERED = 0.005;
const MOST_FINDINGS = 8;

/** Something that may be true of the machine, to choose from a list. The id is stable and fit for an address; the clause goes after "if". */
export interface PossibilityChoice { readonly id: string; readonly label: string; readonly clause: string; readonly possibility: Possibility }

interface Standing { readonly faults: readonly FaultChance[]; readonly kinds: readonly KindChance[] }

const bare = ({ code, pins }: Fault): Fault => (pins ? { code, pins } : { code });

/** The findings still possible, likeliest first; "sound" and the likeliest are always among them. */
export function possibleFindings({ faults }: Pick<Standing, "faults">): readonly Fault[] {
  const shown = faults.filter((fault, index) => index === 0 || fault.p >= OFFERED).slice(0, MOST_FINDINGS).map(bare);
  return shown.some(({ code }) => code === "none") ? shown : [...shown, { code: "none" }];
}

/** What may be told apart: the findings still possible and, where more than one is left, the kinds of device. */
export function possibilityChoices(standing: Standing, labels: Labels): readonly PossibilityChoice[] {
  const kinds = standing.kinds.filter(({ p }) => p >= OFFERED);
  return [
    ...possibleFindings(standing).map((fault) => ({ id: faultId(fault), label: findingHeading(fault, labels), clause: findingClause(fault, labels, null), possibility: { fault } })),
    ...(kinds.length > 1 ? kinds.map(({ kind }) => ({ id: `kind:${kind}`, label: kindTitle(kind), clause: `it is ${KIND_WORDS[kind]}`, possibility: { kind } })) : []),
  ];
}

/** The two of the list that were asked for, in that order; null unless they are two different ones of it. */
export function chosenPair(choices: readonly PossibilityChoice[], ids: readonly (string | undefined)[]): readonly [PossibilityChoice, PossibilityChoice] | null {
  const [one, other] = ids.map((id) => choices.find((choice) => choice.id === id));
  return one && other && one !== other ? [one, other] : null;
}

/** More than this many checks are no answer to a plain question. */
const MOST_TOLD = 4;

/** The checks to name: those that would settle it, in the order of the least effort; only where there are none, those that would help. */
export function plainAnswer(checks: readonly TellingCheck[]): readonly TellingCheck[] {
  const settling = checks.filter(({ gainBits }) => gainBits >= SETTLES);
  return (settling.length > 0 ? settling : checks).slice(0, MOST_TOLD);
}
