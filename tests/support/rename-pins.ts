import type { Fault, PinAssignment, PinNumber, Reading, Setup } from "@/lib/diagnosis";
import { parseCheck } from "@/lib/diagnosis";

/** New number of each pin; `renaming[0]` is that of pin 1. */
export type Renaming = readonly [PinNumber, PinNumber, PinNumber];
export const RENAMINGS: readonly Renaming[] = [[1, 3, 2], [2, 1, 3], [2, 3, 1], [3, 1, 2], [3, 2, 1]];

/** The same reading of the same machine, its pins numbered anew. Where the vocabulary has the pair only the other way round, the leads are exchanged. */
export function renameReading([check, value]: Reading, renaming: Renaming): Reading {
  const renamed = check.replace(/(?<=:)[123](?:-[123])?(?=[-@]|$)/, (pins) => pins.split("-").map((p) => renaming[Number(p) - 1]).join("-"));
  if (parseCheck(renamed)) return [renamed, value];
  const turned = renamed.replace(/([123])-([123])/, "$2-$1");
  return [turned, typeof value === "number" && turned.startsWith("volt:") ? -value : value];
}

export function renamePins(pins: PinAssignment, renaming: Renaming): PinAssignment {
  return { supply: renaming[pins.supply - 1]!, ground: renaming[pins.ground - 1]!, signal: renaming[pins.signal - 1]! };
}

export function renameFault(fault: Fault, renaming: Renaming): Fault {
  return fault.pins ? { code: fault.code, pins: fault.pins.map((p) => renaming[p - 1]!).sort() } : { code: fault.code };
}

export function renameSetup(setup: Setup, renaming: Renaming): Setup {
  return setup.expect ? { ...setup, expect: { ...setup.expect, pins: renamePins(setup.expect.pins, renaming) } } : setup;
}
