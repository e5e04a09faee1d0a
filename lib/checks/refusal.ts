import type { OtherChance, OtherDevice, Standing } from "@/lib/diagnosis";

/** For lists and bars, after "Not one of the three:". */
export const OTHER_SHORT: Readonly<Record<OtherDevice, string>> = {
  "current-loop": "two-wire current loop", "switch-pnp": "switch with PNP output", "switch-npn": "switch with NPN output",
  "edge-protocol": "digital signal of edges", "can-pair": "CAN bus", mains: "alternating voltage",
};

/** What to do where somebody may be hurt (common practice of the trade). */
export const STOP_NOW: readonly string[] = ["Stop. Do not touch the terminals or the leads' tips, and take no more readings.", "Have a licensed person make the circuit dead, lock it out and prove it dead.", "Keep others away until that is done."];

/** Why a check ends without a finding: what the readings speak for instead. The sentence and what to do about it are in refusal-advice.ts, which a running check does not bring. */
export interface Refusal {
  /** The device, or null where a reading above the limits ended the check. */
  readonly device: OtherDevice | null;
}

/** From this chance on, all of them together, the three kinds are no longer what the verdict speaks of. */
const REFUSED = 0.5;
const together = (others: readonly OtherChance[]) => others.reduce((sum, { p }) => sum + p, 0);

/** The refusal that a standing asks for, or null while the three kinds are what the readings speak of. */
export function refusalOf({ others, overLimit }: Pick<Standing, "others" | "overLimit">): Refusal | null {
  if (overLimit) return { device: null };
  const [best] = others;
  return best && together(others) > REFUSED ? { device: best.device } : null;
}

/** Whether somebody may be hurt: then the check does not only end, it stops. */
export const isDangerous = ({ device }: Refusal): boolean => device === null || device === "mains";

export const ABOVE_LIMITS = "Stop: above the limits of this tool.";

/** In a few words, for lists. */
export function shortRefusal({ device }: Refusal): string {
  return device === null ? ABOVE_LIMITS : `Not one of the three: ${OTHER_SHORT[device]}.`;
}
