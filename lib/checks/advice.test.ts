import { describe, expect, it } from "vitest";
import { FAULT_CODES, type Fault } from "@/lib/diagnosis";
import { adviceFor, cautionsFor, DEFERRAL } from "./advice";

const LABELS = ["A", "B", "C"] as const;
/** Findings that have a place of their own, by the bench's vocabulary. */
const PLACED = new Set(["wire-open", "wire-resistive", "short-to-ground", "short-to-battery", "contact-open"]);
const PAIRED = new Set(["wires-shorted", "wires-swapped", "connector-damp"]);
const CASES = FAULT_CODES.map((code): Fault => (PLACED.has(code) ? { code, pins: [2] } : PAIRED.has(code) ? { code, pins: [1, 3] } : { code }));

describe("advice", () => {
  it.each(CASES)("for $code at $pins is whole sentences with their places filled in", (fault) => {
    const { next, prove } = adviceFor(fault, LABELS);
    expect(next.length).toBeGreaterThan(0);
    expect(prove.length).toBeGreaterThan(0);
    for (const line of [...next, ...prove]) {
      expect(line).toMatch(/^[A-Z].*\.$/);
      expect(line).not.toMatch(/[{}]| {2}| [.,:;]|undefined/);
    }
  });

  it("names the cavity of the finding", () => {
    expect(adviceFor({ code: "wire-open", pins: [2] }, LABELS).next.join(" ")).toContain("the wire of cavity B");
    expect(adviceFor({ code: "wires-shorted", pins: [1, 3] }, LABELS).prove.join(" ")).toContain("between the wires of cavities A and C");
  });

  // Common practice: where a wrong step can hurt a person or a controller, the site, the maker and the law come first.
  it.each(["short-to-ground", "short-to-battery", "supply-missing", "pull-missing", "wires-swapped"] as const)("on %s defers to those who decide", (code) => {
    expect(adviceFor({ code, pins: [1] }, LABELS).next).toContain(DEFERRAL);
  });

  it("never tells anybody to bridge a supply or to pierce insulation", () => {
    const all = CASES.flatMap((fault) => Object.values(adviceFor(fault, LABELS)).flat());
    for (const line of all) {
      expect(line).not.toMatch(/pierce/i);
      if (/bridge/i.test(line)) expect(line).toMatch(/never bridge/i);
    }
    expect(cautionsFor("pwm").join(" ")).toContain("Never pierce insulation. Never bridge a controller's supply to battery.");
    expect(cautionsFor(null)).toContain(DEFERRAL);
  });
});
