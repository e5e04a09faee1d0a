import { faultText, type FaultChance, type KindChance, type PinsChance, type Standing } from "@/lib/diagnosis";
import { checkName, type Labels } from "./check-name";
import { findingClause, KIND_WORDS } from "./finding-words";

/** From this chance on a thing is said without a hedge; the same share that the open findings hold. */
export const SURE = 0.95;
/** From this chance on, up to SURE, it is "most likely". Below it nothing is asserted. */
export const LIKELY = 0.6;

function kindPart(kinds: readonly KindChance[]): string {
  const [best, second] = kinds;
  if (!best) return "The kind of device is not settled";
  if (best.p >= SURE) return `It is ${KIND_WORDS[best.kind]}`;
  if (best.p >= LIKELY || !second) return `Most likely it is ${KIND_WORDS[best.kind]}`;
  return `The kind of device is not settled (${KIND_WORDS[best.kind]} or ${KIND_WORDS[second.kind]})`;
}

function pinsPart(pins: readonly PinsChance[], labels: Labels): string {
  const best = pins[0];
  if (!best || best.p < LIKELY) return ", its pins not settled";
  const list = `supply on ${labels[best.supply - 1]}, ground on ${labels[best.ground - 1]} and signal on ${labels[best.signal - 1]}`;
  return best.p >= SURE ? ` with ${list}` : `, most likely with ${list}`;
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

function findingPart(open: readonly FaultChance[], inseparable: boolean, clause: (f: FaultChance) => string): string {
  const [best, second] = open;
  if (!best) return "and what is wrong, if anything, is not settled";
  if (open.length === 1 && best.p >= SURE) {
    return best.code === "none" ? "and every reading fits a sound device and sound wiring" : `and ${clause(best)}`;
  }
  if (inseparable) return `and either ${joined(open.map(clause))}: no reading with a meter tells these apart`;
  if (best.p >= LIKELY && second) return `and most likely ${clause(best)}, though it is still possible that ${clause(second)}`;
  if (best.p >= LIKELY) return `and most likely ${clause(best)}`;
  return `and it cannot be told yet whether ${joined(open.map(clause))}`;
}

/**
 * The verdict in one sentence. It names as fact only what holds SURE of the chance, says "most likely"
 * down to LIKELY, and below that says that the thing is not settled.
 */
export function verdictSentence(standing: Standing, labels: Labels, suspects: readonly { readonly check: string }[] | null): string {
  if (suspects) {
    const again = suspects[0] ? `take "${checkName(suspects[0].check, labels)}" again` : "take the last readings again";
    return `These readings contradict each other: ${again} before anything is renewed.`;
  }
  const pins = settledPins(standing.pins);
  const finding = findingPart(standing.openFindings, standing.inseparable, (fault) => findingClause(fault, labels, pins));
  return `${kindPart(standing.kinds)}${pinsPart(standing.pins, labels)}, ${finding}.`;
}

const sentenceCase = (text: string): string => `${text.charAt(0).toUpperCase()}${text.slice(1)}.`;

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
