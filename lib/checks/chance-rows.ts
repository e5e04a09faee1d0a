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
  const rows = priors.map(({ code, source }) => ({ code, title: titles[code], published: published[code], source: letterOf(source), own: own?.[code] ?? 0, now: now[code] }));
  // By what is published, so that a confirmation moves bars and not rows.
  return rows.sort((a, b) => b.published - a.published);
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

/** A share with one decimal, where whole percent would hide what a few checks do, e.g. "13.5 %". */
export function shareWords(share: number): string {
  return `${(share * 100).toFixed(1)}\u00a0%`;
}

/** How far a chance was moved, in words: "up 1.2 points", "down 0.4 points", "as published"; the difference of the shares as shown. */
export function shiftWords({ published, now }: Pick<ChanceRow, "published" | "now">): string {
  if (now === published) return "as published";
  const tenths = Math.abs(Math.round(now * 1000) - Math.round(published * 1000));
  return `${now > published ? "up" : "down"} ${tenths === 0 ? "less than 0.1" : (tenths / 10).toFixed(1)} points`;
}

/** End of the bars' scale: the smallest of these shares that holds every chance of the list. */
const SCALES = [0.2, 0.3, 0.4, 0.5, 0.6, 0.8, 1] as const;

/** Share at which bars of this list are full. */
export function barScale(rows: readonly ChanceRow[]): number {
  const most = Math.max(...rows.flatMap((row) => [row.published, row.now]));
  return SCALES.find((scale) => scale >= most) ?? 1;
}
