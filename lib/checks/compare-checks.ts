import "server-only";
import type { Person } from "@/lib/auth/permissions";
import type { CheckView } from "./check-view";
import { compareRows, type CompareRow } from "./compare-rows";
import { getCheck } from "./get-check";

export interface Comparison {
  readonly first: CheckView;
  /** The re-check; null while there is none. */
  readonly second: CheckView | null;
  readonly rows: readonly CompareRow[];
}

/**
 * A check beside the one it belongs to: given a re-check, the run it repeats; given a first run, its latest re-check.
 * Both must be open to the person.
 * @throws AppError not-allowed (403), not-found (404)
 */
export async function compareChecks(person: Person, id: string): Promise<Comparison> {
  const given = await getCheck(person, id);
  const latest = given.rechecks.filter((check) => check.state !== "abandoned").at(-1);
  const [first, second] = given.recheckOf
    ? [await getCheck(person, given.recheckOf), given]
    : [given, latest ? await getCheck(person, latest.id) : null];
  return { first, second, rows: second ? compareRows(first, second) : [] };
}
