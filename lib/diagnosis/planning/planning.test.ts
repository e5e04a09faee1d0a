import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { entropyBits, huffmanLength, optimalCost, planNext, policyCost, rankTests, type PlanProblem } from "./index";

const certain = (outcome: number, of: number) => Array.from({ length: of }, (_, o) => (o === outcome ? 1 : 0));

/** Problems of tests with certain outcomes, small enough for the exact search. */
const small = fc.tuple(fc.integer({ min: 2, max: 6 }), fc.integer({ min: 1, max: 5 })).chain(([hypotheses, tests]) => fc.record({
  priors: fc.array(fc.integer({ min: 1, max: 50 }), { minLength: hypotheses, maxLength: hypotheses }),
  tests: fc.tuple(...Array.from({ length: tests }, (_, t) => fc.record({
    id: fc.constant(`t${t}`),
    cost: fc.integer({ min: 1, max: 5 }),
    outcomes: fc.array(fc.integer({ min: 0, max: 2 }).map((outcome) => certain(outcome, 3)), { minLength: hypotheses, maxLength: hypotheses }),
    needs: fc.array(fc.constantFrom(true, false, null), { minLength: 2, maxLength: 2 }),
  }))),
  toggleCosts: fc.constant([2, 1]),
  state: fc.constant([false, false]),
})) as fc.Arbitrary<PlanProblem>;

const row = fc.array(fc.double({ min: 0.01, max: 1, noNaN: true }), { minLength: 3, maxLength: 3 }).map((weights) => {
  const total = weights.reduce((sum, weight) => sum + weight, 0);
  return weights.map((weight) => weight / total);
});
const noisy = fc.array(fc.tuple(fc.double({ min: 0.01, max: 1, noNaN: true }), row, row), { minLength: 2, maxLength: 8 }).map((rows): PlanProblem => ({
  priors: rows.map(([p]) => p),
  tests: [1, 2].map((column) => ({ id: `t${column}`, cost: column, outcomes: rows.map((all) => all[column] as number[]) })),
}));

describe("laws of planning", () => {
  it("no way of choosing beats the exact optimum, and the optimum does not beat Huffman's code", () => {
    fc.assert(fc.property(small, fc.integer({ min: 1, max: 3 }), (problem, lookAhead) => {
      const optimum = optimalCost(problem).cost;
      expect(policyCost(problem, { lookAhead }).cost).toBeGreaterThanOrEqual(optimum - 1e-9);
      const free = { ...problem, toggleCosts: [0, 0], tests: problem.tests.map((test) => ({ ...test, cost: 1 })) };
      const names = problem.priors.map((_, h) => JSON.stringify(problem.tests.map((test) => test.outcomes[h])));
      if (new Set(names).size === names.length) expect(optimalCost(free).cost).toBeGreaterThanOrEqual(huffmanLength(problem.priors, 3) - 1e-9);
    }), { numRuns: 300 });
  });

  it("looking ahead as far as there are tests is the optimum, with switches between them", () => {
    fc.assert(fc.property(small, (problem) => {
      const names = problem.priors.map((_, h) => JSON.stringify(problem.tests.map((test) => test.outcomes[h])));
      fc.pre(new Set(names).size === names.length);
      expect(policyCost(problem, { lookAhead: problem.tests.length }).cost).toBeCloseTo(optimalCost(problem).cost, 9);
    }), { numRuns: 200 });
  });

  it("a gain is not negative, and not more than is open or than the outcomes can say", () => {
    fc.assert(fc.property(noisy, (problem) => {
      const total = problem.priors.reduce((sum, p) => sum + p, 0);
      const open = entropyBits(problem.priors.map((p) => p / total));
      for (const { gainBits } of rankTests(problem)) expect(gainBits).toBeLessThanOrEqual(Math.min(open, Math.log2(3)) + 1e-9);
    }));
  });

  it("the same problem gives the same plan, whatever the order and scale of its lists", () => {
    fc.assert(fc.property(noisy, fc.integer({ min: 1, max: 2 }), (problem, lookAhead) => {
      const turned: PlanProblem = {
        priors: [...problem.priors].reverse().map((p) => p * 7),
        tests: [...problem.tests].reverse().map((test) => ({ ...test, outcomes: [...test.outcomes].reverse() })),
      };
      expect(rankTests(problem, { lookAhead })).toEqual(rankTests(problem, { lookAhead }));
      expect(planNext(turned, { lookAhead })?.gainBits).toBeCloseTo(planNext(problem, { lookAhead })?.gainBits ?? NaN, 9);
    }));
  });

  it("never proposes a test that all hypotheses answer alike", () => {
    fc.assert(fc.property(noisy, row, (problem, same) => {
      const dull = { id: "dull", cost: 0.001, outcomes: problem.priors.map(() => same) };
      expect(rankTests({ ...problem, tests: [dull, ...problem.tests] }).map(({ test }) => test)).not.toContain("dull");
    }));
  });
});

