import { parseCheck } from "./checks";
import type { Reading } from "./types";

/**
 * Volts above which a check ends: warnings of hand-held meters and voltage class B of ISO 6469-3 (60 V d.c., 30 V a.c.).
 */
export const MOST_DC_VOLTS = 60, MOST_AC_VOLTS = 30;

/** The first reading above the limits, in the order taken, or null. */
export function overLimitOf(readings: readonly Reading[]): { readonly check: string; readonly value: number } | null {
  for (const [check, value] of readings) {
    const spec = parseCheck(check), most = spec?.meter === "ac-volts" ? MOST_AC_VOLTS : MOST_DC_VOLTS;
    if (typeof value === "number" && spec?.unit === "volt" && Math.abs(value) > most) return { check, value };
  }
  return null;
}
