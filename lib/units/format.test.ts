import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { formatQuantity, parseQuantity, type Unit } from "./index";

/** Plain spaces for reading; the no-break space has its own test. */
const shown = (...args: Parameters<typeof formatQuantity>) => formatQuantity(...args).replace(/\u00a0/g, " ");

describe("formatQuantity", () => {
  it.each([
    [4700, "ohm", 44, "4.70 kΩ"], [470, "ohm", 200, "0.5 kΩ"], [0.5, "ohm", 0.3045, "0.5 Ω"], [0.02, "ohm", 0.25, "0.0 Ω"],
    [4.998, "volt", 0.029, "5.00 V"], [-0.02, "volt", 0.0041, "\u221220 mV"], [0, "volt", 0.004, "0.000 V"], [-0.0001, "volt", 0.004, "0.000 V"],
    [70_000, "ohm", 12_000, "70 kΩ"], [300, "ohm", 12_000, "0 Ω"], [500.04, "hertz", 0.5, "500.0 Hz"], [0.2731, "ratio", 0.0034, "27.3 %"], [47.2e6, "ohm", 4.2e5, "47.2 MΩ"],
  ] as const)("%d %s known to %d is %s", (number, unit, limit, text) => expect(shown(number, unit, { limit })).toBe(text));

  it.each([
    [4700, "ohm", "4.7 kΩ"], [0.287, "ohm", "0.287 Ω"], [5, "volt", "5 V"], [0.012, "volt", "12 mV"], [0.27345, "ratio", "27.34 %"],
    [12345, "rpm", "12345 rpm"], [31.5, "deg", "31.5°"], [0, "ohm", "0 Ω"], ["OL", "ohm", "OL"], ["none", "hertz", "none"],
  ] as const)("%s %s without a limit is %s", (number, unit, text) => expect(shown(number, unit)).toBe(text));

  it("says unknown for what is not known", () => expect(formatQuantity(Number.NaN, "volt")).toBe("unknown"));
  it("keeps number and unit on one line", () => expect(formatQuantity(5, "volt")).toBe("5\u00a0V"));
  it("writes the omega the fonts have", () => expect(formatQuantity(5, "ohm")).toContain("\u03a9"));
});

describe("laws of formatting", () => {
  const units = fc.constantFrom<Unit>("ohm", "volt", "metre", "mm", "deg", "bar");
  const sizes = fc.tuple(fc.double({ min: 1, max: 9.999, noNaN: true }), fc.integer({ min: -3, max: 6 }), fc.boolean())
    .map(([mantissa, power, negative]) => (negative ? -1 : 1) * mantissa * 10 ** power);

  it("is read back within half the limit's first digit", () => {
    fc.assert(fc.property(sizes, units, fc.double({ min: 1e-6, max: 0.5, noNaN: true }), (value, unit, share) => {
      const limit = Math.abs(value) * share;
      const parsed = parseQuantity(formatQuantity(value, unit, { limit }), unit);
      expect(parsed.ok).toBe(true);
      if (parsed.ok) expect(Math.abs(Number(parsed.value) - value)).toBeLessThanOrEqual(limit * 0.5000001);
    }), { numRuns: 2000 });
  });

  it("reads duty and frequency back within the limit", () => {
    fc.assert(fc.property(fc.double({ min: 0.01, max: 1, noNaN: true }), fc.double({ min: 0.0005, max: 0.009, noNaN: true }), (duty, limit) => {
      const parsed = parseQuantity(formatQuantity(duty, "ratio", { limit }), "ratio");
      expect(parsed.ok && Math.abs(Number(parsed.value) - duty)).toBeLessThanOrEqual(limit * 0.5000001);
    }));
  });

  it("shows no digit below the first one of the limit", () => {
    fc.assert(fc.property(fc.integer({ min: 1, max: 9999 }), fc.integer({ min: -3, max: 0 }), (thousandths, power) => {
      const text = formatQuantity(thousandths / 1000, "bar", { limit: 10 ** power });
      expect((/[.](\d+)/.exec(text)?.[1] ?? "").length).toBe(Math.abs(power));
    }));
  });

  it("never writes a signed zero", () => {
    fc.assert(fc.property(fc.double({ min: -1, max: 1, noNaN: true }), fc.double({ min: 1e-3, max: 1, noNaN: true }), (value, limit) => {
      expect(formatQuantity(value, "volt", { limit })).not.toMatch(/^[-\u2212][0.]+\u00a0/);
    }));
  });
});
