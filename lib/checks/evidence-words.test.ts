import { describe, expect, it } from "vitest";
import type { EvidenceRow, Prediction } from "@/lib/diagnosis";
import { evidencePhrases, evidenceSentence, expectedWords, fits, limitWords, movedSentence, timesWords } from "./evidence-words";

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
});

describe("the limit of error, in words", () => {
  // [computed] 5.000 V at 0.5 % and 4 mV: ±0.029 V.
  it("has two digits, and a word has none", () => {
    expect(limitWords({ check: VOLTS, value: 5, limit: 0.029 })).toBe("\u00b1\u00a029\u00a0mV");
    expect(limitWords({ check: "sweep:mated:1", value: "smooth", limit: null })).toBe("none");
  });
});

describe("a row of the evidence, in words", () => {
  const labels = ["A", "B", "C"] as const, open = { code: "wire-open", pins: [1] } as const;
  // [computed] 0.5 % of 4.98 V and 4 mV: ±28.9 mV; 4.98 V from 0 V is 172 of them.
  const row: EvidenceRow = { check: VOLTS, value: 4.98, ifSound: band(VOLTS, 4.9, 5.1), ifFinding: band(VOLTS, -0.008, 0.008), limit: 0.0289, offLimits: 4.98 / 0.0289, offIfSound: -0.02 / 0.0289, factor: 1 / 48, without: 0.2 };

  it("says what was read, what it should have been, how far off it is, and what that did", () => {
    expect(evidenceSentence(row, open, labels, null)).toBe("Voltage, harness cavity A to battery negative, read 4.98\u00a0V. If the wire of cavity A is open, it would read \u22128\u00a0mV to 8\u00a0mV; it is about 170 times the meter's limit of error away. That made this about 50 times less likely.");
  });

  it("says so where it agrees, and where a wide range leaves room", () => {
    expect(evidencePhrases({ ...row, ifFinding: row.ifSound, offLimits: -0.69, factor: 3.2 })).toEqual(["It would read 4.90\u00a0V to 5.10\u00a0V, and it did, 0.7 times the meter's limit of error off the middle.", "That made this about 3.2 times more likely."]);
    expect(evidencePhrases({ ...row, value: 9, limit: 0.049, ifFinding: band(VOLTS, 0, 8), offLimits: 5 / 0.049, factor: 1 })[0]).toBe("It would read 0\u00a0V to 8\u00a0V; it is about 100 times the meter's limit of error away from the middle of that.");
  });

  it("says it in words where a reading lies right in the middle", () => {
    expect(evidencePhrases({ ...row, ifFinding: row.ifSound, offLimits: -0.01 })[0]).toBe("It would read 4.90\u00a0V to 5.10\u00a0V, and it did, right in the middle.");
  });

  it("counts no limits where a word stands", () => {
    const wire = { ...row, check: "res:wire:1", value: "OL" as const, limit: null, ifFinding: word("res:wire:1", ["OL", 1]), offLimits: null, factor: 12 };
    expect(evidencePhrases(wire)).toEqual(["It would read OL, and it did.", "That made this about 10 times more likely."]);
    expect(evidencePhrases({ ...wire, value: 0.2 })[0]).toBe("It would read OL; it did not.");
    expect(evidencePhrases({ ...wire, check: "fit:contact:1", value: "grips", ifFinding: word("fit:contact:1", ["loose", 0.95], ["grips", 0.05]) })[0]).toBe("The answer would be loose or grips, and it was.");
  });

  it.each([[1e-6, "That rules this out, unless the reading is wrong."], [1e-3, "That rules this out, unless the reading is wrong."], [0.5, "That made this about 2 times less likely."], [0.95, "The other readings speak against this too: beside them, that changed next to nothing."], [1, "The other readings speak against this too: beside them, that changed next to nothing."], [1e6, "That made this more than 1000 times more likely."], [null, null]] as const)("a factor of %s", (factor, words) => {
    // Away from the finding's band where it speaks against, inside it where it speaks for.
    expect(movedSentence({ ...row, value: factor !== null && factor > 1 ? 0 : 4.98, factor })).toBe(words);
  });

  it("says that a reading which agrees moved nothing", () => {
    expect(movedSentence({ ...row, value: 0, factor: 1 })).toBe("Beside the other readings, that changed next to nothing.");
  });

  it("gives the reason where a reading agrees and still speaks against, or the other way round", () => {
    expect(movedSentence({ ...row, value: 0, factor: 0.1 })).toBe("Something else expects it more closely: that made this about 10 times less likely.");
    expect(movedSentence({ ...row, value: 0, factor: 1e-5 })).toBe("Something else expects it more closely: that rules this out, unless the reading is wrong.");
    expect(movedSentence({ ...row, factor: 30 })).toBe("Everything else expects it even less: that made this about 30 times more likely.");
  });

  it("leaves the limit of error out where what is not known of the machine is far wider", () => {
    expect(evidencePhrases({ ...row, value: 2, limit: 0.014, ifFinding: band(VOLTS, 0, 8), offLimits: -140 })[0]).toBe("It would read 0\u00a0V to 8\u00a0V, and it did.");
  });

  it("has no more digits than mean something", () => {
    expect([0, 0.04, 0.44, 1.6, 9.96, 12.3, 98, 172, 999, 1e9].map(timesWords)).toEqual(["0", "0", "0.4", "1.6", "10", "12", "98", "170", "1000", "more than 1000"]);
  });

  it("uses no jargon of statistics", () => {
    for (const factor of [1e-6, 0.02, 1, 40, 1e6]) expect(evidenceSentence({ ...row, factor }, open, labels, null)).not.toMatch(/posterior|prior|likelihood|sigma|probab|deviation|evidence ratio|factor|infinit|NaN/i);
  });
});
