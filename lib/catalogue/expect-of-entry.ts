import type { Expect, PinNumber, Role } from "@/lib/diagnosis";
import type { EntryData, EntryPin } from "./entry-data";

const NUMBERS: readonly PinNumber[] = [1, 2, 3];

/** The entry's pins in the order in which its connector lists their cavities: pin 1, 2 and 3 of a check. */
export function pinsInOrder(data: Pick<EntryData, "pins" | "connector">): readonly EntryPin[] {
  const place = (pin: EntryPin) => data.connector.cavities.findIndex((c) => c.label === pin.cavity);
  return [...data.pins].sort((a, b) => place(a) - place(b));
}

/**
 * Cavity labels of pins 1, 2 and 3.
 * @throws Error when the entry has not three pins; entries are checked before they are published.
 */
export function cavityLabels(data: Pick<EntryData, "pins" | "connector">): readonly [string, string, string] {
  const [a, b, c, more] = pinsInOrder(data).map((pin) => pin.cavity);
  if (a === undefined || b === undefined || c === undefined || more !== undefined) throw new Error("an entry has exactly three pins");
  return [a, b, c];
}

function pinOf(data: EntryData, role: Role): PinNumber {
  const number = NUMBERS[pinsInOrder(data).findIndex((pin) => pin.role === role)];
  if (number === undefined) throw new Error(`the entry has no ${role} pin`);
  return number;
}

/** What the catalogue says of the healthy device, as the engine takes it; pins numbered as in `cavityLabels`. */
export function expectOfEntry(data: EntryData): Expect {
  const { totalOhms, tolerancePercent, signalRatio, wiperSeriesOhms, output, frequencyHz, duty, signalVolts } = data.healthy;
  return {
    kind: data.kind,
    pins: { supply: pinOf(data, "supply"), ground: pinOf(data, "ground"), signal: pinOf(data, "signal") },
    supplyVolts: data.supply.type === "fixed" ? data.supply.volts : "battery",
    ...(totalOhms !== undefined && { totalOhms }),
    ...(tolerancePercent !== undefined && { tolerancePercent }),
    ...(signalRatio && { signalRatio }),
    ...(wiperSeriesOhms !== undefined && { wiperSeriesOhms }),
    ...(output && { output }),
    ...(frequencyHz !== undefined && { frequencyHz }),
    ...(duty && { duty }),
    ...(signalVolts && { signalVolts }),
  };
}
