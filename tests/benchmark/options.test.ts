import { describe, expect, it } from "vitest";
import { options, SECTIONS } from "./options";

describe("the command line", () => {
  it("is everything, unless told otherwise", () => {
    expect(options([])).toEqual({ every: 1, only: new Set(SECTIONS) });
    expect(options(["--every", "20", "--only", "steps,memory"])).toEqual({ every: 20, only: new Set(["steps", "memory"]) });
  });

  it.each([[["--every", "0"]], [["--every"]], [["--only", "speed"]], [["--fast"]]])("%s is refused with what to write instead", (args) => {
    expect(() => options(args)).toThrow(/write --every N \(1 to 999\) or --only steps,orders,memory,browser/);
  });
});
