import type { FaultChance, FaultCode } from "@/lib/diagnosis";

/** Findings in the wiring or the controller: once one of them is mended the device runs, and a PWM output shows its duty. */
const MENDED_OUTSIDE: ReadonlySet<FaultCode> = new Set<FaultCode>([
  "wire-open", "wire-resistive", "short-to-ground", "short-to-battery", "wires-shorted", "wires-swapped", "contact-open", "supply-missing", "pull-missing",
]);

/** What to say where no reading tells the kinds apart that are left: that they read alike and, where one finding outside the device hides it, when it will show. */
export function alikeKindsWords(open: readonly Pick<FaultChance, "code">[]): string {
  const [only, second] = open;
  if (!only || second || !MENDED_OUTSIDE.has(only.code)) return "They read alike at every check.";
  return "They read alike at every check while this finding stands. Mend it, then make a re-check: a device that runs shows its kind.";
}
