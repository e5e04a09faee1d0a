import { describe, expect, it } from "vitest";
import type { EvidenceRow, Prediction } from "@/lib/diagnosis";
import { bearing, expectedWords, fits, limitWords } from "./evidence-words";

const band = (check: string, low: number, high: number, words: Prediction["words"] = []): Prediction => ({ check, number: { low, middle: (low + high) / 2, high }, words });
const word = (check: string, ...words: readonly (readonly [Prediction["words"][number]["word"], number])[]): Prediction => ({ check, number: null, words: words.map(([w, p]) => ({ word: w, p })) });
const VOLTS = "volt:harness:1-gnd";

describe("what is expected, in words", () => {
  it("gives the band with its unit, and the words beside it", () => {
    expect(expectedWords(band(VOLTS, 4.9, 5.1))).toBe("4.90\u00a0V to 5.10\u00a0V");
    expect(expectedWords(word("res:wire:1", ["OL", 0.98]))).toBe("OL");
    expect(expectedWords(word("freq:mated:1@rest", ["none", 1]))).toBe("no signal");
  });

  it("says a band over decades in two digits at each end", () => {
    expect(expectedWords(band("res:harness:2-gnd", 812, 68_400))).toBe("0.81\u00a0k\u03a9 to 68\u00a0k\u03a9");
  });

  it("leaves out words that hardly ever come", () => {
    expect(expectedWords(word("fit:contact:1", ["grips", 0.97], ["loose", 0.03]))).toBe("grips");
  });
});

describe("a reading beside its predictions", () => {
  it("fits within the band and the meter's limit of error", () => {
    expect(fits(band(VOLTS, 4.9, 5.1), 5.12, 0.03)).toBe(true);
    expect(fits(band(VOLTS, 4.9, 5.1), 5.14, 0.03)).toBe(false);
    expect(fits(band(VOLTS, 4.9, 5.1), "OL", null)).toBe(false);
  });

  it("stands on the side of what it fits", () => {
    const row = (value: EvidenceRow["value"]): EvidenceRow => ({ check: VOLTS, value, ifSound: band(VOLTS, 4.9, 5.1), ifFinding: band(VOLTS, -0.01, 0.01), limit: 0.03 });
    expect([5, 0, 2.5].map((value) => bearing(row(value)))).toEqual(["against-finding", "against-sound", "against-both"]);
  });
});

describe("the limit of error, in words", () => {
  // [computed] 5.000 V at 0.5 % and 4 mV: ±0.029 V.
  it("has two digits, and a word has none", () => {
    expect(limitWords({ check: VOLTS, value: 5, limit: 0.029 })).toBe("\u00b1\u00a029\u00a0mV");
    expect(limitWords({ check: "sweep:mated:1", value: "smooth", limit: null })).toBe("none");
  });
});
