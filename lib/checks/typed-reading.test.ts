import { describe, expect, it } from "vitest";
import { parseCheck, type CheckSpec } from "@/lib/diagnosis";
import { pressKey, type KeypadKey } from "./keypad-text";
import { readTyped } from "./typed-reading";

function spec(code: string): CheckSpec {
  const found = parseCheck(code);
  if (!found) throw new Error(`no such check: ${code}`);
  return found;
}
const press = (...keys: KeypadKey[]) => keys.reduce(pressKey, "");

describe("keypad", () => {
  it("builds a number and takes one decimal sign", () => {
    expect(press("4", ".", ".", "7")).toBe("4.7");
  });
  it("turns the sign over, also before the first digit", () => {
    expect(press("sign", "0", ".", "0", "2")).toBe("-0.02");
    expect(press("5", "sign", "sign")).toBe("5");
  });
  it("lets a word stand alone", () => {
    expect(press("4", "OL")).toBe("OL");
    expect(press("OL", "4")).toBe("4");
    expect(press("none", "back")).toBe("");
    expect(press("OL", "sign")).toBe("OL");
  });
});

describe("a typed reading", () => {
  const ohms = spec("res:device:1-2@rest");
  const volts = spec("volt:harness:1-gnd");

  it.each([["4.7", "k\u03a9", 4700], ["4k7", "\u03a9", 4700], ["4,7 k", "M\u03a9", 4700], ["0.47M", "\u03a9", 470_000], ["OL", "k\u03a9", "OL"]] as const)("reads %s with %s selected", (text, unit, value) => {
    expect(readTyped(ohms, text, unit)).toMatchObject({ ok: true, value });
  });

  it("keeps what was typed with the selected unit", () => {
    expect(readTyped(volts, "-0.02", "V")).toEqual({ ok: true, value: -0.02, typed: "-0.02 V" });
    expect(readTyped(volts, "-20", "mV")).toEqual({ ok: true, value: -0.02, typed: "-20 mV" });
  });

  it("takes a share in percent, and no reading where the meter shows none", () => {
    const duty = spec("duty:mated:3@rest");
    expect(readTyped(duty, "27.3", "%")).toMatchObject({ ok: true, value: 0.273 });
    expect(readTyped(duty, "none", "%")).toMatchObject({ ok: true, value: "none" });
  });

  it.each([[ohms, "", "\u03a9"], [ohms, "12 V", "\u03a9"], [volts, "OL", "V"], [volts, "61", "V"], [ohms, "-50", "\u03a9"], [ohms, "abc", "\u03a9"]])("refuses %o %s with a sentence", (check, text, unit) => {
    const read = readTyped(check, text, unit);
    expect(read.ok).toBe(false);
    expect(read.ok ? "" : read.message).toMatch(/\.$/);
  });
});
