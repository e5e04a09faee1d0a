import { describe, expect, it } from "vitest";
import { mean, percentile, slope } from "./figures";

// Source of all values: worked by hand, as noted beside each.

describe("mean", () => {
  it("is the sum over the number, and 0 of nothing", () => {
    expect(mean([1, 2, 6])).toBe(3); // 9 / 3
    expect(mean([])).toBe(0);
  });
});

describe("percentile by nearest rank", () => {
  const list = [50, 15, 40, 20, 35];
  it.each([
    [0.05, 15], // rank 0.25, so the 1st of 15 20 35 40 50
    [0.3, 20], // rank 1.5, so the 2nd
    [0.4, 20], // rank 2
    [0.5, 35], // rank 2.5, so the 3rd
    [0.95, 50], // rank 4.75, so the 5th
    [1, 50],
  ])("%d of five values is %d", (share, value) => {
    expect(percentile(list, share)).toBe(value);
  });

  it("leaves the list as it was, and is 0 of nothing", () => {
    expect(list).toEqual([50, 15, 40, 20, 35]);
    expect(percentile([], 0.95)).toBe(0);
  });

  it("is the 19th of twenty at 95 %", () => {
    expect(percentile(Array.from({ length: 20 }, (_, i) => i + 1), 0.95)).toBe(19); // 0.95 x 20 = 19
  });
});

describe("slope of the least-squares line", () => {
  it("is that of a line all points lie on", () => {
    expect(slope([{ x: 0, y: 3 }, { x: 100, y: 203 }, { x: 200, y: 403 }])).toBe(2);
  });

  it("weighs scattered points by their distance from the middle", () => {
    // x - 2: -1 0 1; y - 3: -1 2 -1; sum of products 1 + 0 - 1 = 0
    expect(slope([{ x: 1, y: 2 }, { x: 2, y: 5 }, { x: 3, y: 2 }])).toBe(0);
    // x - 2: -1 0 1; y - 4: -3 0 3; 6 / 2
    expect(slope([{ x: 1, y: 1 }, { x: 2, y: 4 }, { x: 3, y: 7 }])).toBe(3);
    // x - 2.5: -1.5 -0.5 0.5 1.5; y - 2.5: -1.5 0.5 -0.5 1.5; (2.25 - 0.25 - 0.25 + 2.25) / 5
    expect(slope([{ x: 1, y: 1 }, { x: 2, y: 3 }, { x: 3, y: 2 }, { x: 4, y: 4 }])).toBe(0.8);
  });

  it("is 0 where nothing spreads", () => {
    expect(slope([])).toBe(0);
    expect(slope([{ x: 5, y: 1 }, { x: 5, y: 9 }])).toBe(0);
  });
});
