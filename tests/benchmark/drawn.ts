import type { ReadingValue } from "@/lib/diagnosis";
import { vocabulary } from "@/lib/diagnosis";
import type { BenchCase } from "../support/bench";

/** How much a drawn case's numbers differ from the bench's: less than a hand meter resolves, so that the finding stays. */
const SPREAD = 0.001;

/**
 * The machine's checks in an order drawn evenly from all orders (Fisher and Yates). Only checks of the vocabulary, each of which
 * states the state of the machine that makes it safe.
 * @param draw numbers in [0, 1)
 */
export function randomOrder(readings: BenchCase["readings"], draw: () => number): string[] {
  const order = vocabulary().map(({ code }) => code).filter((code) => readings[code] !== undefined);
  for (let i = order.length - 1; i > 0; i--) {
    const j = Math.floor(draw() * (i + 1));
    [order[i], order[j]] = [order[j]!, order[i]!];
  }
  return order;
}

/** The same machine read anew: every number off by up to 0.1 %, every word as it was. */
export function readAnew(c: BenchCase, draw: () => number): BenchCase {
  const anew = (value: ReadingValue): ReadingValue => (typeof value === "number" ? value * (1 + SPREAD * (2 * draw() - 1)) : value);
  return { ...c, readings: Object.fromEntries(Object.entries(c.readings).map(([check, value]) => [check, anew(value)])) };
}
