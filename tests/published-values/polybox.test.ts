import { describe, expect, it } from "vitest";
import { entropyBits, planNext, rankTests, type PlanProblem } from "@/lib/diagnosis/planning";

/**
 * The circuit of de Kleer & Williams 1987 (Artificial Intelligence 32): X = A·C (M1), Y = B·D (M2), Z = C·E (M3), F = X+Y (A1),
 * G = Y+Z (A2); inputs 3, 2, 2, 3, 3; F reads 10 and G 12. Source: paper and lecture text; chances computed for independent
 * faults of 0.01 and consistency alone.
 */
const PARTS = ["A1", "A2", "M1", "M2", "M3"] as const;
type Part = (typeof PARTS)[number];
type Values = Record<"X" | "Y" | "Z", number | null>;

/** What the sound parts make of X, Y and Z; null where nothing does; undefined when they contradict what was read. */
function deduce(faulty: ReadonlySet<Part>): Values | undefined {
  const values: Values = { X: faulty.has("M1") ? null : 6, Y: faulty.has("M2") ? null : 6, Z: faulty.has("M3") ? null : 6 };
  const sums = [["A1", "X", "Y", 10], ["A2", "Y", "Z", 12]] as const;
  for (let pass = 0; pass < 3; pass += 1) {
    for (const [adder, a, b, sum] of sums) {
      if (faulty.has(adder)) continue;
      if (values[a] !== null && values[b] !== null && values[a] + values[b] !== sum) return undefined;
      if (values[a] === null && values[b] !== null) values[a] = sum - values[b];
      if (values[b] === null && values[a] !== null) values[b] = sum - values[a];
    }
  }
  return values;
}

const SETS = Array.from({ length: 32 }, (_, bits) => new Set(PARTS.filter((__, i) => bits & (1 << i))))
  .map((faulty) => ({ faulty, p: 0.01 ** faulty.size * 0.99 ** (5 - faulty.size), values: deduce(faulty) }))
  .flatMap(({ faulty, p, values }) => (values ? [{ faulty, p, values }] : []));
const MASS = SETS.reduce((sum, { p }) => sum + p, 0);

function chance(...faulty: Part[]): number {
  return (SETS.find((set) => set.faulty.size === faulty.length && faulty.every((part) => set.faulty.has(part)))?.p ?? NaN) / MASS;
}

/** A probe has each value some set predicts as an outcome, and one more for "none of them". */
function probe(id: "X" | "Y" | "Z") {
  const seen = [...new Set(SETS.map(({ values }) => values[id]))];
  return { id, cost: 1, outcomes: SETS.map(({ values }) => seen.map((value) => (value === values[id] ? 1 : 0))) };
}

const problem: PlanProblem = { priors: SETS.map(({ p }) => p), tests: (["X", "Y", "Z"] as const).map(probe) };

describe("the polybox", () => {
  it("has 27 consistent sets and equal chances for A1 and M1", () => {
    expect(SETS).toHaveLength(27);
    expect(MASS).toBeCloseTo(0.02009504, 8);
    expect(chance("A1")).toBeCloseTo(0.478026, 6);
    expect(chance("M1")).toBeCloseTo(0.478026, 6);
    expect(chance("A2", "M2")).toBeCloseTo(0.004829, 6);
    expect(chance("M2", "M3")).toBeCloseTo(0.004829, 6);
    expect(entropyBits(SETS.map(({ p }) => p / MASS))).toBeCloseTo(1.359445, 6);
  });

  it("probes X first, with the computed gains", () => {
    const gains = new Map(rankTests(problem).map(({ test, gainBits }) => [test, gainBits]));
    expect(planNext(problem)?.test).toBe("X");
    expect(gains.get("X")).toBeCloseTo(1.040838, 6);
    expect(gains.get("Y")).toBeCloseTo(0.081544, 6);
    expect(gains.get("Z")).toBeCloseTo(0.047402, 6);
  });

  it.each([[4, "M1", 0.9606, 0.32317], [6, "A1", 0.94204, 0.4762]] as const)("X = %d points at %s", (value, part, p, bits) => {
    // Sets that predict nothing for X stay consistent with whatever is read there.
    const left = SETS.filter(({ values }) => values.X === value || values.X === null);
    const mass = left.reduce((sum, set) => sum + set.p, 0);
    const alone = left.find(({ faulty }) => faulty.size === 1 && faulty.has(part));
    expect((alone?.p ?? NaN) / mass).toBeCloseTo(p, 4);
    expect(entropyBits(left.map((set) => set.p / mass))).toBeCloseTo(bits, 4);
  });
});
