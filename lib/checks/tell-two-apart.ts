import { tellApart, vocabulary, type TellingCheck } from "@/lib/diagnosis";
import { plainAnswer, type PossibilityChoice } from "./possibilities";
import type { Run } from "./run";
import { effectiveReadings, engineSetup } from "./run-state";

/**
 * What would tell two possibilities of a run apart, best first; empty when nothing a meter can do will. A check that was
 * skipped counts too: it could be made elsewhere, or another day. Pure.
 */
export function tellTwoApart(run: Pick<Run, "setup" | "steps">, pair: readonly [PossibilityChoice, PossibilityChoice]): readonly TellingCheck[] {
  return plainAnswer(tellApart({ ...engineSetup(run, vocabulary()), excluded: undefined }, effectiveReadings(run.steps), pair.map(({ possibility }) => possibility)));
}
