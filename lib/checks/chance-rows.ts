import { chancesBefore, FINDING_PRIORS, KIND_PRIORS, type Experience, type Prior } from "@/lib/diagnosis";
import { FINDING_TITLES, KIND_TITLES } from "./finding-words";

/** One finding or kind before the first reading. */
export interface ChanceRow {
  readonly code: string;
  readonly title: string;
  /** As published, 0..1; the published shares of a list sum to 1. */
  readonly published: number;
  /** Letter of its source in the list of sources. */
  readonly source: string;
  /** The workshop's own confirmed checks, counted whether they are in use or not. */
  readonly own: number;
  /** What a check starts from, 0..1. */
  readonly now: number;
}

export interface ChanceTable {
  readonly findings: readonly ChanceRow[];
  readonly kinds: readonly ChanceRow[];
  /** Every source once, lettered in the order in which the rows name them. */
  readonly sources: readonly { readonly letter: string; readonly text: string }[];
}

function rowsOf<Code extends string>(
  priors: readonly Prior<Code>[], titles: Readonly<Record<Code, string>>, published: Readonly<Record<Code, number>>,
  own: Readonly<Partial<Record<Code, number>>> | undefined, now: Readonly<Record<Code, number>>, letterOf: (source: string) => string,
): ChanceRow[] {
  return priors.map(({ code, source }) => ({ code, title: titles[code], published: published[code], source: letterOf(source), own: own?.[code] ?? 0, now: now[code] }));
}

/**
 * The chances before the first reading as a table: published, own count, and what comes of both. Pure.
 * @param own counts of the confirmations in force
 * @param inForce counts that new checks start from; undefined where own checks are set aside
 */
export function chanceTable(own: Experience | undefined, inForce: Experience | undefined): ChanceTable {
  const texts = [...new Set([...FINDING_PRIORS, ...KIND_PRIORS].map((prior) => prior.source))];
  const letterOf = (source: string) => String.fromCharCode(97 + texts.indexOf(source));
  const published = chancesBefore(), now = chancesBefore(inForce);
  return {
    findings: rowsOf(FINDING_PRIORS, FINDING_TITLES, published.findings, own?.findings, now.findings, letterOf),
    kinds: rowsOf(KIND_PRIORS, KIND_TITLES, published.kinds, own?.kinds, now.kinds, letterOf),
    sources: texts.map((text) => ({ letter: letterOf(text), text })),
  };
}
