/** One test that could be made next. */
export interface PlanTest {
  readonly id: string;
  /** Chance of each outcome (column) if a hypothesis (row) is true; rows sum to 1. Outcomes of different tests are taken as independent given the hypothesis. */
  readonly outcomes: readonly (readonly number[])[];
  /** Effort of the test alone, > 0. */
  readonly cost: number;
  /** State of the machine it needs, switch by switch; null where it does not matter. Absent: any state will do. */
  readonly needs?: readonly (boolean | null)[];
}

/** What is believed, what can be tested, and what it takes. Knows nothing of what is being diagnosed. */
export interface PlanProblem {
  /** Chances of the hypotheses; need not sum to 1. */
  readonly priors: readonly number[];
  readonly tests: readonly PlanTest[];
  /** State of the machine now, switch by switch; all false when absent. */
  readonly state?: readonly boolean[];
  /** Effort of turning each switch, either way. */
  readonly toggleCosts?: readonly number[];
  /** A hypothesis this likely ends the search, 0..1; 1 when absent. */
  readonly stopAt?: number;
}

export interface PlanOptions {
  /** Tests looked ahead; 1 is the greedy choice by information per effort. */
  readonly lookAhead?: number;
  /** How many of the most promising tests are looked into at each step; all when absent. */
  readonly beam?: number;
}

/** A test with what it is expected to tell. */
export interface PlannedTest {
  readonly test: string;
  /** Expected information about the hypotheses, bits. */
  readonly gainBits: number;
  /** Effort from the present state, switches included. */
  readonly effort: number;
  /** Bits still open per effort still expected if this test is made next; greater is better. */
  readonly score: number;
}
