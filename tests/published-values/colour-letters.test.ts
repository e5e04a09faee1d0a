import { describe, expect, it } from "vitest";
import { IEC_COLOURS, colourWords, dinColour, parseColour } from "@/lib/units";

describe("IEC 60757 letters", () => {
  // Source: IEC 60757, table 1, read in a national reproduction of the 1983 edition; the 2021 edition was not read.
  const table = [
    ["BK", "black"], ["BN", "brown"], ["RD", "red"], ["OG", "orange"], ["YE", "yellow"], ["GN", "green"], ["BU", "blue"], ["VT", "violet"],
    ["GY", "grey"], ["WH", "white"], ["PK", "pink"], ["GD", "gold"], ["TQ", "turquoise"], ["SR", "silver"],
  ] as const;

  it("has them in the table's order", () => expect(IEC_COLOURS).toEqual(table));
  it.each(table)("%s is %s, both ways", (code, word) => {
    expect(colourWords(code)).toBe(word);
    expect(parseColour(word)).toEqual({ ok: true, code, words: word });
  });

  it("joins two colours of one wire in the table's order", () => {
    for (const text of ["RDBU", "BURD", "blue red", "red/blue", "bu-rd", "red and blue"]) expect(parseColour(text)).toMatchObject({ ok: true, code: "RDBU" });
  });

  it("keeps green and yellow together as GNYE", () => {
    for (const text of ["GNYE", "YEGN", "green and yellow", "yellow/green"]) expect(parseColour(text)).toEqual({ ok: true, code: "GNYE", words: "green-and-yellow" });
  });

  it("counts light blue as blue", () => expect(parseColour("light blue")).toMatchObject({ ok: true, code: "BU" }));
});

describe("DIN 72551 letters are named, never taken for IEC 60757", () => {
  // Source: DIN 72551, read in secondary lists; or, vi, rs and tr from memory.
  it.each([
    ["sw", "black"], ["br", "brown"], ["rt", "red"], ["ro", "red"], ["ge", "yellow"], ["bl", "blue"], ["hb", "light blue"], ["gr", "grey"], ["ws", "white"],
    ["li", "lilac"], ["or", "orange"], ["vi", "violet"], ["rs", "pink"], ["tr", "transparent"],
  ] as const)("%s is %s there", (letters, word) => {
    expect(dinColour(letters)).toBe(word);
    expect(colourWords(letters)).toBeNull();
    const parsed = parseColour(letters);
    expect(parsed).toMatchObject({ ok: false, code: "other-scheme" });
    if (!parsed.ok) expect(parsed.message).toContain(word);
  });

  it("is the same in both schemes for gn alone", () => {
    expect(dinColour("gn")).toBeNull();
    expect(parseColour("gn")).toMatchObject({ ok: true, code: "GN" });
  });
});
