import { describe, expect, it } from "vitest";
import { seedEntries } from "@/seed/catalogue";
import { connectorShape, CONNECTOR_SHAPES, matingHalf } from "./connector-shapes";
import { cavityLabels, expectOfEntry } from "./expect-of-entry";

describe("an entry as the engine takes it", () => {
  it("numbers pins in the order of the connector's cavities, unused ones left out", () => {
    const lever = seedEntries().find((entry) => entry.data.partNumbers.includes("CV-66.01-S"));
    if (!lever) throw new Error("the lever with an unused cavity 3");
    expect(cavityLabels(lever.data)).toEqual(["1", "2", "4"]);
    expect(expectOfEntry(lever.data)).toEqual({ kind: "voltage", pins: { supply: 1, ground: 2, signal: 3 }, supplyVolts: 5, signalVolts: { rest: 0.5, full: 4.5 } });
  });

  it("does not depend on the order in which the pins are written down", () => {
    for (const { data } of seedEntries()) {
      expect(expectOfEntry({ ...data, pins: [...data.pins].reverse() })).toEqual(expectOfEntry(data));
      expect(cavityLabels({ ...data, pins: [...data.pins].reverse() })).toEqual(cavityLabels(data));
    }
  });

  it("says battery for a range and leaves out what the kind has not", () => {
    const boom = seedEntries().find((entry) => entry.data.partNumbers.includes("DL 8110-02"));
    if (!boom) throw new Error("the boom sensor");
    expect(expectOfEntry(boom.data)).toEqual({
      kind: "pwm", pins: { supply: 2, ground: 1, signal: 3 }, supplyVolts: "battery", output: "push-pull", frequencyHz: 200, duty: { rest: 0.1, full: 0.9 },
    });
  });

  it("throws on an entry without three pins", () => {
    const [seed] = seedEntries();
    if (!seed) throw new Error("no seed");
    expect(() => cavityLabels({ ...seed.data, pins: seed.data.pins.slice(0, 2) })).toThrow(/three pins/);
  });
});

describe("connector shapes", () => {
  it("mirrors a plug into its receptacle and back", () => {
    for (const shape of CONNECTOR_SHAPES) {
      const back = matingHalf(matingHalf(shape));
      expect(back.id).toBe(shape.id);
      expect(back.gender).toBe(shape.gender);
      shape.cavities.forEach((cavity, i) => expect(back.cavities[i]?.column).toBeCloseTo(cavity.column, 12));
      expect(matingHalf(shape).gender).not.toBe(shape.gender);
      expect(connectorShape(shape.id)).toBe(shape);
    }
    expect(connectorShape("no-such-shape")).toBeNull();
  });

  it("lets a rib meet a slot at the same place", () => {
    const plug = connectorShape("inline-3-plug");
    if (!plug) throw new Error("inline-3-plug");
    expect(matingHalf(plug).keying.map((key) => [key.type, key.at])).toEqual(plug.keying.map((key) => ["slot", 1 - key.at]));
  });
});
