import { describe, expect, it } from "vitest";
import { judge } from "./judge";
import { readVerdict, type StoredVerdict } from "./stored-verdict";

const run = { setup: { cavityLabels: ["A", "B", "C"] as const }, steps: [{ id: "01J00000000000000000000001", at: "2026-03-01T08:00:00Z", type: "reading", check: "volt:battery", value: 24.6, typed: "24.6" }] } as const;

/** A verdict as version 1 stored it. */
function oldOne(): StoredVerdict {
  const verdict = judge(run).verdict;
  return { ...verdict, explained: undefined, carrying: undefined, tellKindsApart: undefined, others: undefined, refusal: undefined, engineVersion: "1", evidence: verdict.evidence.map(({ check, value, ifSound, ifFinding, limit }) => ({ check, value, ifSound, ifFinding, limit })) };
}

describe("a stored verdict", () => {
  it("of today is read as it was written", () => {
    const { verdict } = judge(run);
    expect(readVerdict(JSON.parse(JSON.stringify(verdict)) as StoredVerdict)).toEqual(JSON.parse(JSON.stringify(verdict)));
  });

  it("of version 1 stays readable: what it did not keep is unknown, and what it kept is unchanged", () => {
    const old = oldOne(), read = readVerdict(old);
    expect(read?.carrying).toBeNull();
    expect([read?.others, read?.refusal, read?.tellKindsApart]).toEqual([[], null, null]);
    expect(read?.explained).toHaveLength(1);
    expect(read?.explained[0]?.rows[0]).toMatchObject({ check: "volt:battery", factor: null, offLimits: null, ifSound: old.evidence[0]?.ifSound });
    expect(read?.sentence).toBe(old.sentence);
    expect(readVerdict(null)).toBeNull();
  });
});
