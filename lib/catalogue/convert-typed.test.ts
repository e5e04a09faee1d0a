import { describe, expect, it } from "vitest";
import { scaleOf, shareOf } from "./chart-scale";
import { convertTyped } from "./convert-typed";
import type { TransferTable } from "./entry-data";

const lift: TransferTable = {
  signal: { name: "Duty", unit: "ratio" }, value: { name: "Height", unit: "mm" },
  points: [{ signal: 0.1, value: 0 }, { signal: 0.5, value: 259.46 }, { signal: 0.9, value: 800 }],
};

const plain = (text: string) => text.replace(/\u00a0/g, " ");

describe("value converter", () => {
  it.each([["27.3 %"], ["27,3%"], ["27.3"]])("reads %s and gives the value with the table's digits", (typed) => {
    const result = convertTyped(lift, "signal", typed);
    // Worked by hand: 259.46 mm x (0.273 - 0.1) / 0.4 = 112.2 mm.
    expect(result).toMatchObject({ state: "converted" });
    expect(result.state === "converted" && plain(result.other)).toBe("112 mm");
  });

  it("goes back the same way", () => {
    const result = convertTyped(lift, "value", "112 mm");
    expect(result.state === "converted" && plain(result.other)).toBe("27.3 %");
  });

  it("says plainly where the table ends, and what a signal beyond it means", () => {
    const low = convertTyped(lift, "signal", "4 %");
    expect(low.state === "refused" && plain(low.message)).toBe("4 % lies below the table, which ends at 10.0 % (0 mm). A healthy device does not go there: think of the wiring or the device.");
    const high = convertTyped(lift, "value", "900 mm");
    expect(high.state === "refused" && plain(high.message)).toBe("900 mm lies above the table, which ends at 800 mm (90.0 %).");
  });

  it("refuses nonsense, wrong units and the meter's words with a sentence, and nothing typed is no error", () => {
    for (const typed of ["plenty", "12 V", "OL", "none"]) expect(convertTyped(lift, "value", typed)).toMatchObject({ state: "refused", message: expect.stringMatching(/[a-z].*\./) });
    expect(convertTyped(lift, "signal", "  ")).toEqual({ state: "empty" });
  });
});

describe("axis", () => {
  it.each([[0, 720, [0, 200, 400, 600, 800]], [0.12, 0.86, [0, 0.2, 0.4, 0.6, 0.8, 1]], [-45, 45, [-50, -25, 0, 25, 50]], [3, 3, [3, 4]]])("from %d to %d has round ticks", (low, high, ticks) => {
    expect(scaleOf(low, high, 4).ticks[0]).toBeLessThanOrEqual(low);
    expect(scaleOf(low, high, 4).ticks.at(-1)).toBeGreaterThanOrEqual(high);
    expect(scaleOf(low, high, 4).ticks).toEqual(ticks);
  });

  it("places its ends at 0 and 1", () => {
    const scale = scaleOf(0, 720, 4);
    expect([shareOf(scale, scale.low), shareOf(scale, scale.high), shareOf(scale, 400)]).toEqual([0, 1, 0.5]);
  });
});
