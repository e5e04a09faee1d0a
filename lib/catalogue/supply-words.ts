import type { EntryData } from "./entry-data";

/** "5 V" for a fixed supply, "10–32 V battery" for a range; no-break spaces. */
export function supplyWords(supply: EntryData["supply"]): string {
  return supply.type === "fixed" ? `${supply.volts}\u00a0V` : `${supply.minVolts}\u2013${supply.maxVolts}\u00a0V battery`;
}
