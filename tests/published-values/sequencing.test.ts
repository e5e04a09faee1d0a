import { describe, expect, it } from "vitest";
import { entropyBits, entropyBound, huffmanLength, optimalCost, planNext, policyCost, rankTests, type PlanProblem } from "@/lib/diagnosis/planning";

const certain = (outcome: number, of: number) => Array.from({ length: of }, (_, o) => (o === outcome ? 1 : 0));

describe("test sequencing example of Pattipati & Alexandridis 1990", () => {
  // Source: IEEE SMC 1990; table and 2.18 from memory, dynamic programming gives 2.18 exactly; the other costs computed.
  const TABLE = ["00000", "01001", "00110", "10011", "11000", "11110"];
  const PRIORS = [0.7, 0.01, 0.02, 0.1, 0.05, 0.12];
  const problem = (costs: readonly number[], priors: readonly number[] = PRIORS): PlanProblem => ({
    priors,
    tests: costs.map((cost, t) => ({ id: `t${t + 1}`, cost, outcomes: TABLE.map((row) => certain(Number(row[t]), 2)) })),
  });
  const unit = [1, 1, 1, 1, 1];

  it("costs 2.18 with t2 at the root, where information per effort alone pays 2.86 from t1", () => {
    expect(optimalCost(problem(unit)).cost).toBeCloseTo(2.18, 9);
    expect(optimalCost(problem(unit)).root).toBe("t2");
    expect(policyCost(problem(unit)).cost).toBeCloseTo(2.86, 9);
    expect(policyCost(problem(unit)).root).toBe("t1");
  });

  it("reaches the optimum when it looks two tests ahead", () => {
    for (const lookAhead of [2, 3, 4]) expect(policyCost(problem(unit), { lookAhead }).cost).toBeCloseTo(2.18, 9);
  });

  it("has the root's gains", () => {
    const gains = new Map(rankTests(problem(unit)).map(({ test, gainBits }) => [test, gainBits]));
    [0.841465, 0.680077, 0.584239, 0.79504, 0.499916].forEach((bits, t) => expect(gains.get(`t${t + 1}`)).toBeCloseTo(bits, 6));
    expect(entropyBits(PRIORS)).toBeCloseTo(1.454873, 6);
    expect(huffmanLength(PRIORS)).toBeCloseTo(1.59, 9);
  });

  it.each([
    [[2, 1, 3, 1, 2], 2.36, 2.36], [[5, 1, 1, 2, 1], 2.78, 2.78], [[1, 2, 1, 1, 1], 2.85, 2.86],
  ] as const)("costs %j: optimum %d, greedy %d", (costs, optimum, greedy) => {
    expect(optimalCost(problem(costs)).cost).toBeCloseTo(optimum, 9);
    expect(policyCost(problem(costs)).cost).toBeCloseTo(greedy, 9);
    expect(policyCost(problem(costs), { lookAhead: 2 }).cost).toBeCloseTo(optimum, 9);
  });

  it("roots costs (1,2,1,1,1) in t4", () => expect(optimalCost(problem([1, 2, 1, 1, 1])).root).toBe("t4"));
  it("costs 2.6667 when all states are alike", () => expect(optimalCost(problem(unit, new Array<number>(6).fill(1))).cost).toBeCloseTo(2.6667, 4));
  it("costs 2.20 when something is known to be faulty", () => {
    const faulty = [0, ...PRIORS.slice(1)];
    expect(optimalCost(problem(unit, faulty)).cost).toBeCloseTo(2.2, 9);
    expect(entropyBits(faulty.map((p) => p / 0.3))).toBeCloseTo(1.911942, 6);
    expect(huffmanLength(faulty)).toBeCloseTo(1.966667, 6);
  });
});

describe("half-split of a chain", () => {
  // Source: computed; n links of which one is open, a test at each joint.
  const chain = (priors: readonly number[]): PlanProblem => ({
    priors,
    tests: priors.slice(1).map((_, joint) => ({ id: `joint ${joint + 1}`, cost: 1, outcomes: priors.map((__, link) => certain(link <= joint ? 0 : 1, 2)) })),
  });

  it.each([[3, 1.6667], [4, 2], [5, 2.4], [6, 2.6667], [8, 3], [10, 3.4]] as const)("%d equal links: %d", (links, cost) => {
    const equal = chain(new Array<number>(links).fill(1));
    expect(optimalCost(equal).cost).toBeCloseTo(cost, 4);
    expect(policyCost(equal).cost).toBeCloseTo(cost, 4);
  });

  it("links of 0.1, 0.2, 0.4, 0.2, 0.1 cost 2.3 against 2.121928 bits", () => {
    expect(optimalCost(chain([0.1, 0.2, 0.4, 0.2, 0.1])).cost).toBeCloseTo(2.3, 9);
    expect(entropyBits([0.1, 0.2, 0.4, 0.2, 0.1])).toBeCloseTo(2.121928, 6);
  });
});

describe("coding bounds", () => {
  it("Huffman's code of (.25,.25,.2,.15,.15) has 2.3 digits, entropy 2.285475", () => {
    // Source: textbook example, from memory.
    expect(huffmanLength([0.25, 0.25, 0.2, 0.15, 0.15])).toBeCloseTo(2.3, 9);
    expect(entropyBits([0.25, 0.25, 0.2, 0.15, 0.15])).toBeCloseTo(2.285475, 6);
  });

  it("three outcomes need at least log base 3 tests", () => {
    // Source: Shannon's bound, computed: 27 equal hypotheses, three weighings.
    expect(entropyBound(Math.log2(27), 3)).toBeCloseTo(3, 9);
    expect(huffmanLength(new Array<number>(27).fill(1), 3)).toBeCloseTo(3, 9);
    expect(huffmanLength([1, 1, 1, 1], 3)).toBeCloseTo(1.5, 9);
  });
});

describe("twelve coins, one of them heavy or light", () => {
  // Source: computed for the classic puzzle; 24 equal hypotheses, a balance with three outcomes.
  const weighing = (aside: number) => ({
    id: `${aside} against ${aside}`, cost: 1,
    outcomes: Array.from({ length: 24 }, (_, h) => {
      const coin = Math.floor(h / 2);
      const tilt = h % 2 === 0 ? 1 : 2;
      return certain(coin < aside ? tilt : coin < 2 * aside ? 3 - tilt : 0, 3);
    }),
  });
  const problem: PlanProblem = { priors: new Array<number>(24).fill(1), tests: [6, 5, 4, 3].map(weighing) };

  it.each([[6, 1], [5, 1.483356], [4, 1.584963], [3, 1.5]] as const)("%d against as many tells %d bits", (aside, bits) => {
    expect(rankTests(problem).find(({ test }) => test === `${aside} against ${aside}`)?.gainBits).toBeCloseTo(bits, 6);
  });
  it("weighs four against four first", () => expect(planNext(problem)?.test).toBe("4 against 4"));
});

describe("figure of merit of Johnson 1960", () => {
  it("is information over effort: a test of half the worth at a third of the effort goes first", () => {
    // Source: the abstract's definition; numbers computed.
    const problem: PlanProblem = {
      priors: [1, 1, 1, 1],
      tests: [
        { id: "whole", cost: 3, outcomes: [0, 1, 2, 3].map((h) => certain(h, 4)) },
        { id: "half", cost: 1, outcomes: [0, 0, 1, 1].map((o) => certain(o, 2)) },
      ],
    };
    expect(planNext(problem)).toMatchObject({ test: "half", gainBits: 1, effort: 1, score: 1 });
  });
});
