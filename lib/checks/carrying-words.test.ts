import { describe, expect, it } from "vitest";
import { carryingSentence, tellingWords } from "./carrying-words";

const codes = (n: number) => Array.from({ length: n }, (_, i) => `res:wire:${i + 1}`);

describe("the readings that carry a verdict, in words", () => {
  it("says how many of how many, and no more than was tried", () => {
    expect(carryingSentence({ checks: codes(3), smallest: true }, 11)).toBe("These three of the eleven readings alone carry the verdict; no fewer do.");
    expect(carryingSentence({ checks: codes(3), smallest: false }, 14)).toBe("These three of the 14 readings alone carry the verdict; none of them can be left out.");
    expect(carryingSentence({ checks: codes(1), smallest: true }, 5)).toBe("This one of the five readings alone carries the verdict.");
  });

  it("says so where all are needed", () => {
    expect(carryingSentence({ checks: codes(3), smallest: true }, 3)).toBe("The verdict needs every one of its three readings.");
    expect(carryingSentence({ checks: codes(1), smallest: true }, 1)).toBe("The verdict rests on this one reading.");
  });
});

describe("what a check would do", () => {
  it("is said in three steps", () => {
    expect([0.9, 0.5, 0.1].map((gainBits) => tellingWords({ gainBits }))).toEqual(["would settle it", "would help", "would help a little"]);
  });
});
