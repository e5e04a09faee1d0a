import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { parseQuantity, type RefusalCode, type Unit } from "./index";

function value(text: string, unit: Unit): number | string {
  const parsed = parseQuantity(text, unit);
  return parsed.ok ? parsed.value : `${parsed.code}: ${parsed.message}`;
}

function code(text: string, unit: Unit): RefusalCode | "accepted" {
  const parsed = parseQuantity(text, unit);
  return parsed.ok ? "accepted" : parsed.code;
}

describe("parseQuantity reads what people write", () => {
  it.each([
    ["4700", 4700], ["4k7", 4700], ["4K7", 4700], ["4.7 k", 4700], ["4,7k", 4700], ["4,7 k", 4700], ["4.7kΩ", 4700],
    ["4.7 k\u2126", 4700], ["4.7 kilo ohms", 4700], ["4.7 KOHM", 4700], ["4.700 k", 4700], ["4k7Ω", 4700], ["1 200", 1200], ["1\u00a0200", 1200],
    ["1'200", 1200], ["1,234,567", 1234567], ["1.234,5", 1234.5], ["1,234.5", 1234.5], ["0.47M", 470_000], ["0,470", 0.47],
    ["R47", 0.47], ["0R5", 0.5], ["2M2", 2_200_000], ["47 mΩ", 0.047], ["-0.02", -0.02], ["\u22120.02", -0.02], ["+5", 5], [".5", 0.5], ["5.", 5],
    ["1e3", 1000], ["４７", 47],
  ] as const)("ohms %s", (text, ohms) => expect(value(text, "ohm")).toBe(ohms));

  it.each([
    ["12mV", 0.012], ["-12 mV", -0.012], ["12 VDC", 12], ["2V5", 2.5], ["minus 0.5 volts", -0.5], ["350 \u00b5V", 0.00035], ["350 uV", 0.00035],
  ] as const)("volts %s", (text, volts) => expect(value(text, "volt")).toBe(volts));

  it("reads hertz, duty and engineering units", () => {
    expect(value("1.2 kHz", "hertz")).toBe(1200);
    expect(value("27.3 %", "ratio")).toBe(0.273);
    expect(value("27,3%", "ratio")).toBe(0.273);
    expect(value("27.3", "ratio")).toBe(0.273);
    expect(value("0.5 %", "ratio")).toBe(0.005);
    expect(value("112", "mm")).toBe(112);
    expect(value("112 mm", "mm")).toBe(112);
    expect(value("31.5°", "deg")).toBe(31.5);
    expect(value("1 200 rpm", "rpm")).toBe(1200);
    expect(value("40 l", "L")).toBe(40);
    expect(value("112 mm", "metre")).toBe(0.112);
    expect(value("12 mV", "V")).toBe(0.012);
  });

  it.each(["OL", "ol", "O.L", "0L", "0.L", "overload", "open", "∞"])("over range: %s", (text) => expect(value(text, "ohm")).toBe("OL"));
  it.each(["none", "None", "---", "----", "no reading", "0 Hz", "0.000"])("no frequency: %s", (text) => expect(value(text, "hertz")).toBe("none"));
});

describe("parseQuantity names what is wrong", () => {
  it.each([
    ["", "ohm", "empty"], ["   ", "volt", "empty"], ["4,700", "ohm", "thousands-ambiguous"], ["12,500 k", "ohm", "thousands-ambiguous"],
    ["12 V", "ohm", "wrong-unit"], ["5 mA", "volt", "wrong-unit"], ["12 V AC", "volt", "wrong-unit"], ["50 %", "volt", "wrong-unit"],
    ["12 bar", "mm", "wrong-unit"], ["12 MV", "volt", "wrong-prefix"], ["3 mHz", "hertz", "wrong-prefix"], ["5 m", "ohm", "prefix-ambiguous"],
    ["0.5", "ratio", "percent-ambiguous"], ["1", "ratio", "percent-ambiguous"], ["120 %", "ratio", "out-of-range"], ["-5 %", "ratio", "out-of-range"],
    ["-50", "hertz", "out-of-range"], ["1e999", "ohm", "out-of-range"], ["OL", "volt", "word-not-for-unit"], ["none", "ohm", "word-not-for-unit"],
    ["abc", "ohm", "not-a-number"], ["1.2.3", "ohm", "not-a-number"], ["4 7", "ohm", "not-a-number"], ["4k7k", "ohm", "not-a-number"], ["k47", "ohm", "not-a-number"],
    ["½", "ohm", "not-a-number"], ["10²", "ohm", "not-a-number"], ["NaN", "volt", "not-a-number"], ["5 constructor", "volt", "not-a-number"], ["5 __proto__", "ohm", "not-a-number"], ["12 34", "volt", "not-a-number"], ["--5", "volt", "not-a-number"],
    ["1".repeat(41), "ohm", "too-long"],
  ] as const)("%j in %s is %s", (text, unit, expected) => expect(code(text, unit)).toBe(expected));

  it("says in a sentence what to enter instead", () => {
    expect(value("12 V", "ohm")).toContain("this value is in ohms");
    expect(value("4,700", "ohm")).toContain("4.700 or 4700");
    expect(value("0.5", "ratio")).toContain("0.5 % or 50 %");
  });
});

describe("laws of the parser", () => {
  const units = fc.constantFrom<Unit>("ohm", "volt", "hertz", "ratio", "metre", "mm", "deg", "bar", "");
  const alphabet = fc.constantFrom(..."0123456789.,' -+eEkKMmGuμΩRVvHz%OLnoe\u2212\u00a0∞½/\n");
  const texts = fc.oneof(fc.string({ maxLength: 60 }), fc.string({ unit: "grapheme", maxLength: 45 }), fc.array(alphabet, { maxLength: 20 }).map((all) => all.join("")));

  it("never throws, and answers a finite number, a word of the meter or a sentence", () => {
    fc.assert(fc.property(texts, units, (text, unit) => {
      const parsed = parseQuantity(text, unit);
      if (!parsed.ok) return parsed.message.endsWith(".") && parsed.message.length < 260;
      return typeof parsed.value === "string" ? ["OL", "none"].includes(parsed.value) : Number.isFinite(parsed.value);
    }), { numRuns: 3000 });
  });

  it("gives one number for every way of writing the prefix", () => {
    fc.assert(fc.property(fc.integer({ min: 1, max: 999 }), fc.integer({ min: 0, max: 9 }), fc.constantFrom(["k", 3], ["M", 6]), (whole, tenth, prefix) => {
      const [letter, power] = prefix as [string, number];
      const plain = String(Number(`${whole}.${tenth}e${power}`));
      const ways = [`${whole}.${tenth}${letter}`, `${whole},${tenth} ${letter}`, `${whole}${letter}${tenth}`, `${whole}.${tenth} ${letter}Ω`, `${whole}.${tenth}e${power}`, plain];
      return new Set(ways.map((way) => value(way, "ohm"))).size === 1;
    }));
  });

  it("is not moved by white space around the text or by the sign's spelling", () => {
    fc.assert(fc.property(fc.integer({ min: -99999, max: 99999 }), (thousandths) => {
      const text = (thousandths / 1000).toFixed(3);
      const spelled = text.replace("-", "\u2212");
      expect(value(`  ${spelled} V\n`, "volt")).toBe(thousandths === 0 ? 0 : Number(text));
    }));
  });
});
