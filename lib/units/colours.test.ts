import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { IEC_COLOURS, colourWords, parseColour } from "./index";

const colour = fc.constantFrom(...IEC_COLOURS.map(([code]) => code));

describe("wire colours", () => {
  it("reads its own words back, one colour or two, in any order", () => {
    fc.assert(fc.property(colour, colour, (first, second) => {
      fc.pre(first !== second);
      const parsed = parseColour(`${second.toLowerCase()} ${first}`);
      expect(parsed.ok && parseColour(colourWords(parsed.code)?.replaceAll("-", " ") ?? "")).toEqual(parsed);
      expect(parsed).toEqual(parseColour(`${first}/${second}`));
    }));
  });

  it("never throws and always explains", () => {
    fc.assert(fc.property(fc.string({ maxLength: 40 }), (text) => {
      const parsed = parseColour(text);
      return parsed.ok ? colourWords(parsed.code) === parsed.words : parsed.message.endsWith(".");
    }));
  });

  it.each([["", "unknown-colour"], ["XY", "unknown-colour"], ["mauve", "unknown-colour"], ["__proto__", "unknown-colour"], ["GR", "other-scheme"], ["BKBNRD", "too-many-colours"]] as const)("%j is %s", (text, code) => {
    expect(parseColour(text)).toMatchObject({ ok: false, code });
  });
});
