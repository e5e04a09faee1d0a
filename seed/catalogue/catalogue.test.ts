import { describe, expect, it } from "vitest";
import { foldPartNumber } from "@/lib/catalogue/entry-coherence";
import { cavityLabels, expectOfEntry } from "@/lib/catalogue/expect-of-entry";
import { entryDataSchema, slugSchema } from "@/lib/catalogue/schemas";
import { signalAt, valueAt } from "@/lib/catalogue/transfer";
import { seedEntries } from ".";

const entries = seedEntries();

describe("demo catalogue", () => {
  it("holds at least 84 entries of all kinds, of about nine makers", () => {
    const kinds = entries.map((entry) => entry.data.kind);
    expect(entries.length).toBeGreaterThanOrEqual(84);
    expect(kinds.filter((kind) => kind === "potentiometer").length).toBeGreaterThanOrEqual(30);
    expect(kinds.filter((kind) => kind === "pwm").length).toBeGreaterThanOrEqual(28);
    expect(kinds.filter((kind) => kind === "voltage").length).toBeGreaterThanOrEqual(20);
    expect(new Set(entries.map((entry) => entry.data.maker)).size).toBe(9);
  });

  it.each(entries.map((entry) => [entry.slug, entry] as const))("%s is coherent", (slug, entry) => {
    const parsed = entryDataSchema.safeParse(entry.data);
    expect(parsed.error?.issues ?? []).toEqual([]);
    expect(slugSchema.safeParse(slug).success).toBe(true);
    const labels = cavityLabels(entry.data);
    const signalPin = entry.data.pins.find((pin) => pin.role === "signal");
    expect(labels[expectOfEntry(entry.data).pins.signal - 1]).toBe(signalPin?.cavity);
  });

  it("never gives an id, an address or a part number twice", () => {
    const parts = entries.flatMap((entry) => entry.data.partNumbers.map(foldPartNumber));
    for (const values of [entries.map((e) => e.id), entries.map((e) => e.versionId), entries.map((e) => e.slug), parts]) {
      expect(new Set(values).size).toBe(values.length);
    }
  });

  it("converts at both ends of every table and refuses beyond them", () => {
    for (const { data } of entries) {
      const [first, last] = [data.transfer.points[0], data.transfer.points.at(-1)];
      if (!first || !last) throw new Error(data.name);
      expect(valueAt(data.transfer, first.signal)).toEqual({ ok: true, value: first.value });
      expect(signalAt(data.transfer, last.value)).toEqual({ ok: true, value: last.signal });
      expect(valueAt(data.transfer, last.signal + 0.01)).toMatchObject({ ok: false, code: "above-table" });
    }
  });
});
