import { describe, expect, it } from "vitest";
import { vocabulary, type ReadingValue } from "@/lib/diagnosis";
import { stepProblem } from "./step-rules";

const problem = (check: string, value: ReadingValue) => stepProblem({ id: "01J00000000000000000000000", at: "2026-03-01T08:00:00Z", type: "reading", check, value, typed: "" })?.code ?? null;

describe("a step", () => {
  it.each([
    ["res:device:1-2@rest", 4700, null], ["res:device:1-2@rest", "OL", null], ["res:device:1-2@rest", -0.02, null],
    ["res:device:1-2@rest", -5, "out-of-bounds"], ["res:device:1-2@rest", 1e11, "out-of-bounds"], ["res:device:1-2@rest", "none", "wrong-value"],
    ["volt:battery", 24.6, null], ["volt:battery", 61, "out-of-bounds"], ["volt:battery", "OL", "wrong-value"],
    ["freq:mated:3@rest", "none", null], ["freq:mated:3@rest", -1, "out-of-bounds"],
    ["duty:mated:3@rest", 0.273, null], ["duty:mated:3@rest", 27.3, "out-of-bounds"],
    ["sweep:mated:2", "jumps", null], ["sweep:mated:2", 1, "wrong-value"], ["fit:contact:1", "loose", null], ["fit:contact:1", "smooth", "wrong-value"],
    ["res:device:1-4@rest", 1, "unknown-check"], ["__proto__", 1, "unknown-check"],
  ] as const)("%s = %s gives %s", (check, value, expected) => {
    expect(problem(check, value)).toBe(expected);
  });

  // Common practice (and the product's cautions): above 60 V d.c. this tool stops.
  it("stops at 60 V and says so", () => {
    expect(stepProblem({ id: "01J00000000000000000000000", at: "2026-03-01T08:00:00Z", type: "reading", check: "volt:battery", value: 72, typed: "72" })?.message).toContain("stop, not with this tool");
  });

  it("takes what each check's own words allow, all over the vocabulary", () => {
    for (const spec of vocabulary()) for (const word of spec.words) expect(problem(spec.code, word)).toBeNull();
  });
});