describe("planNext", () => {
  const two = [[1, 0], [0, 1]];

  it("has nothing to propose when sure enough, or when nothing would tell", () => {
    expect(planNext({ priors: [0.96, 0.04], tests: [{ id: "a", cost: 1, outcomes: two }], stopAt: 0.95 })).toBeNull();
    expect(planNext({ priors: [0.9, 0.1], tests: [{ id: "a", cost: 1, outcomes: two }], stopAt: 0.95 })?.test).toBe("a");
    expect(planNext({ priors: [1, 1], tests: [] })).toBeNull();
    expect(planNext({ priors: [1, 0], tests: [{ id: "a", cost: 1, outcomes: two }] })).toBeNull();
  });

  it("counts the switches a test needs turned, from the state the machine is in", () => {
    const problem: PlanProblem = {
      priors: [1, 1], toggleCosts: [4], state: [false],
      tests: [{ id: "other state", cost: 1, needs: [true], outcomes: two }, { id: "this state", cost: 4, needs: [false], outcomes: two }],
    };
    expect(planNext(problem)).toMatchObject({ test: "this state", effort: 4 });
    expect(planNext({ ...problem, state: [true] })).toMatchObject({ test: "other state", effort: 1 });
  });

  it("sees ahead that one switching opens two cheap tests where the best single test is dear", () => {
    const quarter = (bit: number) => [0, 1, 2, 3].map((h) => certain((h >> bit) & 1, 2));
    const problem: PlanProblem = {
      priors: [1, 1, 1, 1], toggleCosts: [2], state: [false],
      tests: [
        { id: "here a", cost: 2.5, needs: [false], outcomes: quarter(0) }, { id: "here b", cost: 2.5, needs: [false], outcomes: quarter(1) },
        { id: "there a", cost: 1, needs: [true], outcomes: quarter(0) }, { id: "there b", cost: 1, needs: [true], outcomes: quarter(1) },
      ],
    };
    expect(planNext(problem)?.test).toMatch(/^here/);
    expect(planNext(problem, { lookAhead: 2 })?.test).toMatch(/^there/);
    expect(policyCost(problem, { lookAhead: 2 }).cost).toBeCloseTo(4, 9);
  });

  it("breaks ties by id", () => {
    const tests = ["b", "a", "c"].map((id) => ({ id, cost: 1, outcomes: two }));
    expect(planNext({ priors: [1, 1], tests })?.test).toBe("a");
  });

  it.each([
    [{ priors: [0, 0], tests: [] }], [{ priors: [1, -1], tests: [] }], [{ priors: [1, NaN], tests: [] }],
    [{ priors: [1, 1], tests: [{ id: "a", cost: 0, outcomes: two }] }], [{ priors: [1, 1], tests: [{ id: "a", cost: 1, outcomes: [[1, 0]] }] }],
  ] as const)("refuses what is no problem: %j", (problem) => expect(() => planNext(problem)).toThrow(RangeError));

  it("leaves uncertain tests and large sets to the estimate", () => {
    expect(() => optimalCost({ priors: [1, 1], tests: [{ id: "a", cost: 1, outcomes: [[0.5, 0.5], [0, 1]] }] })).toThrow(RangeError);
    expect(() => optimalCost({ priors: new Array<number>(21).fill(1), tests: [] })).toThrow(RangeError);
  });
});
