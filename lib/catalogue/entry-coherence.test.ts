import { describe, expect, it } from "vitest";
import { seedEntries } from "@/seed/catalogue";
import { coherenceProblems, foldPartNumber } from "./entry-coherence";
import type { EntryData } from "./entry-data";
import { entryDataSchema } from "./schemas";

function seedOf(kind: EntryData["kind"]): EntryData {
  const found = seedEntries().find((entry) => entry.data.kind === kind);
  if (!found) throw new Error(`no seed entry of kind ${kind}`);
  return found.data;
}

const [pot, pwm, voltage] = [seedOf("potentiometer"), seedOf("pwm"), seedOf("voltage")];
const [first, second, third] = pot.pins;
if (!first || !second || !third) throw new Error("three pins");

/** One contradiction each, and the path at which it must be named. */
const BROKEN: readonly (readonly [what: string, data: EntryData, path: string])[] = [
  ["a role twice", { ...pot, pins: [first, second, { ...third, role: first.role }] }, "pins"],
  ["a cavity twice", { ...pot, pins: [first, second, { ...third, cavity: first.cavity }] }, "pins"],
  ["a cavity the connector has not", { ...pot, pins: [first, second, { ...third, cavity: "Z" }] }, "pins.2.cavity"],
  ["a colour of another standard", { ...pot, pins: [{ ...first, colour: "SW" }, second, third] }, "pins.0.colour"],
  ["two letters in the wrong order", { ...pot, pins: [{ ...first, colour: "BURD" }, second, third] }, "pins.0.colour"],
  ["two cavities in one place", { ...pot, connector: { ...pot.connector, cavities: [...pot.connector.cavities, { label: "9", row: 0, column: 0 }] } }, "connector.cavities"],
  ["two cavities with one label", { ...pot, connector: { ...pot.connector, cavities: [...pot.connector.cavities, { label: "1", row: 3, column: 3 }] } }, "connector.cavities"],
  ["a potentiometer without its total", { ...pot, healthy: { ...pot.healthy, totalOhms: undefined } }, "healthy.totalOhms"],
  ["a potentiometer with a frequency", { ...pot, healthy: { ...pot.healthy, frequencyHz: 500 } }, "healthy.frequencyHz"],
  ["a PWM device without a duty", { ...pwm, healthy: { ...pwm.healthy, duty: undefined } }, "healthy.duty"],
  ["an open collector that needs no pull-up", { ...pwm, healthy: { ...pwm.healthy, output: "open-collector", pullUpNeeded: false } }, "healthy.pullUpNeeded"],
  ["a signal above its supply", { ...voltage, supply: { type: "fixed", volts: 3 } }, "healthy.signalVolts"],
  ["a battery range upside down", { ...voltage, supply: { type: "battery", minVolts: 32, maxVolts: 10 } }, "supply.maxVolts"],
  ["no difference between rest and full", { ...voltage, healthy: { signalVolts: { rest: 1, full: 1 } } }, "healthy"],
  ["a table that turns back", { ...pot, transfer: { ...pot.transfer, points: [{ signal: 0, value: 0 }, { signal: 0.5, value: 9 }, { signal: 1, value: 5 }] } }, "transfer.points"],
  ["a table with a signal twice", { ...pot, transfer: { ...pot.transfer, points: [{ signal: 0, value: 0 }, { signal: 0, value: 2 }, { signal: 1, value: 5 }] } }, "transfer.points"],
  ["a table that ends before full travel", { ...pot, transfer: { ...pot.transfer, points: [{ signal: 0, value: 0 }, { signal: 0.4, value: 5 }] } }, "transfer.points"],
  ["a share above one", { ...pot, transfer: { ...pot.transfer, points: [{ signal: 0, value: 0 }, { signal: 90, value: 5 }] } }, "transfer.points"],
  ["a table in another signal", { ...pot, transfer: { ...pot.transfer, signal: { name: "Signal", unit: "volt" } } }, "transfer.signal.unit"],
  ["a part number twice but for punctuation", { ...pot, partNumbers: ["AB 1-2", "ab12"] }, "partNumbers"],
];

describe("coherence of an entry", () => {
  it.each([["potentiometer", pot], ["pwm", pwm], ["voltage", voltage]] as const)("a sound %s passes", (_kind, data) => {
    expect(coherenceProblems(data)).toEqual([]);
  });

  it.each(BROKEN)("%s is named at its path", (_what, data, path) => {
    expect(coherenceProblems(data).map((problem) => problem.path.join("."))).toContain(path);
    expect(entryDataSchema.safeParse(data).success).toBe(false);
  });

  it("refuses what it does not know and what is out of bounds", () => {
    for (const broken of [{ ...pot, extra: 1 }, { ...pot, pins: [first, second] }, { ...pot, sources: [] }, { ...pot, name: " " }, { ...pot, kind: "relay" }, null, [], "entry"]) {
      expect(entryDataSchema.safeParse(broken).success).toBe(false);
    }
  });

  it("folds part numbers to letters and digits", () => {
    expect(["TF-41/3 B", "tf 413b", "Tf.41.3-b"].map(foldPartNumber)).toEqual(["tf413b", "tf413b", "tf413b"]);
  });
});
