import { faultText, type FaultChance, type KindChance, type PinsChance, type Standing } from "@/lib/diagnosis";
import { checkName, type Labels } from "./check-name";
import { findingClause, KIND_WORDS } from "./finding-words";

/** From this chance on a thing is said without a hedge; the same share that the open findings hold. */
export const SURE = 0.95;
/** From this chance on, up to SURE, it is "most likely". Below it nothing is asserted. */
export const LIKELY = 0.6;

/** A standing, and whether no reading with a meter would tell the kinds apart that it leaves open. */
export interface Told extends Standing { readonly kindsInseparable: boolean }

/** The fewest kinds that together hold SURE of the chance, likeliest first. */
export function openKinds(kinds: readonly KindChance[]): readonly KindChance[] {
  let held = 0;
  return kinds.filter(({ p }) => { const wanted = held < SURE && p > 0; held += p; return wanted; });
}

/** Is one kind likely enough to be named? */
export function kindNamed(kinds: readonly KindChance[]): boolean {
  const [best] = kinds;
  return best !== undefined && (best.p >= LIKELY || openKinds(kinds).length < 2);
}

function kindPart([best]: readonly KindChance[]): string {
  if (!best) return "The kind of device is not settled";
  return `${best.p >= SURE ? "It is" : "Most likely it is"} ${KIND_WORDS[best.kind]}`;
}

function pinsPart(pins: readonly PinsChance[], labels: Labels): string {
  const best = pins[0];
  if (!best || best.p < LIKELY) return ", its pins not settled";
  const list = `supply on ${labels[best.supply - 1]}, ground on ${labels[best.ground - 1]} and signal on ${labels[best.signal - 1]}`;
  return best.p >= SURE ? ` with ${list}` : `, most likely with ${list}`;
}

/** "the device, with supply on A …, is either a PWM device or an analogue voltage device": where no kind can be named. */
function eitherKind({ kinds, pins }: Told, labels: Labels): string {
  const words = openKinds(kinds).map(({ kind }) => KIND_WORDS[kind]);
  return `the device, ${pinsPart(pins, labels).replace(/^,? /, "")}, is either ${words.slice(0, -1).join(", ")} or ${words.at(-1) ?? ""}`;
}

/** The assignment that may be named as fact, or null while another one is still open. */
export function settledPins(pins: readonly PinsChance[]): PinsChance | null {
  const best = pins[0];
  return best && best.p >= SURE ? best : null;
}

function joined(clauses: readonly string[]): string {
  const shown = clauses.slice(0, 3);
  const more = clauses.length - shown.length;
  const last = shown.length > 1 ? `${shown.slice(0, -1).join(", or ")}, or ${shown.at(-1)}` : (shown[0] ?? "");
  return more > 0 ? `${last}, or one of ${more} more` : last;
}

const capital = (text: string): string => `${text.charAt(0).toUpperCase()}${text.slice(1)}`;

const isSettled = (open: readonly FaultChance[]): boolean => open.length === 1 && (open[0]?.p ?? 0) >= SURE;

const settledWords = (fault: FaultChance, clause: (f: FaultChance) => string): string =>
  fault.code === "none" ? "every reading fits a sound device and sound wiring" : clause(fault);

function findingPart(open: readonly FaultChance[], inseparable: boolean, clause: (f: FaultChance) => string): string {
  const [best, second] = open;
  if (!best) return "and what is wrong, if anything, is not settled";
  if (isSettled(open)) return `and ${settledWords(best, clause)}`;
  if (inseparable) return `and either ${joined(open.map(clause))}: no reading with a meter tells these apart`;
  if (best.p >= LIKELY && second) return `and most likely ${clause(best)}, though it is still possible that ${clause(second)}`;
  if (best.p >= LIKELY) return `and most likely ${clause(best)}`;
  return `and it cannot be told yet whether ${joined(open.map(clause))}`;
}

/** Where the finding is known and the kind is not: the finding first, for that is what has to be mended. */
function findingFirst(told: Told, labels: Labels, finding: string): string {
  const apart = told.kindsInseparable ? ": no reading with a meter tells these apart" : ", which the readings so far do not tell";
  return `${capital(finding)}; ${eitherKind(told, labels)}${apart}.`;
}

/**
 * The verdict in one sentence. It names as fact only what holds SURE of the chance, says "most likely"
 * down to LIKELY, and below that names what is left: two or more kinds, or findings.
 */
export function verdictSentence(told: Told, labels: Labels, suspects: readonly { readonly check: string }[] | null): string {
  if (suspects) {
    const again = suspects[0] ? `take "${checkName(suspects[0].check, labels)}" again` : "take the last readings again";
    return `These readings contradict each other: ${again} before anything is renewed.`;
  }
  const { kinds, openFindings: open, inseparable } = told, [best] = open;
  const clause = (fault: FaultChance) => findingClause(fault, labels, settledPins(told.pins));
  const finding = findingPart(open, inseparable, clause);
  if (kindNamed(kinds) || kinds.length === 0) return `${kindPart(kinds)}${pinsPart(told.pins, labels)}, ${finding}.`;
  if (best && isSettled(open)) return findingFirst(told, labels, settledWords(best, clause));
  return `${capital(eitherKind(told, labels))}, ${finding}.`;
}

const sentenceCase = (text: string): string => `${capital(text)}.`;

/** The finding alone, in a few words for lists, with the same hedges as the whole sentence. */
export function shortVerdict(open: readonly FaultChance[], labels: Labels, contradictory: boolean): string {
  const [best, second] = open;
  if (contradictory) return "Readings contradict each other.";
  if (!best) return "Nothing settled.";
  const words = faultText(best, labels);
  if (!second && best.p >= SURE) return sentenceCase(words);
  if (best.p >= LIKELY) return sentenceCase(`most likely ${words}`);
  if (open.length === 2 && second) return sentenceCase(`${words}, or ${faultText(second, labels)}`);
  return sentenceCase(`not settled: ${words}, or one of ${open.length - 1} more`);
}
